import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { quenlowValley } from '@/seed/reaches/quenlowValley';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { axeViolations } from '../helpers/axe';
import { goTo, signIn } from '../helpers/steps';

jest.setTimeout(180_000);

/** A pool of 0.4 million m³ above the first section of the demo valley, pasted as from a spreadsheet. */
const bed = Math.min(...quenlowValley()[0].points.map(([, z]) => z));
const STORAGE = [0, 5, 10, 14].map((depth) => `${(bed + depth).toFixed(2)}\t${0.002 * depth ** 2}`);

let browser: Browser;
beforeAll(async () => void (browser = await launchBrowser()));
afterAll(() => browser.close());

describe.each(Object.keys(SIZES) as Size[])('a dam that fails, %s', (size) => {
  it('is built by the form, takes its breach from a regression, and is routed', () =>
    visit(browser, size, 'structuresPath', async ({ page, errors }) => {
      await signIn(page, 'ines.corrow@pykemorrow.example', DEMO_PASSWORD);
      await page
        .getByRole('link', { name: /Quenlow dam/ })
        .first()
        .click();
      await goTo(page, 'Scenarios');
      await page.getByLabel('Name').fill(`Dam at the head, ${size}`);
      await page.getByRole('button', { name: 'Make the scenario' }).click();

      // The reservoir at the head.
      await page.getByLabel('A reservoir behind a dam').check();
      await page
        .getByRole('textbox', { name: /^Storage of the reservoir/ })
        .fill(STORAGE.join('\n'));
      await page.getByRole('textbox', { name: /^Stage at the start/ }).fill(String(bed + 13));
      await page.getByRole('textbox', { name: /^Inflow into the reservoir/ }).fill('0\t0.5');

      // The dam, proposed as high as the table; its breach from a regression.
      await page.getByRole('combobox', { name: /^Kind/ }).selectOption('breach');
      await page.getByRole('button', { name: /^Add a failing dam at/ }).click();
      const dam = page.getByRole('group', { name: 'Dam 1', exact: true });
      await dam.getByRole('textbox', { name: /^Stage at failure/ }).fill(String(bed + 13));
      await dam.getByRole('button', { name: 'Take from crest and reservoir' }).click();
      await dam.getByRole('button', { name: 'Take Froehlich 2008' }).click();
      expect(
        Number(await dam.getByRole('textbox', { name: /^Width at the bottom/ }).inputValue()),
      ).toBeGreaterThan(0);
      await dam
        .getByRole('textbox', { name: /^Why these values/ })
        .fill('Homogeneous fill, no instruments.');
      await page.getByRole('textbox', { name: /^Cell size/ }).fill('20');
      await page.getByRole('textbox', { name: /^Duration/ }).fill('1');
      await page.getByRole('textbox', { name: /^Result kept every/ }).fill('1');
      await looksRight(page);
      await page.getByRole('button', { name: 'Save' }).click();
      await page.getByRole('button', { name: 'Route this flood' }).click();

      // What it came to.
      const card = page.getByRole('region', { name: 'Structures' });
      await card.getByText('Greatest flow').waitFor({ timeout: 120_000 });
      await card
        .getByText(/^\d[\d,.]* m³\/s at/)
        .first()
        .waitFor();
      await card
        .getByText(/^From .*: free flow over the crest/)
        .first()
        .waitFor();
      await card.getByText(/Froehlich 2008.*Homogeneous fill/).waitFor();
      const pool = page.getByRole('region', { name: 'Reservoir' });
      await pool.getByText('Greatest release').waitFor();
      await looksRight(page);
      expect(errors).toEqual([]);
    }));
});

async function looksRight(page: Page): Promise<void> {
  await page.waitForFunction(() => !document.querySelector('[role=progressbar]'));
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  expect(await axeViolations(page)).toEqual([]);
}

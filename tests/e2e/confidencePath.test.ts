import { readFileSync } from 'node:fs';
import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { LARGER_FLOOD } from '@/seed/scenarios';
import { axeViolations } from '../helpers/axe';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { signIn } from '../helpers/steps';

jest.setTimeout(300_000);

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

/** Runs of the demo go before sets. */
const LONG = { timeout: 180_000 };

describe.each(Object.keys(SIZES) as Size[])('how far the numbers carry, %s', (size) => {
  it('an ensemble from the button to its bands, and the sets that the demo shows', () =>
    visit(browser, size, 'confidencePath', async ({ page }) => {
      await signIn(page, 'ines.corrow@pykemorrow.example', DEMO_PASSWORD);
      await page
        .getByRole('link', { name: /Lower Veshall/ })
        .first()
        .click();
      await page.waitForURL(/\/studies\/\d+/);
      await page.goto(`${new URL(page.url()).pathname}/confidence`);
      await page.getByRole('region', { name: 'Ensemble' }).waitFor(LONG);
      await looksRight(page);

      // Settings that make no sense are said at their place, and nothing is started.
      const form = page.getByRole('form', { name: 'Ensemble' });
      await form.getByRole('button', { name: 'Change the values of the ensemble' }).click();
      await form.getByLabel('Members', { exact: true }).fill('5');
      await form.getByRole('button', { name: /^Compute/ }).click();
      await form.getByText('An ensemble has 20 members or more.').waitFor();
      await form.getByLabel('Members', { exact: true }).fill('20');
      await form.getByLabel(/^Cell size of the members/).fill('400');
      await form
        .getByRole('group', { name: "Manning's n" })
        .getByLabel('Distribution')
        .selectOption('uniform');
      await looksRight(page);
      await form.getByRole('button', { name: 'Compute 20 members' }).click();

      // Computed on the queue; then bands, and the chance of a level.
      await page.waitForURL(/\/confidence\/\d+/);
      await page.getByRole('img', { name: /^Peak stage along the reach/ }).waitFor(LONG);
      await page.getByText('21 of 21 computed').waitFor();
      await page.getByText('Latin hypercube, 20 members, seed 1').waitFor();
      await page.getByLabel('Level above the datum').fill('0');
      await page.getByText('20 of 20 members stand above 0.00 m').waitFor();
      await page.getByLabel('Level above the datum').fill('900');
      await page.getByText('0 of 20 members stand above 900.00 m').waitFor();
      await looksRight(page);
      const saving = page.waitForEvent('download');
      await page.getByRole('button', { name: 'Members as CSV' }).click();
      const file = readFileSync(await (await saving).path(), 'utf8');
      expect(file.trim().split('\r\n')).toHaveLength(21);

      // What the demo has computed.
      for (const [name, shown] of [
        ['Cell-size convergence', 'Convergence at the stations'],
        ['Sensitivity', 'Sensitivity at the stations'],
      ]) {
        await page.getByRole('link', { name: 'Confidence', exact: true }).first().click();
        const link = page.getByRole('link', {
          name: new RegExp(`^${name} of run \\d+: ${LARGER_FLOOD}`),
        });
        await link.first().click(LONG);
        await page.getByRole('table', { name: shown }).waitFor(LONG);
        await looksRight(page);
      }
      await page
        .getByRole('img', { name: /^Change of Peak stage.*Manning's n: −20 % −/ })
        .waitFor();
    }));
});

async function looksRight(page: Page): Promise<void> {
  expect(await axeViolations(page)).toEqual([]);
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
}

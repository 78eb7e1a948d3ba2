import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { emailOf } from '../helpers/accounts';
import { apiOf } from '../helpers/api';
import { axeViolations } from '../helpers/axe';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { signIn } from '../helpers/steps';
import type { RunRow } from '@/shared/runs/types';

jest.setTimeout(300_000);

let browser: Browser;
let routed: RunRow[];
beforeAll(async () => {
  browser = await launchBrowser();
  const api = await apiOf(emailOf('Ines Corrow'));
  for (;;) {
    const runs = await api.get<RunRow[]>('/studies/1/runs');
    routed = runs.filter(({ state }) => state === 'routed').sort((a, b) => a.number - b.number);
    if (routed.length >= 2) return;
    await new Promise((resolve) => setTimeout(resolve, 1000));
  }
});
afterAll(() => browser.close());

async function isSound(page: Page): Promise<void> {
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  expect(await axeViolations(page)).toEqual([]);
}

const MARKS = ['chainage (m)\tlevel (m)\tkind\tconfidence', '10550\t42.17\tstain\tgood'];

describe.each(Object.keys(SIZES) as Size[])('at %s size', (size) => {
  it('goes from pasted marks over residuals and a search to a scenario, and compares two runs', () =>
    visit(browser, size, 'calibration', async ({ page }) => {
      // Of its own, so that a product that was visited before is fit for it.
      const flood = `Flood seen at ${size} size, ${Date.now()}`;
      const run = routed[0];
      await signIn(page, emailOf('Ines Corrow'), DEMO_PASSWORD, '/studies/1/calibration');
      await page.getByRole('button', { name: 'Add marks' }).click();
      await page.getByLabel('Flood', { exact: true }).fill(flood);
      await page
        .getByRole('textbox', { name: 'Marks' })
        .fill([...MARKS, '99\tno\tx\ty'].join('\n'));
      await page.getByText('Line 3 has “no” for the level, which is no number.').waitFor();
      await page
        .getByRole('textbox', { name: 'Marks' })
        .fill([...MARKS, '17350\t35.08\tgauge peak\tgood'].join('\n'));
      await page.getByText('2 marks; chainages in m, levels in m.').waitFor();
      await isSound(page);
      await page.getByRole('button', { name: 'Add 2 marks' }).click();
      await page.getByText(flood).first().waitFor();

      await page.getByRole('link', { name: `Run ${run.number}, ${run.scenarioName}` }).click();
      await page.getByLabel('Flood', { exact: true }).selectOption(flood);
      const residuals = page.getByRole('table', { name: 'Residuals of the marks' });
      await residuals.getByText('42.17').waitFor();
      expect(await residuals.getByRole('row').count()).toBe(3);
      await page.getByRole('img', { name: /^Marks on the long section/ }).waitFor();
      await isSound(page);

      // Beside the results only once it is chosen, and then by the address alone.
      const besides = new URLSearchParams({ observed: flood });
      await page.goto(`/studies/1/runs/${run.id}?${besides}`);
      await page.getByRole('img', { name: /^Long section.*Observed levels: 2/ }).waitFor();
      await isSound(page);
      await page.getByLabel('Flood to draw beside this run').selectOption('None');
      await page.waitForURL((url) => !url.searchParams.has('observed'));
      expect(await page.getByRole('img', { name: /Observed levels/ }).count()).toBe(0);
      const against = new URLSearchParams({ flood });
      await page.goto(`/studies/1/calibration/runs/${run.id}?${against}`);

      await page.getByRole('link', { name: 'Search for roughness' }).click();
      await page.getByRole('button', { name: 'Remove Flood plain' }).click();
      await page.getByLabel('Runs at most').fill('5');
      await page.getByLabel('Cells').selectOption('8');
      await isSound(page);
      await page.getByRole('button', { name: 'Start the search' }).click();
      await page.getByRole('table', { name: 'Best multipliers' }).waitFor({ timeout: 120_000 });
      await page.getByRole('img', { name: /^Misfit by the multiplier of Channel/ }).waitFor();
      await page.getByRole('button', { name: /^Show all .* runs of the search/ }).click();
      await page.getByRole('table', { name: 'Runs of the search' }).waitFor();
      await isSound(page);
      await page.getByLabel('Name of the scenario').fill(`Fitted at ${size} size`);
      await page.getByRole('button', { name: 'Make the scenario' }).click();
      await page.getByRole('heading', { name: `Fitted at ${size} size` }).waitFor();

      await page.goto('/studies/1/runs');
      await page.getByRole('link', { name: 'Compare runs' }).click();
      for (const { number, scenarioName } of routed.slice(0, 2))
        await page.getByLabel(`Run ${number}, ${scenarioName}`).check();
      await page.getByRole('table', { name: 'Inputs that differ' }).getByText(/peak/).waitFor();
      await page.getByRole('img', { name: /^Highest water along the reach/ }).waitFor();
      await page.getByRole('table', { name: 'Differences at the stations' }).waitFor();
      expect(page.url()).toContain(encodeURIComponent(`${routed[0].id},${routed[1].id}`));
      await isSound(page);
    }));
});

import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { emailOf } from '../helpers/accounts';
import { apiOf } from '../helpers/api';
import { axeViolations } from '../helpers/axe';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { signIn } from '../helpers/steps';

jest.setTimeout(180_000);

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

/** What nobody but the engineers of the firm may read of the demo study. */
const ENGINEERS_ONLY = [
  '/studies/1/reaches',
  '/reaches/1',
  '/studies/1/scenarios',
  '/scenarios/1',
  '/studies/1/runs',
  '/runs/1',
  '/runs/1/summary',
  '/runs/1/case.json',
  '/runs/1/results.csv',
];

describe.each(Object.keys(SIZES) as Size[])('at %s size', (size) => {
  it('shows the surveyor the assigned reaches and the hand-in of surveys, and nothing else', () =>
    visit(browser, size, 'surveyor', async ({ page }) => {
      const email = emailOf('Dov Hallam');
      await signIn(page, email, DEMO_PASSWORD);
      await page
        .getByRole('link', { name: /Lower Veshall at Tornick/ })
        .first()
        .click();
      await page.waitForURL(/\/studies\/1/);
      await page.goto('/studies/1/survey');
      await page
        .getByText(/veshall_nov\.xlsx/)
        .first()
        .waitFor();
      await seesNoEngineering(page, email);
    }));

  it('shows the client the shared study with what is issued, and nothing else', () =>
    visit(browser, size, 'client', async ({ page }) => {
      const email = emailOf('Maud Ferrin');
      await signIn(page, email, DEMO_PASSWORD);
      await page
        .getByRole('link', { name: /Lower Veshall at Tornick/ })
        .first()
        .click();
      await page.waitForURL(/\/studies\/1/);
      await page
        .getByText(/licensed engineer/)
        .first()
        .waitFor();
      await seesNoEngineering(page, email);
      expect(await (await apiOf(email)).status('/studies/1/surveys')).toBe(404);
      expect(await (await apiOf(email)).status('/studies/2')).toBe(404);
    }));

  it('shows another firm none of it', () =>
    visit(browser, size, 'other-firm', async ({ page }) => {
      const email = emailOf('Lena Ostrand');
      await signIn(page, email, DEMO_PASSWORD);
      await page
        .getByRole('link', { name: /Mill Reach/ })
        .first()
        .waitFor();
      expect(await page.getByText('Lower Veshall').count()).toBe(0);
      const api = await apiOf(email);
      for (const path of ['/studies/1', ...ENGINEERS_ONLY])
        expect([path, await api.status(path)]).toEqual([path, 404]);
    }));
});

async function seesNoEngineering(page: Page, email: string): Promise<void> {
  for (const place of ['Scenarios', 'Runs', 'Reach']) {
    expect(await page.getByRole('link', { name: new RegExp(`^${place}\\b`) }).count()).toBe(0);
  }
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  expect(await axeViolations(page)).toEqual([]);
  const api = await apiOf(email);
  for (const path of ENGINEERS_ONLY) expect([path, await api.status(path)]).toEqual([path, 404]);
  await page.goto('/studies/1/runs/1');
  await page.waitForFunction(() => !document.querySelector('[role=progressbar]'));
  expect(await page.getByRole('button', { name: /CSV/ }).count()).toBe(0);
}

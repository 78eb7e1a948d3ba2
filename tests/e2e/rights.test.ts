import type { Browser, Page } from 'playwright-core';
import { DEMO_ACCOUNTS, DEMO_PASSWORD } from '@/seed/accounts';
import { axeViolations } from '../helpers/axe';
import {
  launchBrowser,
  productUrl,
  sidewaysOverflow,
  SIZES,
  visit,
  type Size,
} from '../helpers/browser';
import { signIn } from '../helpers/steps';

jest.setTimeout(180_000);

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

/** What nobody but the engineers of the firm may read of the demo study. */
const ENGINEERS_ONLY = [
  '/api/studies/1/reaches',
  '/api/reaches/1',
  '/api/studies/1/scenarios',
  '/api/scenarios/1',
  '/api/studies/1/runs',
  '/api/runs/1',
  '/api/runs/1/summary',
  '/api/runs/1/case.json',
  '/api/runs/1/results.csv',
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

  it('shows the client the shared study and nothing that is not issued', () =>
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
      expect(await statusOf(email, '/api/studies/1/surveys')).toBe(404);
      expect(await statusOf(email, '/api/studies/2')).toBe(404);
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
      for (const path of ['/api/studies/1', ...ENGINEERS_ONLY]) {
        expect([path, await statusOf(email, path)]).toEqual([path, 404]);
      }
    }));
});

async function seesNoEngineering(page: Page, email: string): Promise<void> {
  for (const place of ['Scenarios', 'Runs', 'Reach']) {
    expect(await page.getByRole('link', { name: new RegExp(`^${place}\\b`) }).count()).toBe(0);
  }
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  expect(await axeViolations(page)).toEqual([]);
  for (const path of ENGINEERS_ONLY) {
    expect([path, await statusOf(email, path)]).toEqual([path, 404]);
  }
  await page.goto('/studies/1/runs/1');
  await page.waitForFunction(() => !document.querySelector('[role=progressbar]'));
  expect(await page.getByText(/peak stage/i).count()).toBe(0);
}

const tokens = new Map<string, string>();

/** Asked straight at the API, with the rights of that person. */
async function statusOf(email: string, path: string): Promise<number> {
  if (!tokens.has(email)) {
    const signedIn = await fetch(`${productUrl()}/api/auth/sign-in`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify({ email, password: DEMO_PASSWORD }),
    });
    tokens.set(email, ((await signedIn.json()) as { accessToken: string }).accessToken);
  }
  const headers = { authorization: `Bearer ${tokens.get(email)}` };
  return (await fetch(productUrl() + path, { headers })).status;
}

const emailOf = (name: string) => DEMO_ACCOUNTS.find((account) => account.name === name)!.email;

import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { emailOf } from '../helpers/accounts';
import { apiOf } from '../helpers/api';
import { axeViolations } from '../helpers/axe';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { mailTo } from '../helpers/mailTo';
import { signIn } from '../helpers/steps';

jest.setTimeout(600_000);

let browser: Browser;
const files = mkdtempSync(path.join(tmpdir(), 'check-path-'));
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser.close();
  rmSync(files, { recursive: true, force: true });
});

const WORDS = 'The piers take a third of the area; the step stays on finer cells.';

describe.each(Object.keys(SIZES) as Size[])('at %s size', (size) => {
  const as = (name: string, walk: (page: Page) => Promise<void>) =>
    visit(browser, size, `check-${name}`, async ({ page }) => {
      await signIn(page, emailOf(name), DEMO_PASSWORD, null);
      await walk(page);
      expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
      expect(await axeViolations(page)).toEqual([]);
    });

  it('takes a finished run from its modeller over the signature to the client', async () => {
    const check = `/studies/1/runs/${await routeAgain()}/check`;
    await as('Ines Corrow', async (page) => {
      await page.goto(check);
      await answerAll(page);
      await page.getByLabel('Method').fill('Finite volumes on 25 m cells.');
      await page.getByLabel('Assumptions').fill('Inflow as given by the council.');
      await page.getByLabel('Limits').fill('Not behind the mill dyke.');
      await page.getByRole('button', { name: 'Send for checking' }).click();
      await page.getByText("The modeller's note").waitFor();
    });

    await as('Rurik Tesk', async (page) => {
      await page.goto('/queue');
      await page.locator(`a[href="${check}"]`).click();
      await page.getByRole('button', { name: 'Raise a point' }).click();
      await page.getByLabel('Point', { exact: true }).fill('Is the step at the bridge the grid?');
      await page.getByRole('button', { name: 'Raise the point' }).click();
      await page.getByText('One point is open.').waitFor();
      const sign = page.getByRole('button', { name: /^Sign/ });
      expect(await sign.isDisabled()).toBe(true);
      await page.getByRole('button', { name: 'Return the run to the modeller' }).click();
      await page.getByLabel('Reason').fill('Answer the point at the bridge.');
      await page.getByRole('button', { name: 'Return the run', exact: true }).click();
      await page.getByText('Returned to the modeller').waitFor();
    });

    await as('Ines Corrow', async (page) => {
      await page.goto(check);
      await page.getByText('Answer the point at the bridge.').waitFor();
      await page.getByRole('button', { name: /^Answer: Is the step/ }).click();
      await page.getByRole('textbox', { name: 'Your answer' }).fill(WORDS);
      await page.getByRole('button', { name: 'Send the answer' }).click();
      await page.getByText(WORDS).waitFor();
      await page.getByRole('button', { name: 'Send for checking again' }).click();
      await page.getByText('One point is answered and not closed.').waitFor();
    });

    let code = '';
    const report = path.join(files, `${size}.pdf`);
    await as('Rurik Tesk', async (page) => {
      await page.goto(check);
      await page.getByRole('button', { name: /^Close: / }).click();
      await page.getByRole('button', { name: 'Close the point' }).click();
      await page.getByRole('button', { name: 'Sign the run' }).click();
      await page.getByLabel('Your password again').fill('not the password');
      await page.getByRole('button', { name: 'Sign', exact: true }).click();
      await page.getByText(/This is not your password/).waitFor();
      await page.getByLabel('Your password again').fill(DEMO_PASSWORD);
      await page.getByRole('button', { name: 'Sign', exact: true }).click();
      code = await page.locator('a[href^="/verify/"]').innerText();
      await save(page, 'Report, PDF', report);
      await page.getByRole('button', { name: 'Issue to the client' }).click();
      await page.getByText('Told by e-mail: Maud Ferrin.').waitFor();
      await page.getByRole('button', { name: 'Issue', exact: true }).click();
      await page.getByRole('link', { name: 'See what the client sees' }).waitFor();
    });
    const text = execFileSync('pdftotext', [report, '-'], { encoding: 'utf8' });
    expect(text).toContain(code);
    expect(text).toContain('Rurik Tesk');
    expect(text).not.toContain('PRELIMINARY');

    await as('Maud Ferrin', async (page) => {
      await page.goto('/studies/1');
      await page.getByText(/at the peak/).waitFor();
      const reach = page.getByRole('slider', { name: 'Place on the reach' });
      await reach.press('End');
      await page.getByRole('region', { name: 'Gauge at Ebbick' }).waitFor();
      const clients = path.join(files, `${size}-client.pdf`);
      await save(page, 'Read the report, PDF', clients);
      expect(readFileSync(clients).equals(readFileSync(report))).toBe(true);
      await page.getByRole('button', { name: 'I have read this' }).click();
      await page.getByText(/You confirmed on/).waitFor();
    });
    expect(mailTo(emailOf('Maud Ferrin'))).toMatch(/studies\/1/);
    expect(mailTo(emailOf('Rurik Tesk'))).toContain(check);

    await verifies(size, code, report);

    await as('Ada Pyke', async (page) => {
      await page.goto('/audit');
      await page.getByLabel('Action').fill('run.signed');
      await page.getByText('Refused').first().waitFor();
      await page
        .getByText(/^Signed: /)
        .first()
        .waitFor();
    });
  });
});

/** A new run of the first scenario, once it is routed: what is signed never changes, so each walk needs its own. */
async function routeAgain(): Promise<number> {
  const api = await apiOf(emailOf('Ines Corrow'));
  const { id } = await api.send<{ id: number }>('POST', '/scenarios/1/runs');
  for (;;) {
    const run = await api.get<{ state: string; failure: string | null }>(`/runs/${id}`);
    if (run.state === 'routed') return id;
    if (run.state !== 'queued' && run.state !== 'running')
      throw new Error(`${run.state}: ${run.failure}`);
    await new Promise((resolve) => setTimeout(resolve, 500));
  }
}

/** Words on every item of the checklist that waits for them. */
async function answerAll(page: Page): Promise<void> {
  const waiting = page.getByRole('button', { name: /^Answer: / });
  await waiting.first().waitFor();
  for (let left = await waiting.count(); left > 0; left = await waiting.count()) {
    await waiting.first().click();
    const words = page.getByRole('textbox', { name: /^Your words/ });
    await words.fill('Looked at; fit for what the study asks.');
    await page.getByRole('button', { name: 'Save the words' }).click();
    await words.waitFor({ state: 'detached' });
  }
}

async function save(page: Page, button: string, file: string): Promise<void> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: button }).click(),
  ]);
  await download.saveAs(file);
}

/** Without an account: the report is the very one, one changed byte is found, a guessed code tells nothing. */
const verifies = (size: Size, code: string, report: string) =>
  visit(browser, size, 'verification', async ({ page }) => {
    await page.goto('/verify');
    await page.getByLabel('Verification code').fill(code);
    await page.getByRole('button', { name: 'Look it up' }).click();
    await page.getByText('the signature stands').waitFor();
    const choose = page.locator('input[type=file]');
    await choose.setInputFiles(report);
    await page.getByText('It is the very report that was signed').waitFor();
    const tampered = path.join(files, `${size}-tampered.pdf`);
    const bytes = readFileSync(report);
    bytes[bytes.length >> 1] ^= 1;
    writeFileSync(tampered, bytes);
    await choose.setInputFiles(tampered);
    await page.getByText('It is not the report that was signed').waitFor();
    expect(await axeViolations(page)).toEqual([]);
    await page.goto('/verify/AAAA-BBBB-CCCC-DDDD');
    await page.getByText('No signed report carries this code').waitFor();
    expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  });

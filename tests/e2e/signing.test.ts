import { execFileSync } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import type { Me } from '@/shared/accounts/types';
import type { Review } from '@/shared/review/types';
import type { Run, RunRow } from '@/shared/runs/types';
import type { ScenarioRow } from '@/shared/scenarios/types';
import type { Study } from '@/shared/studies/types';
import { emailOf } from '../helpers/accounts';
import { apiOf } from '../helpers/api';
import { axeViolations } from '../helpers/axe';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { signIn } from '../helpers/steps';

jest.setTimeout(400_000);

const MODELLER = emailOf('Ines Corrow');
const SENIOR = emailOf('Rurik Tesk');
const CLIENT = emailOf('Maud Ferrin');

let browser: Browser;
let folder: string;
beforeAll(async () => {
  browser = await launchBrowser();
  folder = mkdtempSync(path.join(tmpdir(), 'spate-e2e-'));
});
afterAll(async () => {
  await browser.close();
  rmSync(folder, { recursive: true, force: true });
});

describe.each(Object.keys(SIZES) as Size[])('from routed run to client, %s', (size) => {
  it('is checked, signed, issued, read and verified', async () => {
    const run = await routedDamBreak();
    const check = `/studies/${run.studyId}/runs/${run.id}/check`;

    // The modeller sends it, and answers what the checklist asks.
    await visit(browser, size, 'signing-modeller', async ({ page }) => {
      await signIn(page, MODELLER, DEMO_PASSWORD);
      await page.goto(check);
      await page
        .getByRole('textbox', { name: /^Method/ })
        .fill('Shallow-water solver, 10 m cells.');
      await page.getByRole('textbox', { name: /^Assumptions/ }).fill('Sudden and total failure.');
      await page.getByRole('textbox', { name: /^Limits/ }).fill('Not for the design of works.');
      await page.getByRole('button', { name: 'Send for checking' }).click();
      await page.getByText('In check').first().waitFor();
      await answerAll(page);
      await looksRight(page);
      // Whoever asked for the run is offered no signature.
      expect(await page.getByRole('button', { name: /^Sign/ }).count()).toBe(0);
    });
    expect(await refusedToSign(MODELLER, run)).toMatch(/answered 40[34]/);

    // The senior engineer finds it in the queue and raises a point: nothing can be signed while it is open.
    await visit(browser, size, 'signing-senior', async ({ page }) => {
      await signIn(page, SENIOR, DEMO_PASSWORD);
      await page.goto('/queue');
      await page
        .getByText(/Quenlow dam/)
        .first()
        .waitFor();
      await looksRight(page);
      await page.goto(check);
      await page.getByRole('button', { name: 'Raise a point' }).click();
      await page.getByRole('textbox', { name: /^Point/ }).fill('Why is the valley dry at first?');
      await page.getByRole('button', { name: 'Raise the point' }).click();
      await page.getByText('Why is the valley dry at first?').first().waitFor();
      await page.getByRole('button', { name: /^Sign: not yet/ }).waitFor();
    });
    expect(await refusedToSign(SENIOR, run)).toMatch(/answered 409/);

    await visit(browser, size, 'signing-answer', async ({ page }) => {
      await signIn(page, MODELLER, DEMO_PASSWORD);
      await page.goto(check);
      await page.getByRole('button', { name: /^Answer: Why is the valley/ }).click();
      await page.getByRole('textbox', { name: 'Your answer' }).fill('A dry day in late summer.');
      await page.getByRole('button', { name: 'Send the answer' }).click();
      await page.getByText('A dry day in late summer.').first().waitFor();
    });

    // Closed, signed with the password, issued.
    await visit(browser, size, 'signing-sign', async ({ page }) => {
      await signIn(page, SENIOR, DEMO_PASSWORD);
      await page.goto(check);
      await page.getByRole('button', { name: /^Close: Why is the valley/ }).click();
      await page.getByRole('button', { name: 'Close the point' }).click();
      await page.getByRole('button', { name: 'Sign the run' }).click();
      await page.getByLabel('Your password again').fill('not the password');
      await page.getByRole('button', { name: 'Sign', exact: true }).last().click();
      await page
        .getByText(/not your (present )?password/)
        .first()
        .waitFor();
      await page.getByLabel('Your password again').fill(DEMO_PASSWORD);
      await page.getByRole('button', { name: 'Sign', exact: true }).last().click();
      await page.getByRole('button', { name: 'Issue to the client' }).click();
      await page.getByRole('button', { name: 'Issue', exact: true }).click();
      await page.getByText('Issued').first().waitFor();
      await looksRight(page);
    });
    expect(mailTo(CLIENT).some((text) => text.includes('Quenlow dam'))).toBe(true);

    // The client reads it and takes the report.
    const report = path.join(folder, `${size}.pdf`);
    await visit(browser, size, 'signing-client', async ({ page }) => {
      await signIn(page, CLIENT, DEMO_PASSWORD);
      await page.goto(`/studies/${run.studyId}`);
      await page
        .getByText(/m at the peak/)
        .first()
        .waitFor();
      await looksRight(page);
      const [download] = await Promise.all([
        page.waitForEvent('download'),
        page
          .getByRole('button', { name: /Read the report/ })
          .first()
          .click(),
      ]);
      writeFileSync(report, readFileSync(await download.path()));
      await page.getByRole('button', { name: 'I have read this' }).first().click();
      await page
        .getByText(/You confirmed/)
        .first()
        .waitFor();
    });

    // What the PDF says, and that it can be drawn.
    const text = execFileSync('pdftotext', ['-layout', report, '-'], { encoding: 'utf8' });
    expect(text).toContain('Quenlow dam');
    expect(text).toContain('Rurik Tesk');
    expect(text).toContain(run.caseHash.slice(7, 23));
    expect(text).not.toContain('PRELIMINARY');
    execFileSync('pdftoppm', ['-r', '40', '-png', report, path.join(folder, size)]);
    expect(
      readdirSync(folder).filter((name) => name.startsWith(`${size}-`)).length,
    ).toBeGreaterThan(3);

    // Anybody verifies it; a byte more, and it is not the report.
    const api = await apiOf(SENIOR);
    const { signOff } = await api.get<Review>(`/runs/${run.id}/review`);
    await visit(browser, size, 'signing-verify', async ({ page }) => {
      await page.goto(`/verify/${signOff!.verificationCode}`);
      await page.getByText('This report was signed, and the signature stands').first().waitFor();
      const pdf = readFileSync(report);
      await compare(page, pdf);
      await page.getByText('It is the very report that was signed').first().waitFor();
      await compare(page, Buffer.concat([pdf, Buffer.from(' ')]));
      await page.getByText('It is not the report that was signed').first().waitFor();
      await looksRight(page);
      await page.goto('/verify/AAAA-BBBB-CCCC-DDDD');
      await page.getByText('No signed report carries this code').first().waitFor();
    });

    // From now on nothing of it changes.
    await expect(
      (await apiOf(MODELLER)).send('PUT', `/runs/${run.id}/review/answers`, {
        answers: [{ id: 'purposeFit', answer: 'Changed afterwards.' }],
      }),
    ).rejects.toThrow(/answered 40[39]/);
  });
});

/** A fresh run of the demo dam failure, shared with the client, to its end. */
async function routedDamBreak(): Promise<Run> {
  const api = await apiOf(MODELLER);
  const studies = await api.get<Study[]>('/studies');
  const study = studies.find(({ title }) => title.startsWith('Quenlow dam'))!;
  const client = await (await apiOf(CLIENT)).get<Me>('/me');
  await api.send('PUT', `/studies/${study.id}/members`, { userId: client.id, as: 'client' });
  const [scenario] = await api.get<ScenarioRow[]>(`/studies/${study.id}/scenarios`);
  const { id } = await api.send<Run>('POST', `/scenarios/${scenario.id}/runs`);
  const deadline = Date.now() + 240_000;
  for (;;) {
    const run = await api.get<Run>(`/runs/${id}`);
    if (run.state === 'routed') return run;
    if (Date.now() > deadline || run.state === 'failed')
      throw new Error(`Run ${id} is ${run.state}: ${run.failure}`);
    await new Promise((resolve) => setTimeout(resolve, 500));
  }
}

/** Every item of the checklist that waits for the modeller's words. */
async function answerAll(page: Page): Promise<void> {
  const waiting = page.getByRole('button', { name: /^Answer: / });
  for (let left = await waiting.count(); left > 0; left--) {
    await waiting.first().click();
    await page.getByRole('textbox', { name: /^Your words on/ }).fill('As the note says.');
    await page.getByRole('button', { name: 'Save the words' }).click();
    await page.getByRole('textbox', { name: /^Your words on/ }).waitFor({ state: 'detached' });
  }
}

/** What the API says to a signature straight at its door. */
async function refusedToSign(email: string, run: RunRow): Promise<string> {
  const body = { statement: 'I confirm.', password: DEMO_PASSWORD };
  const api = await apiOf(email);
  return api.send('POST', `/runs/${run.id}/review/sign`, body).then(
    () => 'it was signed',
    (error: Error) => error.message,
  );
}

const compare = (page: Page, buffer: Buffer) =>
  page
    .locator('input[type=file]')
    .setInputFiles({ name: 'report.pdf', mimeType: 'application/pdf', buffer });

/** What was sent to an address, from the mailbox that is kept as files. */
function mailTo(address: string): string[] {
  const mailbox = path.join(process.env.SPATE_E2E_DATA_DIR!, 'mail');
  return readdirSync(mailbox)
    .filter((name) => name.endsWith('.json'))
    .map((name) => JSON.parse(readFileSync(path.join(mailbox, name), 'utf8')))
    .filter((message: { to: string }) => message.to === address)
    .map((message: { subject: string; text: string }) => `${message.subject}\n${message.text}`);
}

async function looksRight(page: Page): Promise<void> {
  await page.waitForFunction(() => !document.querySelector('[role=progressbar]'));
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  expect(await axeViolations(page)).toEqual([]);
}

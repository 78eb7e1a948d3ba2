import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { lowerVeshall } from '@/seed/reaches/lowerVeshall';
import { faultySurveyFile } from '@/seed/surveyFiles';
import type { Study } from '@/shared/studies/types';
import type { UserRow } from '@/shared/accounts/types';
import { emailOf } from '../helpers/accounts';
import { apiOf } from '../helpers/api';
import { axeViolations } from '../helpers/axe';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { mailTo } from '../helpers/mailTo';
import { goTo, signIn } from '../helpers/steps';

jest.setTimeout(300_000);

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const [MODELLER, SURVEYOR] = ['Ines Corrow', 'Dov Hallam'].map(emailOf);
const REMARKS = 'XS-12 stands too high: check the instrument height.';

/** The demo river as a dense scan of the bank, large enough to travel in several parts. */
function largeFile(note: string): Buffer {
  const rows = lowerVeshall().flatMap(({ id, chainage, points }) =>
    points.slice(1).flatMap(([offset, elevation], k) =>
      Array.from({ length: 16 }, (_, i) => {
        const [fromOffset, fromElevation] = points[k];
        const share = i / 16;
        const at = fromOffset + share * (offset - fromOffset);
        const level = fromElevation + share * (elevation - fromElevation);
        return `${id},${chainage},${at.toFixed(4)},${level.toFixed(4)}`;
      }),
    ),
  );
  const heading = 'Section,Chainage (m),Offset (m),Elevation (m)';
  return Buffer.from([heading, ...rows].join('\n') + '\n'.repeat(note.length));
}

const choose = (page: Page, name: string, buffer: Buffer) =>
  page.locator('input[type=file]').first().setInputFiles({ name, mimeType: 'text/csv', buffer });
async function looksRight(page: Page): Promise<void> {
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  expect(await axeViolations(page)).toEqual([]);
}

describe.each(Object.keys(SIZES) as Size[])('hand-in from the bank, %s', (size) => {
  it('goes on after a lost connection and a reload, is returned with remarks, mended and accepted', async () => {
    const title = `Bank of the Veshall ${Date.now()}, ${size}`;
    const study = await sharedStudy(title);
    const survey = `/studies/${study.id}/survey`;

    await visit(browser, size, 'handIn-surveyor', async ({ page }) => {
      await signIn(page, SURVEYOR, DEMO_PASSWORD);
      await page
        .getByRole('link', { name: new RegExp(`${title}.*nothing handed in yet`, 's') })
        .click();
      await goTo(page, 'Survey');
      await page.waitForURL(`**${survey}`);

      // Faults in plain words, then the mended file.
      await choose(page, 'bank.xlsx', faultySurveyFile(lowerVeshall()));
      await page.getByRole('heading', { name: /Not taken in: 4 faults/ }).waitFor();
      await looksRight(page);

      // The connection goes after the first part: what has arrived is kept.
      let parts = 0;
      await page.route('**/api/uploads/*', async (route) => {
        if (route.request().method() === 'PATCH' && ++parts > 1) return route.abort();
        return route.continue();
      });
      const file = largeFile('first');
      await choose(page, 'bank.csv', file);
      await page.getByText('No connection').waitFor();
      await page.getByText(/0\.25 of [\d.]+ MB have arrived/).waitFor();
      await looksRight(page);

      // The page is closed and opened: the same file goes on from there, and again by itself after a break.
      await page.reload();
      await page.getByText(/0\.25 of [\d.]+ MB have arrived/).waitFor();
      await looksRight(page);
      const begunAt: number[] = [];
      await page.unroute('**/api/uploads/*');
      await page.route('**/api/uploads/*', async (route) => {
        const request = route.request();
        if (request.method() === 'PATCH') {
          begunAt.push(Number(request.headers()['upload-offset']));
          if (begunAt.length === 2) return route.abort();
        }
        return route.continue();
      });
      await choose(page, 'bank.csv', file);
      await page.getByRole('heading', { name: /^Read(, | without)/ }).waitFor();
      expect(begunAt[0]).toBe(256 * 1024);
      expect(begunAt[2]).toBe(begunAt[1]);
      await looksRight(page);
      await page.getByRole('button', { name: 'Hand in this survey' }).click();
      await page.getByText('Handed in as revision 1').waitFor();
      await looksRight(page);
    });
    await mailed(MODELLER, `Survey handed in: ${title}`);

    const decide = (words: string, press: string) =>
      visit(browser, size, 'handIn-modeller', async ({ page }) => {
        await signIn(page, MODELLER, DEMO_PASSWORD, survey);
        await page.getByRole('row', { name: /Waits for an engineer/ }).click();
        await page.getByLabel(/^Remarks/).fill(words);
        await looksRight(page);
        await page.getByRole('button', { name: press }).click();
        await page
          .getByText(/^(Accepted|Returned) by Ines Corrow/)
          .first()
          .waitFor();
      });
    await decide(REMARKS, 'Return it');
    await mailed(SURVEYOR, `Survey returned: ${title}`);
    expect(mailTo(SURVEYOR)).toContain(REMARKS);

    await visit(browser, size, 'handIn-again', async ({ page }) => {
      await signIn(page, SURVEYOR, DEMO_PASSWORD);
      await page
        .getByRole('link', { name: new RegExp(`${title}.*returned to be mended`, 's') })
        .click();
      await goTo(page, 'Survey');
      await page.getByText(REMARKS).waitFor();
      await looksRight(page);
      await choose(page, 'bank.csv', largeFile('second time'));
      await page.getByRole('button', { name: 'Hand in this survey' }).click();
      await page.getByText('Handed in as revision 2').waitFor();
    });
    await decide('Good now.', 'Accept the survey');
    await mailed(SURVEYOR, `Survey accepted: ${title}`);
  });
});

/** Mails leave after the answer: a moment is given to them. */
async function mailed(to: string, words: string): Promise<void> {
  const until = Date.now() + 10_000;
  while (!mailTo(to).includes(words) && Date.now() < until)
    await new Promise((resolve) => setTimeout(resolve, 100));
  expect(mailTo(to)).toContain(words);
}

/** A study of the modeller that the surveyor may hand in for. */
async function sharedStudy(title: string): Promise<Study> {
  const api = await apiOf(MODELLER);
  const body = {
    title,
    clientName: '',
    place: 'Tornick',
    verticalDatum: 'Local datum',
    unitSystem: 'metric',
    purpose: '',
  };
  const study = await api.send<Study>('POST', '/studies', body);
  const users = await api.get<UserRow[]>('/users');
  const surveyor = users.find(({ email }) => email === SURVEYOR)!;
  await api.send('PUT', `/studies/${study.id}/members`, { userId: surveyor.id, as: 'surveyor' });
  return study;
}

import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Browser, Download, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { lowerVeshall } from '@/seed/reaches/lowerVeshall';
import { faultySurveyFile, surveyFile } from '@/seed/surveyFiles';
import type { ResultFile } from '@/shared/case/resultFile';
import { formatQuantity } from '@/shared/units/format';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { axeViolations } from '../helpers/axe';
import { goTo, signInByForm } from '../helpers/steps';

jest.setTimeout(300_000);

const XLSX = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';
const STATION = 'XS-20';

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

describe.each(Object.keys(SIZES) as Size[])('from workbook to routed flood, %s', (size) => {
  it('takes a modeller from the spreadsheet to a peak that all three doors agree on', () =>
    visit(browser, size, 'mainPath', async ({ page }) => {
      const sections = lowerVeshall();
      await signInByForm(page, 'ines.corrow@pykemorrow.example', DEMO_PASSWORD);

      // A study.
      await page.goto('/studies/new');
      await page.getByLabel('Title').fill(`Path of a flood, ${size}`);
      await page.getByLabel('Vertical datum').fill('Local datum of Tornick');
      await page.getByRole('button', { name: 'Make the study' }).click();
      await page.waitForURL(/\/studies\/\d+$/);
      await looksRight(page);

      // A faulty survey: every fault at its place, and nothing kept.
      await goTo(page, 'Survey');
      await choose(page, 'faulty.xlsx', faultySurveyFile(sections));
      await page.getByRole('heading', { name: /Not taken in: 4 faults/ }).waitFor();
      const faults = page.getByRole('list', { name: 'Faults' });
      for (const words of [
        'Elevation is missing',
        /Offset goes back/,
        /far from the rest/,
        /stands twice/,
      ]) {
        await faults.getByText(words).first().waitFor();
      }
      await faults
        .getByText(/Sheet Main/)
        .first()
        .waitFor();
      await looksRight(page);

      // The mended one.
      await choose(page, 'veshall.xlsx', surveyFile(sections));
      await page.getByRole('heading', { name: /^Read(, | without)/ }).waitFor();
      await looksRight(page);
      await page.getByRole('button', { name: 'Take in this survey' }).click();
      await page
        .getByText(/Revision 1/)
        .first()
        .waitFor();

      // A scenario: a run cannot be asked for while something is missing.
      await goTo(page, 'Scenarios');
      await page.getByLabel('Name').fill('Design flood');
      await page.getByRole('button', { name: 'Make the scenario' }).click();
      await page.waitForURL(/\/scenarios\/\d+/);
      await fill(page, 'Peak flow', '');
      await fill(page, 'Time to peak', '8');
      await fill(page, 'Base flow', '40');
      await page.getByRole('list', { name: 'To mend' }).waitFor();
      await page.getByRole('button', { name: 'Route this flood' }).isDisabled();
      await fill(page, 'Peak flow', '320');
      await fill(page, 'Cell size', '100');
      await fill(page, 'Duration', '30');
      await looksRight(page);
      await page.getByRole('button', { name: 'Save', exact: true }).click();
      const route = page.getByRole('button', { name: 'Route this flood' });
      await route.and(page.locator(':not([aria-disabled="true"]):not([disabled])')).click();

      // The run, watched to its end.
      await page.waitForURL(/\/runs\/\d+/);
      await page.getByRole('heading', { name: /Peaks at/ }).waitFor({ timeout: 120_000 });
      await looksRight(page);

      // The peak at a section, on the screen.
      await page.goto(`${page.url().split('?')[0]}?at=${chainageOf(sections, STATION)}`);
      const figures = page.getByRole('region', { name: STATION });
      await figures.waitFor();
      const shown = (await figures.innerText()).replaceAll('\u00a0', ' ');

      // The same from the files.
      const csv = await saved(page, /CSV/);
      const caseText = await saved(page, /Case file/);
      const casePath = path.join(folder, `${size}.json`);
      writeFileSync(casePath, caseText);
      const routed = JSON.parse(
        execFileSync('npm', ['run', '--silent', 'route', '--', casePath], {
          encoding: 'utf8',
          maxBuffer: 1e9,
          stdio: ['ignore', 'pipe', 'ignore'],
        }),
      ) as ResultFile;
      const station = routed.sections.find(({ id }) => id === STATION)!;

      expect(routed.caseHash).toBe(`sha256:${createHash('sha256').update(caseText).digest('hex')}`);
      expect(shown).toContain(formatQuantity(station.peak.stage, 'elevation', 'metric'));
      expect(shown).toContain(formatQuantity(station.peak.flow, 'flow', 'metric'));
      expect(seriesOf(csv, STATION, /stage/i)).toEqual(station.stage);
      expect(seriesOf(csv, STATION, /flow/i)).toEqual(station.flow);
    }));
});

/** No sideways scrolling, and nothing that axe finds wrong by WCAG 2.2 A and AA. */
async function looksRight(page: Page): Promise<void> {
  await page.waitForFunction(() => !document.querySelector('[role=progressbar]'));
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  expect(await axeViolations(page)).toEqual([]);
}

const choose = (page: Page, name: string, buffer: Buffer) =>
  page.locator('input[type=file]').first().setInputFiles({ name, mimeType: XLSX, buffer });

async function fill(page: Page, label: string, value: string): Promise<void> {
  const field = page.getByRole('textbox', { name: new RegExp(`^${label}`) });
  await field.fill(value);
  await field.blur();
}

const chainageOf = (sections: { id: string; chainage: number }[], id: string) =>
  sections.find((section) => section.id === id)!.chainage;

async function saved(page: Page, label: RegExp): Promise<string> {
  const [download]: [Download, void] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: label }).first().click(),
  ]);
  return readFileSync(await download.path(), 'utf8');
}

/** One column of the long table at one section, in the order of its times. */
function seriesOf(csv: string, id: string, heading: RegExp): number[] {
  const [head, ...lines] = csv.trim().split(/\r?\n/);
  const column = head.split(',').findIndex((title) => heading.test(title));
  return lines
    .map((line) => line.split(','))
    .filter(([section]) => section === id)
    .map((cells) => Number(cells[column]));
}

import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { lowerVeshall } from '@/seed/reaches/lowerVeshall';
import { surveyFile } from '@/seed/surveyFiles';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { axeViolations } from '../helpers/axe';
import { goTo, signIn } from '../helpers/steps';

jest.setTimeout(240_000);

const XLSX = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe.each(Object.keys(SIZES) as Size[])('from survey to working geometry, %s', (size) => {
  it('takes a modeller from the survey to changed sections that can be routed', () =>
    visit(browser, size, 'workingGeometry', async ({ page }) => {
      const sections = lowerVeshall();
      await signIn(page, 'ines.corrow@pykemorrow.example', DEMO_PASSWORD);
      await page.goto('/studies/new');
      await page.getByLabel('Title').fill(`Dredging, ${size}`);
      await page.getByLabel('Vertical datum').fill('Local datum of Tornick');
      await page.getByLabel('Coordinate system').fill('Valley grid');
      await page.getByRole('button', { name: 'Make the study' }).click();
      await page.waitForURL(/\/studies\/\d+$/);
      await goTo(page, 'Survey');
      await page
        .locator('input[type=file]')
        .first()
        .setInputFiles({ name: 'veshall.xlsx', mimeType: XLSX, buffer: surveyFile(sections) });
      await page.getByRole('button', { name: 'Take in this survey' }).click();
      await page.getByText('Taken in as revision 1').waitFor();

      // A working geometry of it.
      await goTo(page, 'Reach');
      await page.getByRole('button', { name: 'Make a working geometry' }).click();
      await page.getByRole('textbox', { name: 'Name' }).fill('Dredged');
      await page
        .getByRole('dialog')
        .getByRole('button', { name: 'Make the working geometry' })
        .click();
      await page.waitForURL(/\/reach\/\d+/);
      const drawing = page.getByRole('slider', { name: 'Points of XS-01' });
      await drawing.waitFor();
      await looksRight(page);

      // Two rows pasted over the first two points.
      const first = sections[0].points;
      const offset = (point: number) => page.getByLabel(`Offset of point ${point},`);
      const elevation = (point: number) => page.getByLabel(`Elevation of point ${point},`);
      await paste(page, offset(1), `0\t${first[0][1] + 1}\n${first[1][0]}\t${first[1][1] + 0.5}`);
      await expectValue(elevation(1), first[0][1] + 1);
      await expectValue(elevation(2), first[1][1] + 0.5);

      // The first point dragged up, and taken back.
      const box = (await drawing.boundingBox())!;
      const handle = (await drawing.locator('> div').boundingBox())!;
      const at = [handle.x + handle.width / 2, handle.y + handle.height / 2] as const;
      await page.mouse.move(...at);
      await page.mouse.down();
      await page.mouse.move(at[0], Math.max(box.y + 12, at[1] + 30), { steps: 4 });
      await page.mouse.up();
      await page.getByRole('button', { name: /^Undo: XS-01: point 1 moved/ }).click();
      await expectValue(elevation(1), first[0][1] + 1);

      // By key a centimetre; what is no number is said where it stands, and keeps it from being saved.
      await drawing.focus();
      await page.keyboard.press('ArrowUp');
      await expectValue(elevation(1), first[0][1] + 1.01);
      await elevation(2).fill('4o.2');
      await elevation(2).blur();
      await page.getByText('“4o.2” is not a number.').waitFor();
      await page.getByText('A number cannot be read.').waitFor();
      await elevation(2).fill(String(first[1][1]));
      await elevation(2).blur();

      // Sections in between, then fewer points, with what it costs said before.
      await page.getByLabel('What to do').selectOption('fill');
      await page.getByRole('textbox', { name: /^No farther apart than/ }).fill('0.3');
      await page.getByText(/sections more\./).waitFor();
      await page.getByRole('button', { name: 'Put sections in between' }).click();
      await page.getByLabel('What to do').selectOption('thin');
      await page.getByRole('textbox', { name: /^Tolerance/ }).fill('0.05');
      await page.getByText(/Area below the lower bank changes by at most/).waitFor();
      await looksRight(page);
      await page.getByRole('button', { name: 'Thin the points out' }).click();

      // Still there after the page was loaded again; then saved, and told in the history.
      page.on('dialog', (dialog) => void dialog.accept());
      await page.reload();
      await page.getByText('What you had not saved is here again').waitFor();
      await page.getByRole('button', { name: 'Save', exact: true }).click();
      await page.getByText('Version 2', { exact: true }).waitFor();
      await page.getByText(/XS-01: point 1 moved/).waitFor();

      // What changed against the survey.
      await page.goto(`${new URL(page.url()).pathname.replace(/reach\/\d+.*/, 'survey/compare')}`);
      await page.getByRole('table', { name: 'Sections compared' }).waitFor();
      await page
        .getByText(/ new\./)
        .or(page.getByText(/ new, /))
        .first()
        .waitFor();
      await looksRight(page);

      // A scenario on it can be routed.
      await goTo(page, 'Scenarios');
      await page.getByLabel('Name').fill('On the dredged bed');
      await page.getByLabel('Reach').selectOption({ label: 'Dredged' });
      await page.getByRole('button', { name: 'Make the scenario' }).click();
      await page.waitForURL(/\/scenarios\/\d+/);
      for (const [label, value] of [
        ['Base flow', '40'],
        ['Peak flow', '320'],
        ['Time to peak', '8'],
        ['Cell size', '200'],
        ['Duration', '4'],
      ]) {
        const field = page.getByRole('textbox', { name: new RegExp(`^${label}`) });
        await field.fill(value);
        await field.blur();
      }
      await page.getByRole('button', { name: 'Save', exact: true }).click();
      const route = page.getByRole('button', { name: 'Route this flood' });
      await route.and(page.locator(':not([aria-disabled="true"]):not([disabled])')).click();
      await page.waitForURL(/\/runs\/\d+/);
      await page.getByRole('heading', { name: /Peaks at/ }).waitFor({ timeout: 120_000 });

      // Its widest water in the plan of the reach.
      await goTo(page, 'Reach');
      await page.getByLabel('Widest water of a run').selectOption({ index: 1 });
      await page.getByText(/Between them it is drawn/).waitFor();
      await looksRight(page);
      const [download] = await Promise.all([
        page.waitForEvent('download'),
        page.getByRole('button', { name: 'Plan and water as GeoJSON' }).click(),
      ]);
      expect(download.suggestedFilename()).toBe('run-1-plan.geojson');
    }));
});

async function looksRight(page: Page): Promise<void> {
  await page.waitForFunction(() => !document.querySelector('[role=progressbar]'));
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  expect(await axeViolations(page)).toEqual([]);
}

type Field = ReturnType<Page['getByLabel']>;

/** As a browser pastes: what stands on the clipboard comes with the event. */
async function paste(page: Page, field: Field, text: string): Promise<void> {
  await field.focus();
  await field.evaluate((input, pasted) => {
    const clipboardData = new DataTransfer();
    clipboardData.setData('text/plain', pasted);
    input.dispatchEvent(
      new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }),
    );
  }, text);
}

/** Waits for the figure rather than looking once: the page draws after the event. */
async function expectValue(field: Field, metres: number): Promise<void> {
  const near = async () => Math.abs(Number(await field.inputValue()) - metres) < 1e-6;
  for (let tries = 0; tries < 50 && !(await near()); tries++)
    await field.page().waitForTimeout(100);
  expect(Number(await field.inputValue())).toBeCloseTo(metres, 6);
}

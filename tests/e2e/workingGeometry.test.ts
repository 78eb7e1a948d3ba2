import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { lowerVeshall } from '@/seed/reaches/lowerVeshall';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { axeViolations } from '../helpers/axe';
import { goTo, signIn } from '../helpers/steps';

jest.setTimeout(240_000);

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
      await page
        .getByRole('link', { name: /^Lower Veshall at Tornick/ })
        .first()
        .click();
      await page.waitForURL(/\/studies\/\d+$/);

      // A working geometry of it.
      await goTo(page, 'Reach');
      await page.getByRole('button', { name: 'Make a working geometry' }).click();
      await page.getByRole('textbox', { name: 'Name' }).fill(`Dredged, ${size}`);
      await page
        .getByRole('dialog')
        .getByRole('button', { name: 'Make the working geometry' })
        .click();
      await page.waitForURL(/\/reach\/\d+/);
      const drawing = page.getByRole('slider', { name: 'Points of XS-01' });
      await drawing.waitFor();

      // Two rows pasted over the first two points.
      const first = sections[0].points;
      const offset = (point: number) => page.getByLabel(`Offset of point ${point},`);
      const elevation = (point: number) => page.getByLabel(`Elevation of point ${point},`);
      await paste(page, offset(1), `0\t${first[0][1] + 1}\n${first[1][0]}\t${first[1][1] + 0.5}`);
      await expectValue(elevation(1), first[0][1] + 1);
      await expectValue(elevation(2), first[1][1] + 0.5);

      // The first point dragged up, and taken back.
      await drawing.scrollIntoViewIfNeeded();
      const handle = (await drawing.locator('> div').boundingBox())!;
      await dragDown(page, size, handle.x + handle.width / 2, handle.y + handle.height / 2, 30);
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
      await page.getByLabel('Name').fill(`On the dredged bed, ${size}`);
      await page.getByLabel('Reach').selectOption({ label: `Dredged, ${size}` });
      await page.getByRole('button', { name: 'Make the scenario' }).click();
      await page.waitForURL(/\/scenarios\/\d+/);
      const peak = page.getByRole('textbox', { name: /^Peak flow/ });
      await peak.fill('320');
      await peak.blur();
      await page.getByRole('textbox', { name: /^Time to peak/ }).fill('8');
      await page.getByRole('textbox', { name: /^Base flow/ }).fill('40');
      await page.getByRole('textbox', { name: /^Base flow/ }).blur();
      await page.getByRole('button', { name: 'Save', exact: true }).click();
      await page
        .getByRole('button', { name: 'Route this flood' })
        .and(page.locator(':not([aria-disabled="true"]):not([disabled])'))
        .waitFor();

      // The widest water of a run in the plan of the reach.
      await goTo(page, 'Reach');
      await page.getByLabel('Widest water of a run').selectOption({ index: 1 });
      await page.getByText(/Between them it is drawn/).waitFor();
      await looksRight(page);
      const [download] = await Promise.all([
        page.waitForEvent('download'),
        page.getByRole('button', { name: 'Plan and water as GeoJSON' }).click(),
      ]);
      expect(download.suggestedFilename()).toMatch(/^run-\d+-plan\.geojson$/);
    }));
});

async function looksRight(page: Page): Promise<void> {
  await page.waitForFunction(() => !document.querySelector('[role=progressbar]'));
  expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
  expect(await axeViolations(page)).toEqual([]);
}

/** By mouse at a desk, by finger on a phone. */
async function dragDown(page: Page, size: Size, x: number, y: number, by: number): Promise<void> {
  if (size === 'wide') {
    await page.mouse.move(x, y);
    await page.mouse.down();
    await page.mouse.move(x, y + by, { steps: 4 });
    await page.mouse.up();
    return;
  }
  const hand = await page.context().newCDPSession(page);
  const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', touchPoints: object[]) =>
    hand.send('Input.dispatchTouchEvent', { type, touchPoints: touchPoints as never });
  await touch('touchStart', [{ x, y }]);
  for (const share of [0.3, 0.6, 1]) await touch('touchMove', [{ x, y: y + share * by }]);
  await touch('touchEnd', []);
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

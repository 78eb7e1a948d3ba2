import { readFileSync } from 'node:fs';
import type { Browser } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { axeViolations } from '../helpers/axe';
import { launchBrowser, sidewaysOverflow, SIZES, visit, type Size } from '../helpers/browser';
import { signIn } from '../helpers/steps';

jest.setTimeout(120_000);

let browser: Browser;
beforeAll(async () => void (browser = await launchBrowser()));
afterAll(() => browser.close());

describe.each(Object.keys(SIZES) as Size[])('what results tell besides, %s', (size) => {
  it('a level, its freeboard on curve and picture, an arrival of one’s own, hazard along the reach', () =>
    visit(browser, size, 'resultsExtras', async ({ page }) => {
      const house = `Ferry house, ${size}`;
      const floor = size === 'phone' ? 34.5 : 33.5;
      await signIn(page, 'ines.corrow@pykemorrow.example', DEMO_PASSWORD, '/studies/1/stations');
      await page.getByRole('button', { name: 'Gauge at Ebbick', exact: true }).click();
      const form = page.getByRole('dialog');
      await form.getByRole('button', { name: 'Add a level' }).click();
      const level = form.getByRole('group', { name: /^Level \d/ }).last();
      await level.getByRole('combobox', { name: 'Level of' }).selectOption('floor');
      await level.getByRole('textbox', { name: /^Level above datum/ }).fill(String(floor));
      await level.getByRole('textbox', { name: /^Which one/ }).fill(house);
      await form.getByRole('button', { name: 'Save' }).click();
      await page
        .getByText(new RegExp(`House floor, ${house}`))
        .first()
        .waitFor();

      // The larger flood passes it: freeboard is the level less the peak stage.
      await page.goto('/studies/1/runs/2?at=17400');
      const row = page
        .getByRole('table', { name: 'Levels at the stations' })
        .getByRole('row', { name: new RegExp(house) })
        .last();
      await row.waitFor();
      const [stated, peak, freeboard] = (await row.getByRole('cell').allInnerTexts())
        .slice(0, 3)
        .map((text) => Number(text.replace('−', '-')));
      expect(stated).toBe(floor);
      expect(freeboard).toBeLessThan(0);
      expect(freeboard).toBeCloseTo(stated - peak, 2);

      const curve = 'Stage at Gauge at Ebbick';
      await page.getByRole('button', { name: `Picture of ${curve}` }).click();
      const [svg] = await Promise.all([
        page.waitForEvent('download'),
        page.getByRole('button', { name: `SVG of ${curve}` }).click(),
      ]);
      expect(svg.suggestedFilename()).toBe('run-2-stage-at-gauge-at-ebbick-preliminary.svg');
      const drawn = readFileSync(await svg.path(), 'utf8');
      expect(drawn.includes(house)).toBe(true);
      expect(drawn.includes('Preliminary, not signed.')).toBe(true);
      expect(drawn.includes('@font-face{font-family:"Source Sans 3"')).toBe(true);

      // The threshold is one's own.
      const card = page.getByRole('region', { name: 'Hazard and arrival' });
      const arrivals = card.getByRole('table', { name: 'Hazard and arrival at the stations' });
      const ebbick = arrivals.getByRole('row', { name: /Gauge at Ebbick/ });
      const last = async () => {
        const text = await ebbick.getByRole('cell').last().innerText();
        const [, hours, minutes] = /^(\d+) h (\d\d)$/.exec(text)!.map(Number);
        return 60 * hours + minutes;
      };
      const before = await ebbick.getByRole('cell').last().innerText();
      const rising = await last();
      await card.getByRole('combobox').selectOption('stage');
      await card.getByRole('textbox', { name: /^Threshold/ }).fill('34.5');
      await ebbick.filter({ hasNotText: before }).waitFor();
      expect(await last()).toBeGreaterThan(rising);

      await card.getByRole('button', { name: 'All sections: hazard' }).click();
      const sections = card.getByRole('table', { name: /at all sections/ });
      // The heading, and 44 sections.
      expect(await sections.getByRole('row').count()).toBe(45);
      await card.getByText(/^H6/).first().waitFor();
      expect(await sidewaysOverflow(page)).toBeLessThanOrEqual(0);
      expect(await axeViolations(page)).toEqual([]);
    }));
});

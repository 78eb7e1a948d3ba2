import type { Browser, Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/seed/accounts';
import { surveyFile } from '@/seed/surveyFiles';
import type { Section } from '@/shared/surveys/types';
import { launchBrowser, productUrl, SIZES, visit, type Size } from '../helpers/browser';
import { signIn } from '../helpers/steps';

jest.setTimeout(180_000);

const LENA = 'lena@ostrandvale.example';
/** m, exactly: NIST SP 811, app. B.8. All numbers below are whole ones in feet. */
const FT = 0.3048;

/** A straight reach of 6,000 ft that falls 6 ft, its first bed at 200 ft. */
const SECTIONS: Section[] = [0, 2000, 4000, 6000].map((chainage, k) => {
  const bed = 200 - chainage / 1000;
  const points = [
    [0, bed + 20],
    [50, bed + 10],
    [66, bed],
    [98, bed],
    [115, bed + 10],
    [164, bed + 20],
  ];
  return {
    id: `AR-${k + 1}`,
    chainage: chainage * FT,
    points: points.map(([offset, level]) => [offset * FT, level * FT]),
    roughness: [[0, 0.04]],
    banks: [50 * FT, 115 * FT],
    coordinates: null,
  };
});

let browser: Browser;
let made: Awaited<ReturnType<typeof studyInFeet>>;
beforeAll(async () => {
  browser = await launchBrowser();
  made = await studyInFeet();
});
afterAll(() => browser.close());

describe.each(Object.keys(SIZES) as Size[])('a study in US customary units, %s', (size) => {
  it('shows the feet that went in and speaks no SI', () =>
    visit(browser, size, 'usUnits', async ({ page }) => {
      await signIn(page, LENA, DEMO_PASSWORD);
      const { studyId, scenarioId, runId } = made;
      const root = `/studies/${studyId}`;
      // Each with what it shows of the whole numbers that went in.
      const screens: [address: string, shows: RegExp][] = [
        [`${root}/reach`, /^198\.00$/],
        [`${root}/scenarios/${scenarioId}`, /1,000 ft³\/s/],
        [`${root}/runs/${runId}`, /^3,000 ft/],
        [`${root}/runs/${runId}/check`, /on cells of 200\.0 ft/],
        [`${root}/confidence`, /200 ft/],
      ];
      for (const [address, shows] of screens) {
        await page.goto(address);
        await page.getByText(shows).first().waitFor();
        await page.waitForLoadState('networkidle');
        expect({ address, si: (await wordsOf(page)).filter(speaksSi) }).toEqual({
          address,
          si: [],
        });
      }
    }));
});

const UNIT = String.raw`(k?m|m³/s|m/s|m²|m³|mm|cm)`;
const SI = new RegExp(
  String.raw`\d${UNIT}(?![\p{L}\d²³/])|(^|[\s(,])${UNIT}(?=$|[\s),.;:])|\b(centi|kilo|milli)?met(re|er)s?\b`,
  'u',
);
const speaksSi = (words: string) => SI.test(words);

/** All that can be read or is read out, element by element, in drawings too. */
const wordsOf = (page: Page): Promise<string[]> =>
  page.evaluate(() =>
    [...document.body.querySelectorAll('*')].flatMap((element) => [
      ...[...element.childNodes].flatMap((node) =>
        node.nodeType === Node.TEXT_NODE ? [node.textContent!.trim()] : [],
      ),
      ...['aria-label', 'title', 'placeholder', 'aria-valuetext'].flatMap(
        (name) => element.getAttribute(name) ?? [],
      ),
    ]),
  );

/** A study in feet with a run of 1,000 ft³/s, through the API as a program of the firm would. */
async function studyInFeet() {
  const call = async <T>(method: string, path: string, body?: object | FormData): Promise<T> => {
    const isForm = body instanceof FormData;
    const answer = await fetch(`${productUrl()}/api${path}`, {
      method,
      headers: {
        ...(token && { Authorization: `Bearer ${token}` }),
        ...(!isForm && { 'Content-Type': 'application/json' }),
      },
      body: isForm ? body : JSON.stringify(body),
    });
    if (!answer.ok) throw new Error(`${method} ${path}: ${await answer.text()}`);
    return (await answer.json()) as T;
  };
  let token = '';
  const signedIn = { email: LENA, password: DEMO_PASSWORD };
  token = (await call<{ accessToken: string }>('POST', '/auth/sign-in', signedIn)).accessToken;

  const { id: studyId } = await call<{ id: number }>('POST', '/studies', {
    title: 'Alder Run at Ostrand',
    clientName: 'Ostrand County',
    place: 'Ostrand Vale',
    verticalDatum: 'County datum',
    unitSystem: 'usCustomary',
  });
  const form = new FormData();
  form.append('file', new Blob([new Uint8Array(surveyFile(SECTIONS))]), 'alder_run.xlsx');
  await call('POST', `/studies/${studyId}/surveys`, form);
  const [{ id: reachId }] = await call<{ id: number }[]>('GET', `/studies/${studyId}/reaches`);
  await call('POST', `/studies/${studyId}/stations`, { name: 'Ford', chainage: 3000 * FT });
  const scenario = await call<{ id: number; version: number; body: { numerics: object } }>(
    'POST',
    `/studies/${studyId}/scenarios`,
    { name: 'Design flood', reachId },
  );
  const { body } = scenario;
  await call('PUT', `/scenarios/${scenario.id}`, {
    version: scenario.version,
    body: {
      ...body,
      upstream: {
        kind: 'table',
        times: [0, 1800, 7200],
        flows: [200, 1000, 200].map((q) => q * FT ** 3),
      },
      numerics: { ...body.numerics, cellSize: 200 * FT, duration: 7200, outputInterval: 300 },
    },
  });
  const run = await call<{ id: number }>('POST', `/scenarios/${scenario.id}/runs`);
  for (;;) {
    const { state, failure } = await call<{ state: string; failure: string }>(
      'GET',
      `/runs/${run.id}`,
    );
    if (state === 'routed') return { studyId, scenarioId: scenario.id, runId: run.id };
    if (state !== 'queued' && state !== 'running') throw new Error(`${state}: ${failure}`);
    await new Promise((resolve) => setTimeout(resolve, 300));
  }
}

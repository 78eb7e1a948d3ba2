import { searchRoughness } from '../../../server/jobs/tasks/calibration/searchRoughness';
import type { ComputedFlood } from '../../../shared/calibration/compareFlood';
import type { Evaluation, SearchStretch } from '../../../shared/calibration/search/types';
import type { Mark } from '../../../shared/calibration/types';

/** Where the deepest water is seen is told by two multipliers, each of its half of the reach. */
const compute = ([upper, lower]: number[]): ComputedFlood => ({
  peakAt: (chainage) => ({ stage: 10 + Math.log(chainage < 500 ? upper : lower), depth: 2 }),
  seriesAt: async () => null,
});
const mark = (id: number, chainage: number, level: number): Mark => ({
  id,
  chainage,
  level,
  kind: 'debris',
  confidence: 'good',
  flood: '',
  observedOn: null,
  note: '',
});
const stretch = { part: 'all', low: 0.5, high: 2 } as const;
const SEARCH = {
  observed: { marks: [mark(1, 100, 10.2), mark(2, 900, 9.9)], gauges: [] },
  startsAt: null,
  stretches: [
    { ...stretch, from: 0, to: 500 },
    { ...stretch, from: 500, to: 1000 },
  ] as SearchStretch[],
  evaluations: 40,
};

async function search(known: Evaluation[] = [], stopAfter = Infinity) {
  let routed = 0;
  let seen: Evaluation[] = [];
  const run = searchRoughness(
    SEARCH,
    (factors) => {
      if (routed === stopAfter) throw new Error('The server is gone.');
      routed++;
      return compute(factors);
    },
    () => false,
    (evaluations) => (seen = JSON.parse(JSON.stringify(evaluations))),
    known,
  );
  return { result: await run.catch(() => null), seen, routed: () => routed };
}

test('a search that broke off finds the same as one that did not, and routes nothing twice but what is shown', async () => {
  const whole = await search();
  const all = whole.result!.evaluations.length;
  expect(all).toBeGreaterThan(20);
  for (const after of [1, 9, all - 2]) {
    const broken = await search([], after);
    expect(broken.result).toBeNull();
    expect(broken.seen).toHaveLength(after);
    const resumed = await search(broken.seen);
    expect(resumed.result).toEqual(whole.result);
    // Of the first and the best the comparison is shown, and only their misfit was kept.
    expect(resumed.routed()).toBeLessThanOrEqual(all - after + 2);
  }
});

test('runs of another search are of no use, and are not used', async () => {
  const whole = await search();
  const foreign = whole.result!.evaluations.map((one, k) =>
    k === 0 ? one : { ...one, factors: [1.5, 1.5 + k / 1000], misfit: 0 },
  );
  expect((await search(foreign)).result).toEqual(whole.result);
});

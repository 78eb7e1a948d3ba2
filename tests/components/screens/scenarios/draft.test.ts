import { toBody, toDraft, type Draft } from '@/components/screens/scenarios/draft';
import { draftReducer, type DraftAction } from '@/components/screens/scenarios/draftReducer';
import { newStructure } from '@/shared/scenarios/structures/newStructure';
import { plainSections } from '../../../helpers/plainSections';
import { scenarioSchema, type ScenarioBody } from '@/shared/scenarios/schemas';

const body: ScenarioBody = {
  name: '1 in 100 year',
  reachId: 4,
  startsAt: '2026-11-14T06:00:00.000Z',
  note: '',
  upstream: {
    kind: 'generated',
    shape: 'nrcs',
    baseFlow: 55,
    peakFlow: 490,
    timeToPeak: 50_400,
    recessionRatio: null,
    gammaExponent: null,
  },
  laterals: [],
  structures: [],
  roughnessFactors: [],
  localLosses: [],
  downstream: { kind: 'normalDepth', slope: 0.0009 },
  initial: { kind: 'steady' },
  numerics: {
    cellSize: 50,
    duration: 172_800,
    outputInterval: 300,
    order: 2,
    courant: 0.8,
    dryDepth: 0.001,
  },
};

const after = (...actions: DraftAction[]): Draft => actions.reduce(draftReducer, toDraft(body));

describe('the draft of a scenario', () => {
  it('gives back the body that it was made of', () => {
    expect(toBody(toDraft(body))).toEqual(body);
  });

  it('loses nothing when another kind is looked at', () => {
    const draft = after(
      { type: 'upstreamChanged', change: { peakFlow: 510 } },
      { type: 'upstreamChosen', kind: 'table' },
      { type: 'upstreamChanged', change: { times: [0, 3600], flows: [10, 20] } },
      { type: 'upstreamChosen', kind: 'generated' },
    );
    expect(toBody(draft).upstream).toMatchObject({
      kind: 'generated',
      peakFlow: 510,
      baseFlow: 55,
    });
    const back = draftReducer(draft, { type: 'upstreamChosen', kind: 'table' });
    expect(toBody(back).upstream).toEqual({ kind: 'table', times: [0, 3600], flows: [10, 20] });
  });

  it('adds, changes and removes multipliers and losses one by one', () => {
    const draft = after(
      { type: 'roughnessFactorAdded' },
      { type: 'roughnessFactorAdded' },
      { type: 'roughnessFactorChanged', index: 1, change: { factors: [1.3], part: 'overbank' } },
      { type: 'roughnessFactorRemoved', index: 0 },
      { type: 'localLossAdded' },
      { type: 'localLossChanged', index: 0, change: { from: 100, to: 200 } },
    );
    expect(toBody(draft).roughnessFactors).toEqual([
      { from: null, to: null, part: 'overbank', depths: [0], factors: [1.3] },
    ]);
    expect(toBody(draft).localLosses).toEqual([
      { from: 100, to: 200, contraction: 0.1, expansion: 0.3 },
    ]);
    expect(scenarioSchema.validateSync(toBody(draft)).localLosses).toHaveLength(1);
  });

  it('changes only the kind that stands', () => {
    const draft = after(
      { type: 'downstreamChosen', kind: 'rating' },
      { type: 'downstreamChanged', change: { stages: [1, 2], flows: [0, 50] } },
      { type: 'initialChosen', kind: 'dam' },
      { type: 'initialChanged', change: { chainage: 500, stageAbove: 10 } },
    );
    expect(toBody(draft).downstream).toEqual({ kind: 'rating', stages: [1, 2], flows: [0, 50] });
    expect(toBody(draft).initial).toEqual({
      kind: 'dam',
      chainage: 500,
      stageAbove: 10,
      stageBelow: null,
    });
    expect(draft.downstream.byKind.normalDepth).toEqual({ kind: 'normalDepth', slope: 0.0009 });
  });

  it('adds, changes and takes out lateral inflows one by one', () => {
    const draft = after(
      { type: 'lateralAdded' },
      { type: 'lateralAdded' },
      { type: 'lateralChanged', index: 1, change: { name: 'Ebbick brook', from: 17_400 } },
      { type: 'lateralRemoved', index: 0 },
    );
    expect(toBody(draft).laterals).toEqual([
      { name: 'Ebbick brook', from: 17_400, to: null, times: [], flows: [] },
    ]);
  });

  it('adds, changes, copies and takes out structures one by one', () => {
    const weir = newStructure('weir', {
      chainage: 500,
      sections: plainSections(4, 500),
      upstream: body.upstream,
      taken: [],
    });
    const draft = after(
      { type: 'structureAdded', structure: weir },
      { type: 'structureChanged', index: 0, change: { chainage: 700 } },
      { type: 'structureDuplicated', index: 0, id: 'Weir 2' },
      { type: 'structureChanged', index: 1, change: { chainage: 900 } },
      { type: 'structureRemoved', index: 0 },
    );
    expect(toBody(draft).structures).toEqual([{ ...weir, id: 'Weir 2', chainage: 900 }]);
  });

  it.each(['generated', 'table', 'stage', 'reservoir', 'wall'] as const)(
    'makes a body that can be stored though incomplete: upstream %s',
    async (kind) => {
      const draft = after({ type: 'upstreamChosen', kind });
      await expect(scenarioSchema.validate(toBody(draft), { strict: true })).resolves.toBeTruthy();
    },
  );

  it.each(['normalDepth', 'stage', 'rating', 'criticalDepth', 'open', 'wall'] as const)(
    'makes a body that can be stored though incomplete: outlet %s',
    async (kind) => {
      const draft = after({ type: 'downstreamChosen', kind });
      await expect(scenarioSchema.validate(toBody(draft), { strict: true })).resolves.toBeTruthy();
    },
  );

  it.each(['steady', 'still', 'profile', 'dam'] as const)(
    'makes a body that can be stored though incomplete: initial %s',
    async (kind) => {
      const draft = after({ type: 'initialChosen', kind });
      await expect(scenarioSchema.validate(toBody(draft), { strict: true })).resolves.toBeTruthy();
    },
  );
});

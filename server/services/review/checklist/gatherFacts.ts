import { CASE_DEFAULTS, type CaseFile } from '../../../../shared/case/caseFile';
import { canonical } from '../../../../shared/case/canonical';
import type { Section } from '../../../../shared/surveys/types';
import { unpackJson } from '../../../database/packedJson';
import type { ReviewModel } from '../../../models/Review';
import type { RunModel } from '../../../models/Run';
import type { Platform } from '../../../platform';
import type { SeriesColumns } from '../../../results/blocks/blockTypes';
import type { RunBlocks } from '../../../results/blocks/runBlocks';
import { peaksAt } from '../../../results/peaksAt';
import { adviseReach } from '../../reaches/advice/adviseReach';
import { describeSection } from '../../reaches/describeSection';
import type { buildConfidence } from '../../confidence';
import type { buildRuns } from '../../runs';
import { describeOutletChange } from '../changeOutlet';
import { keepAtHand } from './keepAtHand';
import type { ChecklistFacts, SectionHistory } from './types';

export interface FactsNeeds {
  confidence: ReturnType<typeof buildConfidence>;
  runs: ReturnType<typeof buildRuns>;
  /** Against the observed flood of its report. */
  observedOf: (run: RunModel) => Promise<ChecklistFacts['observed']>;
}

/** Runs of a scenario that are looked through for other cell sizes. */
const LOOKED_THROUGH = 20;

/** Reads what the checklist is found from. Throws `conflict` where the run is not routed. */
export function buildGatherFacts(
  { models }: Platform,
  { confidence, observedOf, runs }: FactsNeeds,
) {
  const caseOf = keepAtHand(
    async (run) => JSON.parse((await runs.exports.caseFile(run)).toString('utf8')) as CaseFile,
  );
  const peaksAlong = keepAtHand(async (run) => {
    const blocks = runs.results.open(run);
    const [facts, places] = await Promise.all([blocks.facts(), blocks.places()]);
    return { run: facts, places };
  });
  const sectionsOf = keepAtHand(async (run) =>
    histories(runs.results.open(run), await caseOf(run)),
  );
  /** Two runs with the same one differ by their cells alone. */
  const nameBesideCells = keepAtHand(async (run) => {
    const caseFile = await caseOf(run);
    return canonical({ ...caseFile, title: '', numerics: { ...caseFile.numerics, cellSize: 0 } });
  });

  /** Peak stages at the stations, or at the sections where there are none. */
  async function peaksOf(run: RunModel): Promise<{ name: string; stage: number }[]> {
    const { run: facts, places } = await peaksAlong(run);
    const stations = await runs.results.stations(run.studyId);
    const named =
      stations.length > 0 ? stations : facts.sections.map((s) => ({ ...s, name: s.id }));
    return named.flatMap(({ name, chainage }) => {
      const peaks = peaksAt(places, null, chainage);
      return peaks ? [{ name, stage: peaks.peakStage }] : [];
    });
  }

  async function probeOf(
    run: RunModel,
    review: ReviewModel | null,
  ): Promise<ChecklistFacts['probe']> {
    const id = review?.outletProbeRunId ?? null;
    const probe = id === null ? null : await models.Run.findByPk(id);
    if (!probe) return null;
    const change = describeOutletChange((await caseOf(run)).downstream) ?? {
      message: 'a changed outlet',
    };
    const told = { runNumber: probe.number, state: probe.state, change };
    if (probe.state !== 'routed') return { ...told, peaks: [] };
    const there = new Map((await peaksOf(probe)).map(({ name, stage }) => [name, stage]));
    const here = await peaksOf(run);
    const peaks = here.flatMap(({ name, stage }) =>
      there.has(name) ? [{ name, here: stage, there: there.get(name)! }] : [],
    );
    return { ...told, peaks };
  }

  async function gridsOf(run: RunModel): Promise<ChecklistFacts['grids']> {
    const { scenarioId } = run;
    const where = { scenarioId, state: 'routed' as const };
    const others = await models.Run.findAll({
      where,
      order: [['id', 'DESC']],
      limit: LOOKED_THROUGH,
    });
    const name = await nameBesideCells(run);
    const bySize = new Map<number, ChecklistFacts['grids'][number]>();
    for (const other of [run, ...others.filter(({ id }) => id !== run.id)]) {
      if (other.id !== run.id && (await nameBesideCells(other)) !== name) continue;
      const { cellSize } = (await peaksAlong(other)).run;
      if (!bySize.has(cellSize))
        bySize.set(cellSize, { runNumber: other.number, cellSize, peaks: await peaksOf(other) });
    }
    return [...bySize.values()].sort((a, b) => a.cellSize - b.cellSize);
  }

  /** The latest convergence set of this very case. */
  async function convergenceOf(run: RunModel): Promise<ChecklistFacts['convergence']> {
    const { firmId } = run.study!;
    const set = await confidence.read.latestConvergence(firmId, run.caseHash);
    return set && { name: set.set.name, result: set.result };
  }

  async function adviceOf({ reachId }: RunModel): Promise<ChecklistFacts['advice']> {
    const reach = await models.Reach.scope('withSections').findByPk(reachId, {
      rejectOnEmpty: true,
    });
    return adviseReach((await unpackJson<Section[]>(reach.sections)).map(describeSection));
  }

  return async (run: RunModel, review: ReviewModel | null): Promise<ChecklistFacts> => ({
    ...(await peaksAlong(run)),
    caseFile: await caseOf(run),
    sections: await sectionsOf(run),
    advice: await adviceOf(run),
    probe: await probeOf(run, review),
    grids: await gridsOf(run),
    convergence: await convergenceOf(run),
    observed: await observedOf(run),
  });
}

async function histories(blocks: RunBlocks, caseFile: CaseFile): Promise<SectionHistory[]> {
  const dryDepth = caseFile.numerics.dryDepth ?? CASE_DEFAULTS.dryDepth;
  const all: SectionHistory[] = [];
  for (const [k, { id, chainage, points }] of caseFile.sections.entries()) {
    const series = await blocks.series(k);
    const lowerEnd = Math.min(points[0][1], points[points.length - 1][1]);
    all.push({ id, chainage, lowerEnd, ...historyOf(series, dryDepth) });
  }
  return all;
}

function historyOf({ depth, froude, stage }: SeriesColumns, dryDepth: number) {
  let [wasWet, fellDry, rewetted, peakFroude, peakStage] = [false, false, false, 0, -Infinity];
  for (let m = 0; m < depth.length; m++) {
    const wet = depth[m] > dryDepth;
    if (wet && fellDry) rewetted = true;
    if (!wet && wasWet) fellDry = true;
    if (wet) peakFroude = Math.max(peakFroude, froude[m]);
    wasWet ||= wet;
    peakStage = Math.max(peakStage, stage[m]);
  }
  return { fellDry, rewetted, peakFroude, peakStage };
}

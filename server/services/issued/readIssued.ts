import { HAZARD_GUIDELINE, worstHazard } from '../../../shared/hazard/hazardClass';
import type { IssuedResult, IssuedStation } from '../../../shared/review/types';
import type { Station } from '../../../shared/studies/types';
import type { RunModel } from '../../models/Run';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import type { RunBlocks } from '../../results/blocks/runBlocks';
import { levelsAt } from '../../results/levelsAt';
import { mix, placeBetween } from '../../results/placeBetween';
import { seriesAt } from '../../results/seriesAt';
import type { ReviewsService } from '../review';
import type { buildRuns } from '../runs';

/** What clients see: issued runs at the stations that were chosen for them, and nothing else. */
export function buildIssued(
  platform: Platform,
  { reviews, runs }: { reviews: ReviewsService; runs: ReturnType<typeof buildRuns> },
) {
  const { audit, models, now, sequelize } = platform;

  /** For `authorize`. */
  async function load(runId: number, actor: Actor): Promise<Loaded<RunModel> | null> {
    const loaded = await runs.find.load(runId, actor);
    return (
      loaded && { ...loaded, subject: { ...loaded.subject, issued: Boolean(loaded.record.issue) } }
    );
  }

  /** Of a study, newest first. What a later issued run has replaced is left out. */
  async function list(study: StudyModel, actor: Actor): Promise<IssuedResult[]> {
    const issued = (await runs.find.list(study.id)).filter(({ issue }) => issue);
    const ids = issued.map(({ id }) => id);
    const standing = issued.filter(({ withdrawal }) => !withdrawal).map(({ id }) => id);
    const successors = await models.SignOff.findAll({ where: { runId: standing } });
    const replaced = new Set(successors.map(({ supersedesRunId }) => supersedesRunId));
    const shown = issued.filter(({ id }) => !replaced.has(id));
    const reads = await models.ClientRead.findAll({ where: { runId: ids, userId: actor.id } });
    return Promise.all(
      shown.map((run) => resultOf(run, reads.find(({ runId }) => runId === run.id)?.at ?? null)),
    );
  }

  async function resultOf(run: RunModel, readAt: Date | null): Promise<IssuedResult> {
    const where = { runId: run.id };
    const [issue, signOff, withdrawal, record] = await Promise.all([
      models.Issue.findOne({ where, rejectOnEmpty: true }),
      models.SignOff.findOne({ where, rejectOnEmpty: true }),
      models.Withdrawal.findOne({ where }),
      reviews.signedRecord(run.id),
    ]);
    const blocks = runs.results.open(run);
    const chosen = record!.stations.filter(({ id }) => issue.stationIds.includes(id));
    const stations = await Promise.all(chosen.map((station) => stationOf(blocks, station)));
    return {
      runId: run.id,
      title: `${record!.study.title}: ${run.scenarioName}`,
      signedBy: signOff.signerName,
      qualification: signOff.qualification,
      signedAt: signOff.at.toISOString(),
      issuedAt: issue.at.toISOString(),
      withdrawn: withdrawal && { at: withdrawal.at.toISOString(), reason: withdrawal.reason },
      startsAt: run.startsAt?.toISOString() ?? null,
      sections: (await blocks.facts()).sections,
      stations: stations.filter((station) => station !== null),
      hazardGuideline: HAZARD_GUIDELINE,
      readAt: readAt?.toISOString() ?? null,
    };
  }

  /** The client has read it; said once, told again changes nothing. */
  async function confirmRead(run: RunModel, actor: Actor): Promise<void> {
    await sequelize.transaction(async (transaction) => {
      const where = { runId: run.id, userId: actor.id };
      await models.Run.findByPk(run.id, { lock: transaction.LOCK.UPDATE, transaction });
      if (await models.ClientRead.findOne({ where, transaction })) return;
      await models.ClientRead.create({ ...where, at: now() }, { transaction });
      const words = `Confirmed as read: run ${run.number}, ${run.scenarioName}, of ${run.study!.title}`;
      const record = { kind: 'run', id: run.id };
      await audit.note({ action: 'issued.read', words, record, actor }, transaction);
    });
  }

  return { load, list, confirmRead };
}

/** null off the reach. */
async function stationOf(blocks: RunBlocks, station: Station): Promise<IssuedStation | null> {
  const [series, places] = await Promise.all([seriesAt(blocks, station.chainage), blocks.places()]);
  const between = placeBetween(places.chainage, station.chainage);
  if (!series || !between) return null;
  const { depth, flow, peaks, stage, times, velocity } = series;
  const bank = Math.min(
    ...[places.leftBank, places.rightBank].map((levels) =>
      mix(levels[between.lower], levels[between.upper], between.share),
    ),
  );
  const hazard = worstHazard(depth, velocity);
  return {
    stationId: station.id,
    name: station.name,
    chainage: station.chainage,
    times,
    stage,
    depth,
    flow,
    peakStage: peaks.peakStage,
    peakStageTime: peaks.peakStageTime,
    peakFlow: peaks.peakFlow,
    peakFlowTime: peaks.peakFlowTime,
    arrival: peaks.arrival,
    ...aboveBanks(times, stage, bank, peaks.peakStage),
    hazard: hazard && { label: hazard.label, meaning: hazard.meaning },
    levels: await levelsAt(blocks, [station]),
  };
}

/** Whether the water leaves the banks, and from when on it is back between them for good. Pure. */
export function aboveBanks(times: number[], stage: number[], bank: number, peakStage: number) {
  const last = stage.findLastIndex((level) => level > bank);
  const back = last >= 0 && last < times.length - 1 ? times[last + 1] : null;
  return { leavesBanks: peakStage > bank, withinBanksAgain: back };
}

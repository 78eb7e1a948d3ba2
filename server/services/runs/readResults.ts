import type { AlongQuery, SurfaceQuery } from '../../../shared/runs/schemas';
import { encodeSurface } from '../../../shared/runs/surfaceBlock';
import {
  RUN_STATE_WORDS,
  type RunAlong,
  type RunReservoirSeries,
  type RunSeries,
  type RunStructureSeries,
  type RunSummary,
} from '../../../shared/runs/types';
import { stationDifferences } from '../../../shared/studies/stationDifferences';
import type { Station } from '../../../shared/studies/types';
import { q, say, sayIn } from '../../../shared/units/message';
import { AppError, conflict, notFound } from '../../errors';
import type { Models } from '../../models';
import type { RunModel } from '../../models/Run';
import { alongReach } from '../../results/alongReach';
import { runBlocks, type ReadBlocks, type RunBlocks } from '../../results/blocks/runBlocks';
import { seriesAt } from '../../results/seriesAt';
import { reservoirSeries, structureSeries } from '../../results/structureSeries';
import { summaryOf } from '../../results/summaryOf';
import { surfaceOf } from '../../results/surfaceOf';
import { buildStationsOfRun } from './stationsOfRun';

/** What a screen needs of a routed run. Each throws `conflict` where the run has no results. */
export function buildReadResults(models: Models) {
  const { RunBlock, Station } = models;
  const readBlocks =
    (runId: number): ReadBlocks =>
    async (kind, parts) => {
      const rows = await RunBlock.findAll({ where: { runId, kind, part: parts } });
      const stored = new Map(rows.map(({ part, bytes }) => [part, bytes]));
      return parts.map((part) => {
        const bytes = stored.get(part);
        if (!bytes) throw new Error(`Run ${runId} has no block ${kind}/${part}.`);
        return bytes;
      });
    };

  const open = (run: RunModel): RunBlocks => {
    assertRouted(run);
    return runBlocks(readBlocks(run.id));
  };

  const stations = async (studyId: number): Promise<Station[]> =>
    (await Station.findAll({ where: { studyId }, order: ['chainage'] })).map(
      ({ id, name, chainage, levels }) => ({ id, name, chainage, levels: levels ?? [] }),
    );

  const { stationsOf, signedStations } = buildStationsOfRun(models, stations);

  return {
    open,
    stations,
    stationsOf,

    async summary(run: RunModel): Promise<RunSummary> {
      const blocks = open(run);
      const [today, signed] = await Promise.all([stations(run.studyId), signedStations(run)]);
      return {
        ...(await summaryOf(run.id, blocks, signed?.stations ?? today)),
        signed: signed && {
          at: signed.at,
          differs: stationDifferences(signed.stations, today),
        },
      };
    },

    async along(run: RunModel, query: AlongQuery): Promise<RunAlong> {
      return alongReach(open(run), await stationsOf(run), query);
    },

    /** Needs the run's `study`. Throws `invalid` off the reach. */
    async series(run: RunModel, chainage: number): Promise<RunSeries> {
      const blocks = open(run);
      const series = await seriesAt(blocks, chainage);
      if (series) return series;
      const { sections } = await blocks.facts();
      const [from, to] = [sections[0].chainage, sections[sections.length - 1].chainage];
      const message = sayIn(
        run.study!.unitSystem,
        say`The reach goes from chainage ${q(from, 'chainage')} to ${q(to, 'chainage')}; choose a place on it.`,
      );
      throw new AppError('invalid', message, { faults: [{ path: 'chainage', message }] });
    },

    /** Throws `notFound` where the run has no structure of this number. */
    async structure(run: RunModel, part: number): Promise<RunStructureSeries> {
      const series = await structureSeries(open(run), part);
      if (!series) throw notFound();
      return series;
    },

    /** Throws `notFound` where the upstream end is no reservoir. */
    async reservoir(run: RunModel): Promise<RunReservoirSeries> {
      const series = await reservoirSeries(open(run));
      if (!series) throw notFound();
      return series;
    },

    async surface(run: RunModel, wanted: SurfaceQuery): Promise<ArrayBuffer> {
      return encodeSurface(await surfaceOf(open(run), wanted));
    },
  };
}

export function assertRouted({ state, number }: RunModel): void {
  if (state === 'routed') return;
  throw conflict(
    `Run ${number} has no results: it is ${RUN_STATE_WORDS[state].toLowerCase()}. ` +
      'Results can be read when it is routed.',
  );
}

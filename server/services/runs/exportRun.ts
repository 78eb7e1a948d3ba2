import type { RunResiduals } from '../../../shared/calibration/types';
import type { Platform } from '../../platform';
import { lazyPool } from '../../jobs/lazyPool';
import type { RunModel } from '../../models/Run';
import type { EncodedBlock } from '../../results/blocks/blockTypes';
import { csv } from '../../results/exports/csv';
import { csvLine } from '../../results/exports/csvField';
import type { ExportedRun } from '../../results/exports/exportedRun';
import { levelsSheet } from '../../results/exports/levelsSheet';
import { structuresCsv } from '../../results/exports/structuresCsv';
import type { WorkbookTask } from '../../results/exports/workbookWorker';
import { levelsAt } from '../../results/levelsAt';
import { thawCase } from './freezeCase';
import { assertRouted, type buildReadResults } from './readResults';

/** Files of a run to take away. The workbook is written in a thread of its own, one at a time. */
export function buildExportRun(platform: Platform, results: ReturnType<typeof buildReadResults>) {
  const { models } = platform;
  const directory = `${__dirname}/../../results/exports`;
  const pool = lazyPool<WorkbookTask, Uint8Array>(platform, directory, 'workbookWorker');

  const caseBytesOf = async (runId: number): Promise<Buffer> => {
    const attributes = ['id', 'caseBytes'];
    return (await models.Run.unscoped().findByPk(runId, { attributes, rejectOnEmpty: true }))
      .caseBytes;
  };

  const about = async (run: RunModel): Promise<ExportedRun> => ({
    number: run.number,
    studyTitle: run.study!.title,
    scenarioName: run.scenarioName,
    verticalDatum: run.study!.verticalDatum,
    unitSystem: run.study!.unitSystem,
    requestedBy: run.requester!.name,
    finishedAt: run.finishedAt!.toISOString(),
    startsAt: run.startsAt?.toISOString() ?? null,
    caseHash: run.caseHash,
    solverVersion: run.solverVersion,
    stations: await results.stationsOf(run),
  });

  return {
    /** The frozen case, to the byte: of any run, whatever became of it. */
    caseFile: async (run: RunModel): Promise<Buffer> => thawCase(await caseBytesOf(run.id)),

    /** Pieces of text, made as they are taken. */
    async csv(run: RunModel): Promise<AsyncGenerator<string>> {
      return csv(results.open(run), await about(run));
    },

    /** Freeboard of the levels at the stations. */
    async levelsCsv(run: RunModel): Promise<string> {
      const { stations, unitSystem } = await about(run);
      const levels = await levelsAt(results.open(run), stations);
      return levelsSheet(levels, unitSystem).map(csvLine).join('');
    },

    /** The same of what stands in the river. */
    async structuresCsv(run: RunModel): Promise<AsyncGenerator<string>> {
      return structuresCsv(results.open(run), await about(run));
    },

    /** With what the run is compared to, where there is something. */
    async workbook(run: RunModel, observed: RunResiduals | null): Promise<Buffer> {
      assertRouted(run);
      const [rows, caseBytes, said] = await Promise.all([
        models.RunBlock.findAll({ where: { runId: run.id } }),
        caseBytesOf(run.id),
        about(run),
      ]);
      const blocks = rows.map(({ kind, part, bytes }): EncodedBlock => ({ kind, part, bytes }));
      return Buffer.from(await pool().run({ blocks, caseBytes, run: { ...said, observed } }));
    },
  };
}

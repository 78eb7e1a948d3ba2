import { createHash } from 'node:crypto';
import { PAPERS, type Paper, type ReportRow } from '../../../shared/reports/types';
import { lazyPool } from '../../jobs/lazyPool';
import type { ReportModel } from '../../models/Report';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { ReportTask } from '../../reports/reportWorker';
import type { DrawnReport } from '../../reports/runPdf';
import { standingOf, type ReportFacts } from '../../reports/types';
import { assertRouted } from '../runs/readResults';
import { buildCollectFacts, type FactsNeeds } from './collectFacts';

/**
 * Reports as PDF. Before the signature one is drawn anew each time it is asked for; from then on it is drawn once, on
 * every paper, and kept: whoever asks gets the same bytes, and the public page knows their hashes.
 */
export function buildReports(platform: Platform, needs: FactsNeeds) {
  const { models, now, sequelize } = platform;
  const { Report, Run, RunBlock } = models;
  const collect = buildCollectFacts(platform, needs);
  const pool = lazyPool<ReportTask, DrawnReport[]>(
    platform,
    `${__dirname}/../../reports`,
    'reportWorker',
  );

  async function draw(run: RunModel, facts: ReportFacts, papers: Paper[]): Promise<DrawnReport[]> {
    const [rows, { caseBytes }] = await Promise.all([
      RunBlock.findAll({ where: { runId: run.id } }),
      Run.unscoped().findByPk(run.id, { attributes: ['id', 'caseBytes'], rejectOnEmpty: true }),
    ]);
    const blocks = rows.map(({ kind, part, bytes }) => ({ kind, part, bytes }));
    return pool().run({ blocks, caseBytes, facts, papers });
  }

  const kept = (runId: number, standing: ReportModel['standing'], paper: Paper) =>
    Report.scope('withPdf').findOne({ where: { runId, standing, paper } });

  /** Draws and keeps those papers that are not kept yet. */
  async function keep(run: RunModel, standing: ReportModel['standing'], facts: ReportFacts) {
    const papers = [...PAPERS];
    const drawn = await draw(run, facts, papers);
    await sequelize.transaction(async (transaction) => {
      // Of two who ask at once the second finds what the first has kept.
      await Run.findByPk(run.id, { lock: transaction.LOCK.UPDATE, transaction });
      const there = await Report.findAll({ where: { runId: run.id, standing }, transaction });
      for (const [k, paper] of papers.entries()) {
        if (there.some((report) => report.paper === paper)) continue;
        const pdf = Buffer.from(drawn[k].pdf);
        await Report.create(
          {
            runId: run.id,
            standing,
            paper,
            hash: createHash('sha256').update(pdf).digest('hex'),
            bytes: pdf.length,
            pages: drawn[k].pages,
            pdf,
            createdAt: now(),
          },
          { transaction },
        );
      }
    });
  }

  /** The PDF as the run stands. Needs a run read by `find.load`; throws `conflict` where it has no results. */
  async function pdf(run: RunModel, paper: Paper): Promise<Buffer> {
    assertRouted(run);
    const found =
      run.signOff && (await kept(run.id, run.withdrawal ? 'withdrawn' : 'signed', paper));
    if (found) return found.pdf;
    const facts = await collect(run);
    const standing = standingOf(facts);
    if (standing === 'preliminary') return Buffer.from((await draw(run, facts, [paper]))[0].pdf);
    await keep(run, standing, facts);
    return (await kept(run.id, standing, paper))!.pdf;
  }

  /** Those that are kept, latest first. */
  async function list({ id: runId }: RunModel): Promise<ReportRow[]> {
    const rows = await Report.findAll({ where: { runId }, order: [['id', 'DESC']] });
    return rows.map(({ id, paper, standing, hash, bytes, pages, createdAt }) => {
      return { id, paper, standing, hash, bytes, pages, createdAt: createdAt.toISOString() };
    });
  }

  return { pdf, list };
}

import { createHash } from 'node:crypto';
import type { ReportQuery } from '../../../shared/reports/schemas';
import { PAPERS, type Paper, type ReportRow } from '../../../shared/reports/types';
import { lazyPool } from '../../jobs/lazyPool';
import type { ReportModel } from '../../models/Report';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { AnnexFacts } from '../../reports/annex/types';
import type { ReportTask } from '../../reports/reportWorker';
import type { DrawnReport } from '../../reports/runPdf';
import { standingOf, type ReportFacts } from '../../reports/types';
import { assertRouted } from '../runs/readResults';
import { buildCollectFacts, type FactsNeeds } from './collectFacts';

interface ReportNeeds extends FactsNeeds {
  /** Published cases of a firm. */
  annexOf: (firmId: number) => Promise<AnnexFacts>;
}

/**
 * Reports as PDF. Before the signature one is drawn anew each time it is asked for; from then on it is drawn once, on
 * every paper, and kept, with the annex of published cases as a file of its own: whoever asks gets the same bytes, and the public page knows their hashes.
 */
export function buildReports(platform: Platform, needs: ReportNeeds) {
  const { models, now, sequelize } = platform;
  const { Report, Run, RunBlock } = models;
  const collect = buildCollectFacts(platform, needs);
  const pool = lazyPool<ReportTask, DrawnReport[]>(
    platform,
    `${__dirname}/../../reports`,
    'reportWorker',
  );

  async function draw(
    run: RunModel,
    facts: ReportFacts,
    papers: Paper[],
    annex: boolean,
  ): Promise<DrawnReport[]> {
    const cases = annex ? await needs.annexOf(run.study!.firmId) : null;
    const [rows, { caseBytes }] = await Promise.all([
      RunBlock.findAll({ where: { runId: run.id } }),
      Run.unscoped().findByPk(run.id, { attributes: ['id', 'caseBytes'], rejectOnEmpty: true }),
    ]);
    const blocks = rows.map(({ kind, part, bytes }) => ({ kind, part, bytes }));
    return pool().run({ blocks, caseBytes, facts, papers, annex: cases });
  }

  const kept = (runId: number, standing: ReportModel['standing'], { paper, annex }: ReportQuery) =>
    Report.scope('withPdf').findOne({ where: { runId, standing, paper, annex } });

  /** Draws and keeps those papers that are not kept yet. */
  async function keep(
    run: RunModel,
    standing: ReportModel['standing'],
    facts: ReportFacts,
    annex: boolean,
  ) {
    const papers = [...PAPERS];
    const drawn = await draw(run, facts, papers, annex);
    await sequelize.transaction(async (transaction) => {
      // Of two who ask at once the second finds what the first has kept.
      await Run.findByPk(run.id, { lock: transaction.LOCK.UPDATE, transaction });
      const there = await Report.findAll({
        where: { runId: run.id, standing, annex },
        transaction,
      });
      for (const [k, paper] of papers.entries()) {
        if (there.some((report) => report.paper === paper)) continue;
        const pdf = Buffer.from(drawn[k].pdf);
        await Report.create(
          {
            runId: run.id,
            standing,
            paper,
            annex,
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

  /**
   * The PDF as the run stands. Needs a run read by `find.load`; throws `conflict` where it has no results, or where an annex
   * is asked for and no published case has one.
   */
  async function pdf(run: RunModel, wanted: ReportQuery): Promise<Buffer> {
    assertRouted(run);
    const { paper, annex } = wanted;
    const found =
      run.signOff && (await kept(run.id, run.withdrawal ? 'withdrawn' : 'signed', wanted));
    if (found) return found.pdf;
    const facts = await collect(run);
    const standing = standingOf(facts);
    if (standing === 'preliminary')
      return Buffer.from((await draw(run, facts, [paper], annex))[0].pdf);
    await keep(run, standing, facts, annex);
    return (await kept(run.id, standing, wanted))!.pdf;
  }

  /** Those that are kept, latest first. */
  async function list({ id: runId }: RunModel): Promise<ReportRow[]> {
    const rows = await Report.findAll({ where: { runId }, order: [['id', 'DESC']] });
    return rows.map(({ id, paper, annex, standing, hash, bytes, pages, createdAt }) => {
      const at = createdAt.toISOString();
      return { id, paper, annex, standing, hash, bytes, pages, createdAt: at };
    });
  }

  return { pdf, list };
}

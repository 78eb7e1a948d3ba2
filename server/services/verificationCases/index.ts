import type { Paper } from '../../../shared/reports/types';
import { conflict } from '../../errors';
import { lazyPool } from '../../jobs/lazyPool';
import type { Platform } from '../../platform';
import type { AnnexTask } from '../../reports/annex/annexWorker';
import type { AnnexFacts } from '../../reports/annex/types';
import type { buildTasks } from '../tasks';
import { buildFindCases } from './findCases';
import { buildRequestCases } from './requestCases';
import { valuesCsv } from './valuesCsv';

/** Published cases of a firm: asked for, found, and taken away as CSV or as the annex of a report. */
export function buildVerificationCases(platform: Platform, tasks: ReturnType<typeof buildTasks>) {
  const find = buildFindCases(platform, tasks);
  const pool = lazyPool<AnnexTask, Uint8Array>(
    platform,
    `${__dirname}/../../reports/annex`,
    'annexWorker',
  );

  /** What the annex is made of. Throws `conflict` where no case has a result. */
  async function annexOf(firmId: number): Promise<AnnexFacts> {
    const [firm, cases] = await Promise.all([
      platform.models.Firm.findByPk(firmId, { rejectOnEmpty: true }),
      find.finished(firmId),
    ]);
    if (cases.length === 0)
      throw conflict('No case has a result yet. Run the cases first; the annex is made of them.');
    return { firmName: firm.name, cases };
  }

  /** The annex as a file of its own. */
  const annex = async (firmId: number, paper: Paper): Promise<Buffer> =>
    Buffer.from(await pool().run({ facts: await annexOf(firmId), paper }));

  /** Throws `notFound` where there is no such case, `conflict` where it has no result. */
  async function csv(firmId: number, caseId: string): Promise<string> {
    const { result } = await find.detail(firmId, caseId);
    if (!result) throw conflict('The case has no result yet. Run it first.');
    return valuesCsv(result);
  }

  return { annex, annexOf, find, request: buildRequestCases(tasks, find), csv };
}

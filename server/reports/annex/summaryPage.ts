import { CASE_GROUPS } from '../../../shared/verificationCases/types';
import { formatError, GROUP_WORDS } from '../../../shared/verificationCases/words';
import { SOLVER_VERSION } from '../../solvers/version';
import type { Sheet } from '../pdf/sheet';
import { table } from '../pdf/table';
import { heading, notice, paragraph, partHeading } from '../pdf/writing';
import { momentText } from '../words';
import type { AnnexCase, AnnexFacts } from './types';

/** What the cases are for, what they are not for, and the list of verdicts. */
export function summaryPage(
  sheet: Sheet,
  { cases }: AnnexFacts,
  report: { solverVersion: string } | null,
): void {
  const older = cases.filter(({ summary }) => !summary.isCurrent);
  const outside = cases.filter(({ summary }) => !summary.within);
  partHeading(sheet, 'Annex: published cases', report ? 'newPage' : 'flowing');
  paragraph(
    sheet,
    `The solver that routes the floods (version ${SOLVER_VERSION}) was given ${cases.length} cases whose answers are known: exact ` +
      'solutions of the equations, and independent integrations of them. This annex holds what it computed against what is ' +
      'right, with the errors on several grids.',
  );
  paragraph(
    sheet,
    'A case within its bounds shows that the equations are solved as they should be. It says nothing of how well the survey, the ' +
      'roughness or the flood of a study are known, and nothing of what one-dimensional equations leave out. The judgement of ' +
      'a licensed engineer and the rules of the local authority stand over it.',
  );
  if (report) ofReport(sheet, cases, report.solverVersion);
  if (outside.length > 0)
    notice(
      sheet,
      `${outside.length} of ${cases.length} cases lie outside their bounds: ${outside.map(({ about }) => about.title).join('; ')}.`,
      'brick',
    );
  if (older.length > 0)
    notice(
      sheet,
      `${older.length} of ${cases.length} results were computed by an older version of the solver, as marked. Run these cases again.`,
      'ochre',
    );
  for (const group of CASE_GROUPS) {
    const rows = cases.filter(({ about }) => about.group === group);
    if (rows.length === 0) continue;
    heading(sheet, GROUP_WORDS[group]);
    table(
      sheet,
      [
        { heading: 'Case', share: 4.4 },
        { heading: 'Mean difference of stage, m', share: 2.2, align: 'right' },
        { heading: 'of flow, m³/s', share: 1.8, align: 'right' },
        { heading: 'Verdict', share: 1.8 },
        { heading: 'Solver', share: 1.4 },
      ],
      rows.map(row),
    );
  }
}

/** What a signature on the report does not say, and whether it was this solver that routed the run. */
function ofReport(sheet: Sheet, cases: readonly AnnexCase[], routedBy: string): void {
  paragraph(
    sheet,
    'The annex tells of the solver and not of this run: what is signed in the report above is the run.',
  );
  const others = cases.filter(({ summary }) => summary.solver !== routedBy);
  if (others.length > 0)
    notice(
      sheet,
      `The run of this report was routed by solver ${routedBy}; ${others.length} of ${cases.length} cases were computed by another version, as marked.`,
      'ochre',
    );
}

const row = ({ about, summary }: AnnexCase): string[] => [
  about.title,
  formatError(summary.stage.l1),
  formatError(summary.flow.l1),
  summary.within ? 'within bounds' : 'OUTSIDE',
  summary.isCurrent ? summary.solver : `${summary.solver}, older`,
];

/** Who computed it and when. */
export const computedText = ({ summary }: AnnexCase): string =>
  `Computed ${momentText(summary.computedAt)} by solver ${summary.solver}${summary.isCurrent ? '' : ' (older than the present one)'}, asked for by ${summary.requestedBy}.`;

import type { GridErrors } from '../../../shared/verificationCases/types';
import {
  boundText,
  formatError,
  formatOrder,
  measuredText,
  MEASURE_WORDS,
} from '../../../shared/verificationCases/words';
import { comparison } from '../charts/comparison';
import { figure } from '../pdf/figure';
import type { Sheet } from '../pdf/sheet';
import { table } from '../pdf/table';
import { note, paragraph, partHeading } from '../pdf/writing';
import { computedText } from './summaryPage';
import type { AnnexCase } from './types';

/** One case: what it is, the drawing, the verdict, the grids, the source. */
export function casePage(sheet: Sheet, each: AnnexCase): void {
  const { about, result } = each;
  const { curves, criteria, grids } = result;
  partHeading(sheet, about.title, 'newPage');
  paragraph(sheet, about.setup);
  const finest = grids[grids.length - 1];
  figure(
    sheet,
    (['stage', 'flow'] as const).map((quantity) => comparison(about.title, curves, quantity)),
    168,
    `Computed on ${finest.cells} cells, as rings, over the exact line.` +
      (curves.leftOut.length > 0
        ? ' The bar at the foot marks the stretch about the jump that the norms leave out.'
        : ''),
  );
  table(
    sheet,
    [
      { heading: 'On the finest grid', share: 4 },
      { heading: 'Found', share: 2.4, align: 'right' },
      { heading: 'Bound', share: 3, align: 'right' },
      { heading: 'Verdict', share: 1.6 },
    ],
    criteria.map((criterion) => [
      MEASURE_WORDS[criterion.measure],
      measuredText(criterion),
      boundText(criterion),
      criterion.within ? 'within' : 'OUTSIDE',
    ]),
  );
  gridTable(sheet, grids);
  note(sheet, about.boundReason);
  paragraph(sheet, `Shows: ${about.shows}`);
  paragraph(sheet, `Does not show: ${about.doesNotShow}`);
  note(sheet, `Source: ${about.source}`);
  note(sheet, computedText(each));
}

function gridTable(sheet: Sheet, grids: readonly GridErrors[]): void {
  table(
    sheet,
    [
      { heading: 'Cells', share: 1, align: 'right' },
      { heading: 'Stage L1, m', share: 1.6, align: 'right' },
      { heading: 'L2', share: 1.5, align: 'right' },
      { heading: 'L∞', share: 1.5, align: 'right' },
      { heading: 'Order', share: 0.9, align: 'right' },
      { heading: 'Flow L1, m³/s', share: 1.7, align: 'right' },
      { heading: 'L2', share: 1.5, align: 'right' },
      { heading: 'L∞', share: 1.5, align: 'right' },
      { heading: 'Order', share: 0.9, align: 'right' },
    ],
    grids.map(({ cells, stage, flow, stageOrder, flowOrder }) => [
      String(cells),
      ...[stage.l1, stage.l2, stage.max].map(formatError),
      formatOrder(stageOrder),
      ...[flow.l1, flow.l2, flow.max].map(formatError),
      formatOrder(flowOrder),
    ]),
  );
}

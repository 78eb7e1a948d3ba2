import { gridConvergence } from '../../../../shared/confidence/gridConvergence';
import { partsOf, q, say, sayAll } from '../../../../shared/units/message';
import { fine, type ChecklistRule } from './types';

/** m between the finest two grids. */
const GOOD = 0.05;

export const gridSize: ChecklistRule = ({ convergence, grids, run }) => {
  const item = {
    id: 'gridSize',
    title: 'Cell size',
    rule: say`The same case on three cell sizes, with the grid convergence index (Roache 1994; Celik et al. 2008); ${q(GOOD, 'depth')} between the finest two is good (common practice).`,
  };
  if (convergence) return { ...item, ...ofSet(convergence) };
  if (grids.length < 2)
    return {
      ...item,
      outcome: 'asked',
      finding: say`Routed on cells of ${q(run.cellSize, 'length')} alone. Compute a convergence set of it, or say why these cells are fine enough.`,
    };
  const [finest, medium, coarse] = grids;
  const pairs = finest.peaks.flatMap(({ name, stage }) => {
    const other = medium.peaks.find((peak) => peak.name === name);
    return other ? [{ name, fine: stage, medium: other.stage }] : [];
  });
  const most = pairs.reduce(
    (a, b) => (Math.abs(b.fine - b.medium) > Math.abs(a.fine - a.medium) ? b : a),
    pairs[0],
  );
  const difference = most ? Math.abs(most.fine - most.medium) : 0;
  const sizes = sizesOf(grids);
  return {
    ...item,
    outcome: difference <= GOOD ? 'good' : 'look',
    finding: say`Cells of ${sizes}: the finest two differ by at most ${fine(difference)}${most ? `, at ${most.name}` : ''}.${
      coarse && most ? orderOf(most.name, [finest, medium, coarse]) : ''
    }`,
  };
};

/** A set of three grids of this very case says more than runs that happen to be there. */
function ofSet({ name, result }: NonNullable<Parameters<ChecklistRule>[0]['convergence']>) {
  const { along, grids, widest } = result;
  const difference = Math.abs(widest.difference);
  const sizes = sizesOf(grids);
  const order =
    along.order === null ? '' : ` Observed order of the peak stage ${along.order.toFixed(1)}.`;
  return {
    outcome: difference <= GOOD ? ('good' as const) : ('look' as const),
    finding: say`${name}: cells of ${sizes}; the finest two differ in peak stage by at most ${fine(difference)}, at chainage ${q(widest.chainage, 'chainage')}.${order}`,
  };
}

const sizesOf = (grids: readonly { cellSize: number | null }[]) =>
  partsOf(
    sayAll(
      grids.map(({ cellSize }) =>
        cellSize === null ? { message: 'failed' } : say`${q(cellSize, 'length')}`,
      ),
      ', ',
    ),
  );

type Grid = Parameters<ChecklistRule>[0]['grids'][number];

function orderOf(name: string, grids: [Grid, Grid, Grid]): string {
  const stages = grids.map(({ peaks }) => peaks.find((peak) => peak.name === name)?.stage);
  if (stages.some((stage) => stage === undefined)) return '';
  const { order, gciFine } = gridConvergence(
    stages as [number, number, number],
    grids.map(({ cellSize }) => cellSize) as [number, number, number],
  );
  return order === null || gciFine === null
    ? ' The three do not tell an order.'
    : ` Observed order ${order.toFixed(1)}, grid convergence index of the finest ${(100 * gciFine).toPrecision(2)} % of the stage.`;
}

import { PUBLISHED_CASES } from '@/server/verificationCases';
import { manufacturedErrors } from '../helpers/solvers/manufacturedErrors';
import { manufacturedFlow } from '../helpers/solvers/manufacturedFlow';
import type { GridRow } from './gridRow';
import { publishedErrors } from './publishedErrors';
import type { Scheme } from './schemes';

/** One table: a case, its grids, and what a scheme leaves on each. */
export interface OrderTableCase {
  id: string;
  title: string;
  source: string;
  /** What the first error is of, with its unit. */
  water: string;
  grids: readonly number[];
  errors(scheme: Scheme, grids?: readonly number[]): GridRow[];
}

/** Cases without an order: water at rest leaves rounding, pools have no grid to speak of, approximate theories have their floor. */
const WITHOUT_ORDER = /^(still|lake|pool|level-pool|small-wave|dam-rough)/;

/** A case with three grids gets a coarser fourth. */
const fourGrids = (grids: readonly number[]) =>
  grids.length > 3 ? grids : [Math.ceil(grids[0] / 2), ...grids];

const published = PUBLISHED_CASES.filter(
  ({ id, grids }) => grids.length > 2 && !WITHOUT_ORDER.test(id),
).map((each): OrderTableCase => ({
  id: each.id,
  title: each.title,
  source: each.source,
  water: 'surface, m',
  grids: fourGrids(each.grids),
  errors: (scheme, grids) => publishedErrors(each, scheme, grids ?? fourGrids(each.grids)),
}));

function manufactured(id: string, title: string, bankHeight: number, gain: number): OrderTableCase {
  const GRIDS = [15, 30, 60, 120];
  return {
    id,
    title,
    source:
      'P. J. Roache (2002), Code verification by the method of manufactured solutions, J. Fluids Eng. 124, 4-10. Sections, ' +
      'friction and lateral flow vary along the reach; the sources that the chosen flow needs are added in the test alone.',
    water: 'area, m²',
    grids: GRIDS,
    errors: ({ numerics }, grids = GRIDS) =>
      grids.map((cells) => {
        const { area, flow } = manufacturedErrors(
          manufacturedFlow(bankHeight, gain),
          cells,
          numerics.order ?? 2,
        );
        return { cells, errors: [area, flow] };
      }),
  };
}

export const ORDER_TABLES: readonly OrderTableCase[] = [
  ...published,
  manufactured('manufactured-gaining', 'Manufactured flow that gains water', 6, 0.03),
  manufactured('manufactured-losing', 'Manufactured flow that loses water', 6, -0.03),
  manufactured('manufactured-over-bank', 'Manufactured flow over the banks', 3, 0.065),
];

import type { VolumeBalance } from '../../../shared/case/resultFile';
import type { Workspace } from '../workspace';

/** Counts every cubic metre that passes an end or comes from the side. */
export interface VolumeLedger {
  /** Starts the books with the water that is in the reach. */
  open(): void;
  /** Volumes (m³) of one step */
  enter(inflow: number, lateral: number, outflow: number): void;
  balance(): VolumeBalance;
}

export function createVolumeLedger(workspace: Workspace): VolumeLedger {
  const { n, dx, area } = workspace;
  let initial = 0;
  const inflow = compensatedSum();
  const lateral = compensatedSum();
  const outflow = compensatedSum();
  /** All that passed either way: where as much came as went the sums above tell of little. */
  let moved = 0;

  function stored(): number {
    const sum = compensatedSum();
    for (let i = 1; i <= n; i++) sum.add(area[i] * dx);
    return sum.value();
  }

  return {
    open() {
      initial = stored();
    },
    enter(inV, latV, outV) {
      inflow.add(inV);
      lateral.add(latV);
      outflow.add(outV);
      moved += Math.abs(inV) + Math.abs(latV) + Math.abs(outV);
    },
    balance() {
      const final = stored();
      const volumes = [inflow.value(), lateral.value(), outflow.value()];
      const error = final - initial - volumes[0] - volumes[1] + volumes[2];
      const turnover = Math.max(
        initial + Math.abs(volumes[0]) + Math.abs(volumes[1]),
        final + Math.abs(volumes[2]),
        0.5 * moved,
      );
      return {
        initial,
        inflow: volumes[0],
        lateral: volumes[1],
        outflow: volumes[2],
        final,
        error,
        relativeError: turnover > 0 ? error / turnover : 0,
      };
    },
  };
}

/** Neumaier (1974), Z. Angew. Math. Mech. 54, 39-51: a sum that keeps what rounding drops. */
function compensatedSum(): { add(x: number): void; value(): number } {
  let sum = 0;
  let rest = 0;
  return {
    add(x) {
      const next = sum + x;
      rest += Math.abs(sum) >= Math.abs(x) ? sum - next + x : x - next + sum;
      sum = next;
    },
    value: () => sum + rest,
  };
}

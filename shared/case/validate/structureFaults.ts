import { say, typed } from '../../units/message';
import { CASE_LIMITS } from '../caseLimits';
import type { ReachEnds } from './boundaryFaults';
import { join, type Faults } from './faults';
import { checkBreach } from './structures/breachFaults';
import { checkBridge } from './structures/bridgeFaults';
import { checkCulvert } from './structures/culvertFaults';
import { checkSluice } from './structures/sluiceFaults';
import { checkWeir } from './structures/weirFaults';

/** What is checked of each kind beyond id and chainage. */
const CHECKS: Record<string, (faults: Faults, path: string, value: unknown) => void> = {
  weir: checkWeir,
  sluice: checkSluice,
  culvert: checkCulvert,
  bridge: checkBridge,
  breach: checkBreach,
};

/** The list of structures of a case; ids unique, each within the reach and its fields those of its kind. */
export function checkStructures(
  faults: Faults,
  { structures, upstream, numerics }: Record<string, unknown>,
  ends: ReachEnds,
): void {
  if (!faults.array('structures', structures, 0, CASE_LIMITS.structures)) return;
  const hasReservoir = isRecord(upstream) && upstream.kind === 'reservoir';
  const ids = new Map<string, number>();
  let inside = 0;
  structures.forEach((structure, k) => {
    const path = `structures[${k}]`;
    const kind = faults.kind(path, structure, Object.keys(CHECKS));
    if (kind === null || !isRecord(structure)) return;
    const { note, ...rest } = structure;
    if (note !== undefined) faults.text(join(path, 'note'), note, CASE_LIMITS.note);
    CHECKS[kind](faults, path, rest);
    const { id, chainage } = structure;
    if ('id' in structure && faults.text(join(path, 'id'), id, 100)) {
      const first = ids.get(id);
      if (id === '') faults.add(join(path, 'id'), 'is empty; name the structure');
      else if (first !== undefined) {
        faults.add(
          join(path, 'id'),
          `"${id}" is also the id of structures[${first}]; make it unique`,
        );
      } else ids.set(id, k);
    }
    const at = join(path, 'chainage');
    if (
      !('chainage' in structure) ||
      !faults.number(at, chainage, 'a chainage', 'chainage') ||
      !ends
    )
      return;
    if (hasReservoir && chainage === ends[0]) return;
    inside++;
    if (chainage > ends[0] && chainage < ends[1]) return;
    faults.add(
      at,
      say`${typed(chainage, 'chainage')} does not lie between the ends of the reach, ${typed(ends[0], 'chainage')} and ${typed(ends[1], 'chainage')}${chainage === ends[0] ? '; at the head only a reservoir can have structures' : ''}`,
    );
  });
  const cellSize = isRecord(numerics) ? numerics.cellSize : null;
  if (inside > 0 && ends && typeof cellSize === 'number' && cellSize > 0) {
    if (Math.round((ends[1] - ends[0]) / cellSize) < 2) {
      faults.add(
        'numerics.cellSize',
        'makes one cell; a structure stands between two: use a smaller one',
      );
    }
  }
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null;
}

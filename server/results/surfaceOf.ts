import type { RunSurface } from '../../shared/runs/types';
import type { PlaceColumns } from './blocks/blockTypes';
import { evenly } from './blocks/evenly';
import type { RunBlocks } from './blocks/runBlocks';

/**
 * The whole wave at about as many places and moments as a screen can show. The surveyed sections, both ends, the first
 * and the last moment are always among them.
 */
export async function surfaceOf(
  blocks: RunBlocks,
  wanted: { places: number; moments: number },
): Promise<RunSurface> {
  const [facts, places] = await Promise.all([blocks.facts(), blocks.places()]);
  const chosen = choosePlaces(places, wanted.places);
  const moments = evenly(facts.moments.length, wanted.moments);
  const rows = await blocks.wave(chosen.map((i) => places.wave[i]));
  const at = (column: Float64Array) => Float32Array.from(chosen, (i) => column[i]);
  const p = chosen.length;
  const stage = new Float32Array(p * moments.length);
  const flow = new Float32Array(p * moments.length);
  moments.forEach((moment, m) => {
    for (let i = 0; i < p; i++) {
      stage[m * p + i] = places.bed[chosen[i]] + rows[i].depth[moment];
      flow[m * p + i] = rows[i].flow[moment];
    }
  });
  return {
    places: p,
    moments: moments.length,
    times: Float64Array.from(moments, (m) => facts.times[facts.moments[m]]),
    chainages: Float64Array.from(chosen, (i) => places.chainage[i]),
    bed: at(places.bed),
    leftBank: at(places.leftBank),
    rightBank: at(places.rightBank),
    peakStage: at(places.peakStage),
    stage,
    flow,
  };
}

/** Indexes of the places: every surveyed section, and of the cells in the wave as many as fit. */
function choosePlaces(places: PlaceColumns, wanted: number): number[] {
  const onWave = Array.from(places.wave.keys()).filter((i) => places.wave[i] >= 0);
  const sections = onWave.filter((i) => places.section[i] >= 0);
  const cells = onWave.filter((i) => places.section[i] < 0);
  const room = Math.max(0, wanted - sections.length);
  const kept = room === 0 ? [] : Array.from(evenly(cells.length, room), (k) => cells[k]);
  return [...sections, ...kept].sort((a, b) => a - b);
}

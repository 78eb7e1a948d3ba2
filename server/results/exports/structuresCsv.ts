import { REGIME_WORDS, REGIMES, STRUCTURE_NAMES } from '../../../shared/structures/structureWords';
import type { RunBlocks } from '../blocks/runBlocks';
import { csvLine } from './csvField';
import { clockTime, type ExportedRun } from './exportedRun';
import { EXPORT_UNITS } from './exportUnits';

/** Rows between two breaths of the event loop. */
const ROWS_AT_ONCE = 1000;

/**
 * One long table of what stands in the river: a row for each structure, and for the reservoir at the head, and output
 * time. In the study's units, metric ones exactly as computed. Yields pieces of text.
 */
export async function* structuresCsv(blocks: RunBlocks, run: ExportedRun): AsyncGenerator<string> {
  const { length, flow, volume } = EXPORT_UNITS[run.unitSystem];
  const { times, structures = [], reservoir } = await blocks.facts();
  const m = length.symbol;
  yield csvLine([
    'structure',
    'kind',
    `chainage (${m})`,
    'time (s)',
    ...(run.startsAt ? ['clock time (UTC)'] : []),
    `flow (${flow.symbol})`,
    `stage above (${m})`,
    `stage below (${m})`,
    'regime',
    `breach width (${m})`,
    `breach bottom (${m})`,
    `volume (${volume.symbol})`,
    `inflow (${flow.symbol})`,
  ]);
  const rows = function* (line: (k: number) => (string | number | null)[], head: Head) {
    for (let from = 0; from < times.length; from += ROWS_AT_ONCE) {
      let text = '';
      for (let k = from; k < Math.min(from + ROWS_AT_ONCE, times.length); k++) {
        const clock = run.startsAt ? [clockTime(run.startsAt, times[k])] : [];
        text += csvLine([...head, times[k], ...clock, ...line(k)]);
      }
      yield text;
    }
  };
  for (const [part, { id, kind, chainage }] of structures.entries()) {
    const of = await blocks.structure(part);
    yield* rows(
      (k) => [
        of.flow[k] / flow.si,
        of.stageUp[k] / length.si,
        of.stageDown[k] / length.si,
        REGIME_WORDS[REGIMES[of.regime[k]]],
        of.width ? of.width[k] / length.si : null,
        of.bottom ? of.bottom[k] / length.si : null,
        null,
        null,
      ],
      [id, STRUCTURE_NAMES[kind].toLowerCase(), chainage / length.si],
    );
  }
  if (!reservoir) return;
  const pool = await blocks.reservoir();
  yield* rows(
    (k) => [
      pool.release[k] / flow.si,
      pool.stage[k] / length.si,
      null,
      '',
      null,
      null,
      pool.volume[k] / volume.si,
      pool.inflow[k] / flow.si,
    ],
    ['Reservoir', 'reservoir', null],
  );
}

type Head = [string, string, number | null];

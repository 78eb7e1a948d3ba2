import type { RunBlocks } from '../blocks/runBlocks';
import { seriesAt } from '../seriesAt';
import { csvLine } from './csvField';
import { clockTime, type ExportedRun } from './exportedRun';
import { exportPlaces, type ExportPlace } from './exportPlaces';
import { EXPORT_UNITS } from './exportUnits';

/** Rows between two breaths of the event loop: a few milliseconds of work. */
const ROWS_AT_ONCE = 1000;

/**
 * One long table, a row for each place and output time; the peaks, taken over every time step, stand in each row of
 * their place. In the study's units, metric ones exactly as computed. Yields pieces of text.
 */
export async function* csv(blocks: RunBlocks, run: ExportedRun): AsyncGenerator<string> {
  const units = EXPORT_UNITS[run.unitSystem];
  const [m, q, v] = [units.length.symbol, units.flow.symbol, units.velocity.symbol];
  yield csvLine([
    'section',
    'kind',
    `chainage (${m})`,
    'time (s)',
    ...(run.startsAt ? ['clock time (UTC)'] : []),
    `stage (${m})`,
    `depth (${m})`,
    `flow (${q})`,
    `velocity (${v})`,
    'Froude number (-)',
    `peak stage (${m})`,
    'peak stage time (s)',
    `peak flow (${q})`,
    'peak flow time (s)',
    'arrival (s)',
  ]);
  for (const place of await exportPlaces(blocks, run.stations)) {
    yield* rowsOf(blocks, run, place);
  }
}

async function* rowsOf(blocks: RunBlocks, run: ExportedRun, place: ExportPlace) {
  const { length, flow, velocity } = EXPORT_UNITS[run.unitSystem];
  const { peaks } = place;
  const series = await placeSeries(blocks, place);
  if (!series) return;
  const head = [place.name, place.kind, peaks.chainage / length.si];
  const tail = [
    peaks.peakStage / length.si,
    peaks.peakStageTime,
    peaks.peakFlow / flow.si,
    peaks.peakFlowTime,
    peaks.arrival,
  ];
  for (let from = 0; from < series.times.length; from += ROWS_AT_ONCE) {
    let text = '';
    const to = Math.min(from + ROWS_AT_ONCE, series.times.length);
    for (let k = from; k < to; k++) {
      text += csvLine([
        ...head,
        series.times[k],
        ...(run.startsAt ? [clockTime(run.startsAt, series.times[k])] : []),
        series.stage[k] / length.si,
        series.depth[k] / length.si,
        series.flow[k] / flow.si,
        series.velocity[k] / velocity.si,
        series.froude ? series.froude[k] : null,
        ...tail,
      ]);
    }
    yield text;
  }
}

/** All output times at a section. Between sections Froude numbers are not kept. */
async function placeSeries(blocks: RunBlocks, { section, peaks }: ExportPlace) {
  if (section !== null) {
    const { times } = await blocks.facts();
    return { times, ...(await blocks.series(section)) };
  }
  const series = await seriesAt(blocks, peaks.chainage);
  return series && { ...series, froude: null };
}

import { utils, write, type WorkSheet } from 'xlsx';
import type { CaseFile } from '../../../shared/case/caseFile';
import { CAUTIONS } from '../../../shared/runs/cautions';
import { arrivalRule } from '../../../shared/runs/arrivalRule';
import { sayIn } from '../../../shared/units/message';
import type { RunFacts } from '../blocks/blockTypes';
import type { RunBlocks } from '../blocks/runBlocks';
import { levelsAt } from '../levelsAt';
import { seriesAt } from '../seriesAt';
import { clockTime, type ExportedRun } from './exportedRun';
import { exportPlaces, type ExportPlace } from './exportPlaces';
import { EXPORT_UNITS, type ExportUnit } from './exportUnits';
import { inputsSheet } from './inputsSheet';
import { levelsSheet } from './levelsSheet';
import { residualRows } from './residualRows';
import { structuresSheets } from './structuresSheets';

type Cell = string | number | null;
const HOUR = 3600;

/**
 * The results as a workbook: peaks, then stage, flow and velocity with a column a place, then what went in and what to
 * mind. Values are as computed, in the study's units; the cells show fewer digits. Text is written as text, never as a
 * formula. Takes seconds for a large run: call it off the main thread.
 */
export async function workbook(
  blocks: RunBlocks,
  caseFile: CaseFile,
  run: ExportedRun,
): Promise<Uint8Array> {
  const { length, flow, velocity } = EXPORT_UNITS[run.unitSystem];
  const facts = await blocks.facts();
  const places = await exportPlaces(blocks, run.stations);
  const table = await valuesOf(blocks, facts, places);
  const sheet = (of: 'stage' | 'flow' | 'velocity', unit: ExportUnit, format: string) =>
    timeSheet(facts, run, places, (place, moment) => table[place][of][moment] / unit.si, format);

  const book = utils.book_new();
  const add = (name: string, rows: WorkSheet) => utils.book_append_sheet(book, rows, name);
  add('Peaks', peaksSheet(places, run));
  const levels = await levelsAt(blocks, run.stations);
  if (levels.length)
    add('Levels', columnsOf(levelsSheet(levels, run.unitSystem), [26, 16, 36, 14, 16, 16, 16, 16]));
  add('Stage', sheet('stage', length, '0.000'));
  add('Flow', sheet('flow', flow, '0.00'));
  add('Velocity', sheet('velocity', velocity, '0.000'));
  for (const { name, rows } of await structuresSheets(blocks, run))
    add(name, columnsOf(rows, [22, 16, 16, 16, 16, 16, 16, 30, 16, 16]));
  if (run.observed)
    add(
      'Observed',
      columnsOf(residualRows(run.observed, run.unitSystem), [26, 16, 20, 22, 16, 18]),
    );
  add('Inputs', columnsOf(inputsSheet(run, caseFile, facts), [34, 22, 22, 22]));
  add('Warnings', columnsOf(warningsSheet(facts, run), [28, 18, 18, 110]));
  return new Uint8Array(
    write(book, { type: 'array', bookType: 'xlsx', compression: true }) as ArrayBuffer,
  );
}

function columnsOf(rows: Cell[][], widths: number[]): WorkSheet {
  const sheet = utils.aoa_to_sheet(rows);
  sheet['!cols'] = widths.map((wch) => ({ wch }));
  return sheet;
}

function peaksSheet(places: ExportPlace[], run: ExportedRun): WorkSheet {
  const { length, flow, velocity } = EXPORT_UNITS[run.unitSystem];
  const m = length.symbol;
  const headings = [
    'Place',
    'Kind',
    `Chainage (${m})`,
    `Bed (${m})`,
    `Peak stage (${m})`,
    'Peak stage at (h)',
    `Peak flow (${flow.symbol})`,
    'Peak flow at (h)',
    `Peak depth (${m})`,
    `Peak velocity (${velocity.symbol})`,
    'Arrival (h)',
    'Attenuation (-)',
  ];
  const rows = places.map(({ name, kind, peaks }): Cell[] => [
    name,
    kind,
    peaks.chainage / length.si,
    peaks.bed / length.si,
    peaks.peakStage / length.si,
    peaks.peakStageTime / HOUR,
    peaks.peakFlow / flow.si,
    peaks.peakFlowTime / HOUR,
    peaks.peakDepth / length.si,
    peaks.peakVelocity / velocity.si,
    peaks.arrival === null ? null : peaks.arrival / HOUR,
    peaks.attenuation,
  ]);
  const sheet = columnsOf(
    [headings, ...rows],
    headings.map((h, k) => (k === 0 ? 28 : h.length + 2)),
  );
  format(sheet, 2, ['0.0', '0.00', '0.00', '0.00', '0.0', '0.00', '0.00', '0.00', '0.00', '0.000']);
  return sheet;
}

/** A row a moment, a column a place; two heading rows, the second with the chainages. */
function timeSheet(
  facts: RunFacts,
  run: ExportedRun,
  places: ExportPlace[],
  value: (place: number, moment: number) => number,
  numberFormat: string,
): WorkSheet {
  const { length } = EXPORT_UNITS[run.unitSystem];
  const clock = run.startsAt ? ['Clock time (UTC)'] : [];
  const rows: Cell[][] = [
    ['Time (h)', ...clock, ...places.map((place) => place.name)],
    [
      `Chainage (${length.symbol})`,
      ...clock.map(() => ''),
      ...places.map((place) => place.peaks.chainage / length.si),
    ],
  ];
  facts.moments.forEach((output, moment) => {
    const time = facts.times[output];
    rows.push([
      time / HOUR,
      ...(run.startsAt ? [clockTime(run.startsAt, time)] : []),
      ...places.map((_, place) => value(place, moment)),
    ]);
  });
  const sheet = columnsOf(rows, [16, ...clock.map(() => 22), ...places.map(() => 12)]);
  const skipped = 1 + clock.length;
  format(sheet, skipped, new Array(places.length).fill(numberFormat), 2);
  format(sheet, 0, ['0.000'], 2);
  return sheet;
}

/** Sets the number format of columns from `firstColumn` on, below the heading rows. */
function format(sheet: WorkSheet, firstColumn: number, formats: string[], headingRows = 1): void {
  const { e: end } = utils.decode_range(sheet['!ref'] ?? 'A1');
  for (let r = headingRows; r <= end.r; r++) {
    formats.forEach((z, k) => {
      const cell = sheet[utils.encode_cell({ r, c: firstColumn + k })];
      if (cell?.t === 'n') cell.z = z;
    });
  }
}

function warningsSheet(facts: RunFacts, run: ExportedRun): Cell[][] {
  const { length, volume: cubic } = EXPORT_UNITS[run.unitSystem];
  const { volume } = facts;
  const warnings = facts.warnings.map((warning): Cell[] => [
    warning.code,
    warning.chainage === null ? null : warning.chainage / length.si,
    warning.time === null ? null : warning.time / HOUR,
    sayIn(run.unitSystem, warning),
  ]);
  return [
    ['Warnings of the run', `Chainage (${length.symbol})`, 'Time (h)', 'In words'],
    ...(warnings.length > 0 ? warnings : [['none', null, null, 'The run gave no warning.']]),
    [],
    [`Volume balance (${cubic.symbol})`],
    ['At the start', volume.initial / cubic.si],
    ['Inflow', volume.inflow / cubic.si],
    ['Lateral inflow', volume.lateral / cubic.si],
    ['Outflow', volume.outflow / cubic.si],
    ['At the end', volume.final / cubic.si],
    ['Error', volume.error / cubic.si],
    ['Error, relative', volume.relativeError],
    [],
    ['Arrival', sayIn(run.unitSystem, arrivalRule(facts.arrivalThreshold))],
    ...(facts.moments.length < facts.times.length
      ? [
          [
            'Moments',
            `The sheets Stage, Flow and Velocity hold ${facts.moments.length} of the ${facts.times.length} output times, evenly taken. The CSV file holds all of them at the surveyed sections; peaks are of every time step.`,
          ],
        ]
      : []),
    [],
    ...CAUTIONS.map((caution, k): Cell[] => [k === 0 ? 'Cautions' : '', caution]),
  ];
}

type Values = Record<'stage' | 'flow' | 'velocity', ArrayLike<number>>;

/** Values of each place at the moments of the wave: exact at sections. */
async function valuesOf(
  blocks: RunBlocks,
  facts: RunFacts,
  places: ExportPlace[],
): Promise<Values[]> {
  const all: Values[] = [];
  for (const { section, peaks } of places) {
    const series = section === null ? await seriesAt(blocks, peaks.chainage) : null;
    if (series && series.sectionId === null) {
      all.push(series);
      continue;
    }
    const part = section ?? facts.sections.findIndex((s) => s.id === series?.sectionId);
    const exact = await blocks.series(part);
    const atMoments = (values: Float64Array) => facts.moments.map((k) => values[k]);
    all.push({
      stage: atMoments(exact.stage),
      flow: atMoments(exact.flow),
      velocity: atMoments(exact.velocity),
    });
  }
  return all;
}

import { REGIME_WORDS, REGIMES, STRUCTURE_NAMES } from '../../../shared/structures/structureWords';
import type { RunBlocks } from '../blocks/runBlocks';
import { clockTime, type ExportedRun } from './exportedRun';
import { EXPORT_UNITS } from './exportUnits';

type Cell = string | number | null;
const HOUR = 3600;

/** Sheets for what stands in the river and for the reservoir at its head, at the moments of the other sheets. */
export async function structuresSheets(
  blocks: RunBlocks,
  run: ExportedRun,
): Promise<{ name: string; rows: Cell[][] }[]> {
  const facts = await blocks.facts();
  const { times, moments, structures = [] } = facts;
  const { length, flow, volume } = EXPORT_UNITS[run.unitSystem];
  const m = length.symbol;
  const clockHeading = run.startsAt ? ['Clock time (UTC)'] : [];
  const timeOf = (k: number): Cell[] => [
    times[k] / HOUR,
    ...(run.startsAt ? [clockTime(run.startsAt, times[k])] : []),
  ];
  const sheets: { name: string; rows: Cell[][] }[] = [];
  if (structures.length > 0) {
    const rows: Cell[][] = [
      [
        'Structure',
        'Kind',
        `Chainage (${m})`,
        'Time (h)',
        ...clockHeading,
        `Flow (${flow.symbol})`,
        `Stage above (${m})`,
        `Stage below (${m})`,
        'Regime',
        `Breach width (${m})`,
        `Breach bottom (${m})`,
      ],
    ];
    for (const [part, { id, kind, chainage }] of structures.entries()) {
      const of = await blocks.structure(part);
      for (const k of moments)
        rows.push([
          id,
          STRUCTURE_NAMES[kind],
          chainage / length.si,
          ...timeOf(k),
          of.flow[k] / flow.si,
          of.stageUp[k] / length.si,
          of.stageDown[k] / length.si,
          REGIME_WORDS[REGIMES[of.regime[k]]],
          of.width ? of.width[k] / length.si : null,
          of.bottom ? of.bottom[k] / length.si : null,
        ]);
    }
    sheets.push({ name: 'Structures', rows });
  }
  if (facts.reservoir) {
    const pool = await blocks.reservoir();
    sheets.push({
      name: 'Reservoir',
      rows: [
        [
          'Time (h)',
          ...clockHeading,
          `Stage (${m})`,
          `Volume (${volume.symbol})`,
          `Inflow (${flow.symbol})`,
          `Release (${flow.symbol})`,
        ],
        ...moments.map((k): Cell[] => [
          ...timeOf(k),
          pool.stage[k] / length.si,
          pool.volume[k] / volume.si,
          pool.inflow[k] / flow.si,
          pool.release[k] / flow.si,
        ]),
      ],
    });
  }
  return sheets;
}

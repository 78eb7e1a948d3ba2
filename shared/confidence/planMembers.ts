import type { CaseFile } from '../case/caseFile';
import { valueAt } from './distributions';
import { latinHypercube } from './latinHypercube';
import { PARAMETERS, type ParameterKey } from './parameters';
import type {
  ConvergenceSettings,
  EnsembleSettings,
  SensitivitySettings,
  SettingsOf,
} from './schemas';
import type { ConfidencePayload } from './types';
import type { Variation } from './varyCase';
import { formatWithUnit } from '../units/format';
import type { UnitSystem } from '../units/units';

export interface PlannedMember {
  label: string;
  payload: ConfidencePayload;
}

/** The members of a set, from its settings and the case alone: the same each time. */
export const PLANS: {
  [K in keyof SettingsOf]: (settings: SettingsOf[K], caseFile: CaseFile) => PlannedMember[];
} = { convergence: planConvergence, sensitivity: planSensitivity, ensemble: planEnsemble };

/** Cells that the reach is really cut into, and their size (m), for a wished size. */
export function cellsOf({ sections }: CaseFile, wish: number): { cells: number; size: number } {
  const length = sections[sections.length - 1].chainage - sections[0].chainage;
  const cells = Math.max(1, Math.round(length / wish));
  return { cells, size: length / cells };
}

/** Three grids, each with half the cells of the one before. */
function planConvergence({ finest }: ConvergenceSettings, caseFile: CaseFile): PlannedMember[] {
  const own = caseFile.numerics.cellSize;
  // The run's own grid keeps its own number, so that its member gives the run's own bits.
  const fine = finest === 'half' ? cellsOf(caseFile, own).size / 2 : own;
  const { size } = cellsOf(caseFile, fine);
  return [fine, 2 * size, 4 * size].map((cellSize, step) => ({
    label: `${['Fine', 'Medium', 'Coarse'][step]} cells`,
    payload: { role: { kind: 'grid', step }, variation: { cellSize } },
  }));
}

const ownCells = (cellSize: number | null): Variation => (cellSize === null ? {} : { cellSize });

function planSensitivity({ cellSize, parameters }: SensitivitySettings): PlannedMember[] {
  const cells = ownCells(cellSize);
  return [
    { label: 'Base case', payload: { role: { kind: 'base' }, variation: cells } },
    ...parameters.flatMap(({ key, low, high }) =>
      (['low', 'high'] as const).map((side): PlannedMember => {
        const value = side === 'low' ? low : high;
        return {
          label: sideLabel(key, value, 'metric'),
          payload: {
            role: { kind: 'side', parameter: key, side, value },
            variation: { ...cells, [key]: value },
          },
        };
      }),
    ),
  ];
}

/** Moments of the hydrographs that are kept of a member. */
const MOMENTS = 240;

function planEnsemble(settings: EnsembleSettings, { numerics }: CaseFile): PlannedMember[] {
  const { cellSize, members, parameters, seed } = settings;
  const { duration, outputInterval } = numerics;
  const common: Variation = {
    ...ownCells(cellSize),
    outputInterval: Math.max(outputInterval, duration / MOMENTS),
  };
  const sample = latinHypercube(members, parameters.length, seed);
  return [
    { label: 'Base case', payload: { role: { kind: 'base' }, variation: common } },
    ...sample.map((point, draw): PlannedMember => {
      const drawn = Object.fromEntries(
        parameters.map(({ key, distribution }, d) => [key, valueAt(distribution, point[d])]),
      ) as Partial<Record<ParameterKey, number>>;
      return {
        label: `Member ${draw + 1}`,
        payload: { role: { kind: 'draw', draw }, variation: { ...common, ...drawn } },
      };
    }),
  ];
}

/** `+20 %`, `× 2.4` where it is far from 1, `−0.50 m`. */
export function valueWords(key: ParameterKey, value: number, system: UnitSystem): string {
  const { measure } = PARAMETERS[key];
  const sign = (amount: number) => (amount < 0 ? '−' : '+');
  if (measure === 'metres')
    return `${sign(value)}${formatWithUnit(Math.abs(value), 'depth', system)}`;
  if (value < 0.6 || value > 1.5) return `× ${Number(value.toFixed(2))}`;
  const percent = Number((100 * (value - 1)).toFixed(1));
  return `${sign(percent)}${Math.abs(percent)} %`;
}

/** One side of a varied input: `Manning's n +20 %`. */
export const sideLabel = (key: ParameterKey, value: number, system: UnitSystem): string =>
  `${PARAMETERS[key].label} ${valueWords(key, value, system)}`;

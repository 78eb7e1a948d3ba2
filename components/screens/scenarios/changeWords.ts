import type { NumberFieldProps } from '@/components/ui/NumberField';
import type { ScenarioChangeKind } from '@/shared/scenarios/changeScenario';

export type ChangeOption = ScenarioChangeKind | 'none';

export const CHANGE_OPTIONS: { value: ChangeOption; label: string }[] = [
  { value: 'none', label: 'Nothing yet' },
  { value: 'inflow', label: 'Inflow times a factor' },
  { value: 'roughness', label: 'Roughness times a factor' },
  { value: 'outletSlope', label: 'Slope at the outlet' },
  { value: 'cellSize', label: 'Cell size' },
];

/** How the number of each change is asked for. */
export const CHANGE_FIELDS: Record<
  ScenarioChangeKind,
  Pick<NumberFieldProps, 'label' | 'unit' | 'quantity' | 'hint'>
> = {
  inflow: {
    label: 'Factor of the inflow',
    unit: '×',
    hint: 'The whole hydrograph with its base flow; 1.2 is a fifth more.',
  },
  roughness: {
    label: 'Factor of Manning’s n',
    unit: '×',
    hint: 'On the whole reach, beside the multipliers that are there already.',
  },
  outletSlope: { label: 'Slope at the outlet', quantity: 'slope' },
  cellSize: { label: 'Cell size', quantity: 'length' },
};

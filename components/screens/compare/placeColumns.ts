import type { Column } from '@/components/ui/Table';
import type { ComparedPlace, ComparedRun } from '@/shared/comparison/types';
import type { PlacePeaks } from '@/shared/runs/types';
import { formatDuration, formatQuantity, formatWithUnit } from '@/shared/units/format';
import { UNITS, type Quantity, type UnitSystem } from '@/shared/units/units';

interface Figure {
  title: string;
  of: (peaks: PlacePeaks) => number | null;
  /** What it is, and what a difference of it is shown as. */
  quantity: Quantity | 'time';
  difference: Quantity | 'time';
}

const FIGURES: Figure[] = [
  {
    title: 'Stage',
    of: ({ peakStage }) => peakStage,
    quantity: 'elevation',
    difference: 'depth',
  },
  { title: 'Flow', of: ({ peakFlow }) => peakFlow, quantity: 'flow', difference: 'flow' },
  { title: 'Arrives', of: ({ arrival }) => arrival, quantity: 'time', difference: 'time' },
  {
    title: 'Peak at',
    of: ({ peakStageTime }) => peakStageTime,
    quantity: 'time',
    difference: 'time',
  },
];

/** The first run's figures, each followed by what the other runs have more. */
export function placeColumns(runs: ComparedRun[], system: UnitSystem): Column<ComparedPlace>[] {
  const [first, ...others] = runs;
  const figures = FIGURES.flatMap((figure): Column<ComparedPlace>[] => [
    {
      key: figure.title,
      title: `${figure.title}, run ${first.number}`,
      unit: unitOf(figure.quantity, system),
      align: 'right',
      render: ({ peaks }) => {
        const value = peaks[0] && figure.of(peaks[0]);
        if (value === null) return peaks[0] ? 'never' : '–';
        return show(value, figure.quantity, system);
      },
    },
    ...others.map(({ number }, i): Column<ComparedPlace> => ({
      key: `${figure.title} ${number}`,
      title: `run ${number} less ${first.number}`,
      align: 'right',
      render: ({ peaks }) => differenceText(figure, peaks[0], peaks[i + 1], system),
    })),
  ]);
  return [
    {
      key: 'place',
      title: 'Place',
      render: ({ name, chainage }) => `${name}, ${formatWithUnit(chainage, 'chainage', system)}`,
    },
    ...figures,
  ];
}

const unitOf = (quantity: Figure['quantity'], system: UnitSystem) =>
  quantity === 'time' ? undefined : UNITS[system][quantity].symbol;

const show = (value: number, quantity: Figure['quantity'], system: UnitSystem) =>
  quantity === 'time' ? formatDuration(value) : formatQuantity(value, quantity, system);

/** With its sign; `now comes` and `no longer` where one of the two has no arrival. */
export function differenceText(
  { of, difference }: Figure,
  first: PlacePeaks | null,
  other: PlacePeaks | null,
  system: UnitSystem,
): string {
  if (!first || !other) return '–';
  const [a, b] = [of(first), of(other)];
  if (a === null || b === null) return a === b ? '–' : b === null ? 'no longer' : 'now comes';
  const text = show(b - a, difference, system);
  return b > a && /[1-9]/.test(text) ? `+${text}` : text;
}

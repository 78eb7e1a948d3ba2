import { formatChosenLength, formatWithUnit } from '../units/format';
import type { UnitSystem } from '../units/units';
import type { Distribution, DistributionKind } from './distributions';
import { PARAMETERS, type ParameterKey } from './parameters';
import { valueWords } from './planMembers';
import type { EnsembleSettings, SensitivitySettings, SettingsOf } from './schemas';

export const DISTRIBUTION_NAMES: Record<DistributionKind, string> = {
  lognormal: 'Lognormal',
  normal: 'Normal',
  triangular: 'Triangular',
  uniform: 'Uniform',
};

/** Its fields with what they are called. */
export const DISTRIBUTION_FIELDS: Record<DistributionKind, [field: string, label: string][]> = {
  lognormal: [
    ['median', 'Median'],
    ['spread', 'Geometric standard deviation'],
  ],
  normal: [
    ['mean', 'Mean'],
    ['deviation', 'Standard deviation'],
  ],
  triangular: [
    ['low', 'Lowest'],
    ['mode', 'Most likely'],
    ['high', 'Highest'],
  ],
  uniform: [
    ['low', 'Lowest'],
    ['high', 'Highest'],
  ],
};

const digits = (value: number) => String(Number(value.toPrecision(3)));

/** `lognormal, median 1, geometric standard deviation 1.2`; a shift with its unit. */
export function distributionWords(
  key: ParameterKey,
  distribution: Distribution,
  system: UnitSystem,
): string {
  const isShift = PARAMETERS[key].measure === 'metres';
  const given = distribution as unknown as Record<string, number>;
  const parts = DISTRIBUTION_FIELDS[distribution.kind].map(
    ([field, label]) =>
      `${label.toLowerCase()} ${
        isShift ? formatWithUnit(given[field], 'depth', system) : digits(given[field])
      }`,
  );
  return [DISTRIBUTION_NAMES[distribution.kind].toLowerCase(), ...parts].join(', ');
}

/** What was chosen for a set of one of the three kinds, as names with their values. */
export function settingFacts(
  set: { kind: string; settings: unknown },
  system: UnitSystem,
): [string, string | null][] {
  if (set.kind === 'convergence') {
    const { finest } = set.settings as SettingsOf['convergence'];
    return [
      ['Finest grid', finest === 'half' ? 'half the cells of the run' : 'the cells of the run'],
    ];
  }
  if (set.kind === 'sensitivity') {
    const { cellSize, parameters } = set.settings as SensitivitySettings;
    return [
      ...parameters.map(({ key, low, high }): [string, string] => [
        PARAMETERS[key].label,
        `${valueWords(key, low, system)} and ${valueWords(key, high, system)}`,
      ]),
      ['Cells', cellWords(cellSize, system)],
    ];
  }
  const { cellSize, members, parameters, seed } = set.settings as EnsembleSettings;
  return [
    ['Sampling', `Latin hypercube, ${members} members, seed ${seed}`],
    ...parameters.map(({ key, distribution }): [string, string] => [
      PARAMETERS[key].label,
      `${distributionWords(key, distribution, system)} (${PARAMETERS[key].measure === 'metres' ? 'added' : 'multiplies'})`,
    ]),
    ['Cells', cellWords(cellSize, system)],
  ];
}

const cellWords = (cellSize: number | null, system: UnitSystem): string =>
  cellSize === null
    ? 'those of the run'
    : `${formatChosenLength(cellSize, system)}, chosen for the members`;

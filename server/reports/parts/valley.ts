import { CASE_DEFAULTS, type CaseFile, type RoughnessFactor } from '../../../shared/case/caseFile';
import { formatNumber } from '../../../shared/units/format';
import type { Sheet } from '../pdf/sheet';
import { facts as factRows, table } from '../pdf/table';
import { heading } from '../pdf/writing';
import type { unitsOf } from '../words';

type Unit = ReturnType<typeof unitsOf>;

const PARTS: Record<RoughnessFactor['part'], string> = {
  all: 'whole section',
  channel: 'between the bank marks',
  overbank: 'outside the bank marks',
};

const MOMENTUM = {
  uniform: 'one velocity over the section',
  compound: 'by the parts of the section',
} as const;

export const momentumText = ({ numerics }: CaseFile): string =>
  MOMENTUM[numerics.momentum ?? CASE_DEFAULTS.momentum];

/** What of the valley was set beside the survey; nothing where nothing was. */
export function valley(sheet: Sheet, caseFile: CaseFile, unit: Unit): void {
  const { sections, roughnessFactors = [], localLosses = [] } = caseFile;
  const storing = sections.filter(({ storage }) => (storage?.length ?? 0) > 0);
  const guarded = sections.filter(({ embankments }) => embankments?.left || embankments?.right);
  if (storing.length > 0 || guarded.length > 0) {
    heading(sheet, 'Storage parts and embankments');
    factRows(sheet, [
      ['Sections with parts that store and do not flow', named(storing)],
      ['Sections with embankments that hold water out until overtopped', named(guarded)],
    ]);
  }
  if (roughnessFactors.length > 0) {
    heading(sheet, "Multipliers of Manning's n");
    table(
      sheet,
      [
        { heading: 'From', share: 2, align: 'right' },
        { heading: 'To', share: 2, align: 'right' },
        { heading: 'Part', share: 3 },
        { heading: 'Multiplier', share: 4 },
      ],
      roughnessFactors.map((factor) => [
        unit(factor.from, 'chainage'),
        unit(factor.to, 'chainage'),
        PARTS[factor.part],
        multiplierText(factor, unit),
      ]),
    );
  }
  if (localLosses.length > 0) {
    heading(sheet, 'Losses at narrows and widenings');
    table(
      sheet,
      [
        { heading: 'From', share: 2, align: 'right' },
        { heading: 'To', share: 2, align: 'right' },
        { heading: 'Where it narrows', share: 2, align: 'right' },
        { heading: 'Where it widens', share: 2, align: 'right' },
      ],
      localLosses.map(({ from, to, contraction, expansion }) => [
        unit(from, 'chainage'),
        unit(to, 'chainage'),
        formatNumber(contraction, 2),
        formatNumber(expansion, 2),
      ]),
    );
  }
}

function named(sections: readonly { id: string }[]): string {
  if (sections.length === 0) return 'none';
  const shown = sections.slice(0, 6).map(({ id }) => id);
  const rest = sections.length - shown.length;
  return rest > 0 ? `${shown.join(', ')} and ${rest} more` : shown.join(', ');
}

function multiplierText({ depths, factors }: RoughnessFactor, unit: Unit): string {
  if (factors.length === 1) return formatNumber(factors[0], 2);
  return depths
    .map((depth, k) => `${formatNumber(factors[k], 2)} at ${unit(depth, 'depth')}`)
    .join(', ');
}

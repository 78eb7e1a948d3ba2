import { useMemo, useState } from 'react';
import { CrossSection } from '@/components/charts/CrossSection';
import { LongSection } from '@/components/charts/LongSection';
import { ReachRibbon } from '@/components/charts/ReachRibbon';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { thalwegOf } from '@/shared/reaches/sectionGeometry';
import type { Section } from '@/shared/surveys/types';
import { formatWithUnit } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { nearestSection } from '../reach/nearestSection';

/** The sections of a survey drawn: along the river, and each across it. */
export function SectionsPreview({ sections }: { sections: readonly Section[] }) {
  const system = useUnitSystem();
  const [at, setAt] = useState(sections[0].chainage);
  const section = nearestSection(sections, at) ?? sections[0];
  const profile = useMemo(
    () => ({
      chainages: sections.map(({ chainage }) => chainage),
      bed: sections.map(thalwegOf),
    }),
    [sections],
  );
  return (
    <Card title="As it was read" aside={`${sections.length} sections`}>
      <ReachRibbon sections={sections} at={section.chainage} onChange={setAt} unitSystem={system} />
      <Card
        title={section.id}
        aside={`${formatWithUnit(section.chainage, 'chainage', system)} · ${section.points.length} points`}
      >
        <CrossSection label={`Section ${section.id}`} section={section} unitSystem={system} />
        <Txt variant="small" tone="soft">
          Elevation in {UNITS[system].elevation.symbol} above datum, offset in{' '}
          {UNITS[system].length.symbol}, looking downstream.
        </Txt>
      </Card>
      {sections.length > 1 ? (
        <LongSection
          profile={profile}
          sections={sections}
          at={section.chainage}
          onChange={setAt}
          unitSystem={system}
          height={220}
        />
      ) : null}
    </Card>
  );
}

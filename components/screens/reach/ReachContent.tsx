import { useMemo, useState } from 'react';
import { LongSection } from '@/components/charts/LongSection';
import { pictureOfReach } from '@/components/charts/picture/pictureSources';
import { ReachRibbon } from '@/components/charts/ReachRibbon';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useStations } from '@/components/queries/stations';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Reach, ReachRow } from '@/shared/reaches/types';
import { formatWithUnit } from '@/shared/units/format';
import { AdviceCard } from './AdviceCard';
import { GeometryChoice } from './GeometryChoice';
import { nearestSection } from './nearestSection';
import { PlanCard } from './PlanCard';
import { reachProfile } from './reachProfile';
import { SectionCard } from './SectionCard';
import type { SectionChoice } from './sectionChoice';
import { SectionsFormCard } from './SectionsFormCard';
import { SectionsTable } from './SectionsTable';

interface ReachContentProps {
  reach: Reach;
  reaches: readonly ReachRow[];
}

/** The reach drawn, tabled and advised upon; bank marks and roughness are set beside the drawing they change. */
export function ReachContent({ reach, reaches }: ReachContentProps) {
  const { study, may } = useCurrentStudy();
  const system = useUnitSystem();
  const { isWide } = useBreakpoint();
  const { at, setAt } = usePlaceAndTime();
  const stations = useStations(study.id).data;
  const [ticked, setTicked] = useState<SectionChoice>([]);
  const [editing, setEditing] = useState(false);
  const { sections } = reach;
  const section = nearestSection(sections, at ?? sections[0].chainage) ?? sections[0];
  const profile = useMemo(() => reachProfile(sections), [sections]);
  const place = at ?? section.chainage;

  const beside = (
    <>
      <SectionCard
        {...{ sections, section }}
        onChoose={setAt}
        onEdit={may('reach.change') && !editing ? () => setEditing(true) : undefined}
      />
      {editing ? (
        <SectionsFormCard {...{ reach, section, ticked }} onClose={() => setEditing(false)} />
      ) : null}
    </>
  );
  return (
    <Screen
      title="Reach"
      crumbs={[{ label: study.title, href: `/studies/${study.id}` }]}
      badge={<Badge label={reach.name} />}
      picture={pictureOfReach(study, reach)}
      lead={`${sections.length} sections over ${formatWithUnit(reach.lastChainage - reach.firstChainage, 'chainage', system)}`}
      actions={
        may('scenario.read') ? (
          <Button label="To the scenarios" href={`/studies/${study.id}/scenarios`} />
        ) : undefined
      }
      ribbon={
        <ReachRibbon
          sections={sections}
          stations={stations}
          advice={reach.advice}
          at={place}
          onChange={setAt}
          unitSystem={system}
        />
      }
      side={isWide ? beside : undefined}
    >
      <GeometryChoice {...{ reach, reaches }} />
      {isWide ? null : beside}
      <Card title="Long profile" aside="bed; left bank dashed, right bank dotted">
        <LongSection
          {...{ profile, sections, stations }}
          at={place}
          onChange={setAt}
          unitSystem={system}
        />
      </Card>
      <AdviceCard advice={reach.advice} onChoose={setAt} />
      <PlanCard {...{ reach, section }} onChoose={setAt} />
      <SectionsTable
        {...{ sections, section, ticked }}
        onChoose={setAt}
        onTick={may('reach.change') ? setTicked : undefined}
      />
    </Screen>
  );
}

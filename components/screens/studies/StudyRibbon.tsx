import { ReachRibbon } from '@/components/charts/ReachRibbon';
import { useStations } from '@/components/queries/stations';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { useNewestReach } from './useNewestReach';

interface StudyRibbonProps {
  studyId: number;
  /** Chosen place, m. */
  at: number | null;
  onChange: (chainage: number) => void;
}

/** The reach ribbon on the screens of a study that draw nothing else of the reach. */
export function StudyRibbon({ studyId, at, onChange }: StudyRibbonProps) {
  const reach = useNewestReach(studyId);
  const { data: stations } = useStations(studyId);
  const unitSystem = useUnitSystem();
  if (!reach) return null;
  return (
    <ReachRibbon
      sections={reach.sections}
      stations={stations}
      advice={reach.advice}
      at={at}
      onChange={onChange}
      unitSystem={unitSystem}
    />
  );
}

import { useMemo } from 'react';
import { LongSection } from '@/components/charts/LongSection';
import { reachProfile } from '@/components/screens/reach/reachProfile';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { structureMarks } from '@/shared/structures/structureMarks';
import { useEditing } from '../editorContext';

/** The reach from the side with what stands in it, as it is typed. */
export function StructuresAlong() {
  const { draft, reach } = useEditing();
  const unitSystem = useUnitSystem();
  const profile = useMemo(() => reach && reachProfile(reach.sections), [reach]);
  const marks = useMemo(() => structureMarks(draft.structures), [draft.structures]);
  if (!reach || !profile) return null;
  return (
    <LongSection
      profile={profile}
      sections={reach.sections}
      structures={marks}
      at={null}
      unitSystem={unitSystem}
      label={`With ${marks.map(({ id }) => id).join(', ')}`}
      height={240}
    />
  );
}

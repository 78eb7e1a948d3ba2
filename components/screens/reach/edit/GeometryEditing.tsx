import { useEffect, useMemo } from 'react';
import { ReachRibbon } from '@/components/charts/ReachRibbon';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useStations } from '@/components/queries/stations';
import { useSurveyRevision } from '@/components/queries/surveys';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import type { Reach } from '@/shared/reaches/types';
import { nearestSection } from '../nearestSection';
import { DetailsCard } from './DetailsCard';
import { EditBar } from './EditBar';
import { EditorProvider } from './editorContext';
import { GeometryCard } from './GeometryCard';
import { HistoryCard } from './HistoryCard';
import { PartsCard } from './PartsCard';
import { PointsCard } from './PointsCard';
import { StretchCard } from './StretchCard';
import { useGeometryEditor, type GeometryEditor } from './useGeometryEditor';

/** A working geometry open to be changed: the section at the place on the ribbon, and operations over stretches. */
export function GeometryEditing({ reach }: { reach: Reach }) {
  const { study } = useCurrentStudy();
  const system = useUnitSystem();
  const { isWide } = useBreakpoint();
  const { at, setAt } = usePlaceAndTime();
  const stations = useStations(study.id).data;
  const survey = useSurveyRevision(reach.surveyRevisionId).data;
  const editor = useGeometryEditor(reach);
  const { sections } = editor;
  const section = nearestSection(sections, at ?? sections[0].chainage) ?? sections[0];
  const surveyed = useMemo(
    () => survey?.sections.find(({ id }) => id === section.id),
    [survey, section.id],
  );
  useUndoKeys(editor);
  const reachHref = `/studies/${study.id}/reach?reach=${reach.id}` as const;
  return (
    <EditorProvider value={{ editor, reach, section, surveyed, goTo: setAt }}>
      <Screen
        title={reach.name}
        crumbs={[
          { label: study.title, href: `/studies/${study.id}` },
          { label: 'Reach', href: reachHref },
        ]}
        badge={
          editor.isDirty ? (
            <Badge label="Not saved" tone="ochre" />
          ) : (
            <Badge label={`Version ${reach.version}`} />
          )
        }
        lead={`Working geometry on survey revision ${reach.revision}; the survey itself stays as it was handed in.`}
        actions={
          <Button
            label="Compare with the survey"
            href={`/studies/${study.id}/survey/compare?from=survey-${reach.surveyRevisionId}&to=reach-${reach.id}`}
          />
        }
        footer={<EditBar />}
        ribbon={
          <ReachRibbon
            sections={sections}
            stations={stations}
            at={section.chainage}
            onChange={setAt}
            unitSystem={system}
          />
        }
        side={
          <>
            {isWide ? <DetailsCard /> : null}
            <StretchCard />
            <GeometryCard />
            <HistoryCard reachId={reach.id} />
          </>
        }
      >
        {editor.wasKept && editor.isDirty ? (
          <Notice tone="attention" title="What you had not saved is here again">
            <Txt>It stays in this browser tab until you save it or throw it away.</Txt>
            <Button label="Throw the changes away" kind="danger" onPress={editor.throwAway} />
          </Notice>
        ) : null}
        <PointsCard key={section.id} />
        {isWide ? null : <DetailsCard />}
        <PartsCard />
      </Screen>
    </EditorProvider>
  );
}

/** Ctrl or Cmd with Z and Y, as everywhere; within a field they belong to what is typed. */
function useUndoKeys({ undo, redo }: GeometryEditor): void {
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      const target = event.target as HTMLElement;
      if (!(event.ctrlKey || event.metaKey) || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName))
        return;
      const key = event.key.toLowerCase();
      const isRedo = key === 'y' || (key === 'z' && event.shiftKey);
      if (!isRedo && key !== 'z') return;
      event.preventDefault();
      if (isRedo) redo();
      else undo();
    };
    window.addEventListener('keydown', press);
    return () => window.removeEventListener('keydown', press);
  }, [undo, redo]);
}

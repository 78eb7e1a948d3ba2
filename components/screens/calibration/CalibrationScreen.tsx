import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useObservations } from '@/components/queries/observations';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { StudyRibbon } from '../studies/StudyRibbon';
import { AddObservations } from './AddObservations';
import { GaugesCard } from './GaugesCard';
import { MarksCard } from './MarksCard';
import { RunsAgainstCard } from './RunsAgainstCard';
import { SearchesCard } from './SearchesCard';

/** What was observed of real floods, and how the runs stand against it. */
export function CalibrationScreen() {
  const { study, may } = useCurrentStudy();
  const { at, setAt } = usePlaceAndTime();
  const { data, error, refetch } = useObservations(study.id);
  const isEmpty = data && data.marks.length === 0 && data.gauges.length === 0;
  return (
    <Screen
      title="Calibration"
      crumbs={[{ label: study.title, href: `/studies/${study.id}` }]}
      lead="Marks and gauge records of floods that happened. They stay with the study and stand beside every run."
      ribbon={<StudyRibbon studyId={study.id} at={at} onChange={setAt} />}
      actions={
        may('scenario.change') ? <AddObservations floods={data?.floods ?? []} at={at} /> : undefined
      }
      side={
        data && !isEmpty ? (
          <>
            <RunsAgainstCard />
            <SearchesCard />
          </>
        ) : undefined
      }
    >
      {error && !data ? (
        <ErrorState
          error={error}
          title="The observations could not be read"
          retry={() => void refetch()}
        />
      ) : null}
      {!data && !error ? <Loading what="Reading the observations…" /> : null}
      {isEmpty ? (
        <Empty title="Nothing observed yet">
          Paste the levels of debris lines and stains with their chainages, or the record of a
          gauge. A run of the same flood then shows how far off it is, and a search can propose the
          roughness that fits best.
        </Empty>
      ) : null}
      {data && data.marks.length > 0 ? (
        <MarksCard marks={data.marks} at={at} onChoose={setAt} />
      ) : null}
      {data && data.gauges.length > 0 ? <GaugesCard gauges={data.gauges} /> : null}
    </Screen>
  );
}

import { router, useLocalSearchParams } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { pictureOfGeometries } from '@/components/charts/picture/pictureSources';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useReaches } from '@/components/queries/reaches';
import { useSurveys } from '@/components/queries/surveys';
import { space } from '@/components/theme/tokens';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { SelectField } from '@/components/ui/SelectField';
import { ComparedSections } from './ComparedSections';
import { geometryOptions, parseKey } from './geometryChoice';
import { useGeometry } from './useGeometry';

/** Two survey revisions or geometries of the study, section by section; both stand in the address. */
export function CompareScreen() {
  const { study, may } = useCurrentStudy();
  const params = useLocalSearchParams<{ from?: string; to?: string }>();
  const surveys = useSurveys(study.id);
  const reaches = useReaches(study.id, may('reach.read'));
  const options = geometryOptions(surveys.data?.revisions ?? [], reaches.data ?? []);
  const known = (text: string | undefined) => options.some(({ value }) => value === text);
  const surveyKeys = options.filter(({ value }) => value.startsWith('survey'));
  // Without a choice: the newest survey against the one before, or against what was made of it.
  const newest = surveyKeys[surveyKeys.length - 1]?.value;
  const before = surveyKeys[surveyKeys.length - 2]?.value;
  const from = known(params.from) ? params.from : (before ?? newest);
  const to = known(params.to) ? params.to : before ? newest : options[options.length - 1]?.value;
  const earlier = useGeometry(parseKey(from));
  const later = useGeometry(parseKey(to));
  const failed = [surveys, earlier, later].find(({ error }) => error);
  const isKnown = surveys.data !== undefined && !reaches.isLoading;
  const choose = (change: { from?: string; to?: string }) =>
    router.setParams({ from, to, ...change });
  const labelOf = (key: string | undefined) =>
    options.find(({ value }) => value === key)?.label ?? '';
  return (
    <Screen
      title="What changed"
      crumbs={[
        { label: study.title, href: `/studies/${study.id}` },
        { label: 'Survey', href: `/studies/${study.id}/survey` },
      ]}
      picture={pictureOfGeometries(study, [labelOf(from), labelOf(to)])}
      lead="Two surveys or geometries of this study, section by section. Sections pair by name, and by place where a name is gone."
    >
      {failed ? (
        <ErrorState
          title="They could not be read"
          error={failed.error}
          retry={() => void failed.refetch()}
        />
      ) : !isKnown ? (
        <Loading what="Reading the surveys…" />
      ) : options.length < 2 ? (
        <Empty title="Nothing to compare yet">
          There is one survey and nothing made of it. A second revision or a working geometry can be
          compared with it.
        </Empty>
      ) : (
        <>
          <View style={styles.pair}>
            <View style={styles.half}>
              <SelectField
                label="Earlier"
                value={from ?? null}
                options={options}
                onChange={(value) => choose({ from: value })}
              />
            </View>
            <View style={styles.half}>
              <SelectField
                label="Later"
                value={to ?? null}
                options={options}
                onChange={(value) => choose({ to: value })}
              />
            </View>
          </View>
          {earlier.sections && later.sections ? (
            <ComparedSections
              key={`${from} ${to}`}
              before={earlier.sections}
              after={later.sections}
              names={[labelOf(from), labelOf(to)]}
            />
          ) : (
            <Loading what="Reading the sections…" />
          )}
        </>
      )}
    </Screen>
  );
}

const styles = StyleSheet.create({
  pair: { flexDirection: 'row', flexWrap: 'wrap', gap: space.two },
  half: { flexGrow: 1, flexBasis: 220, maxWidth: 420, minWidth: 0 },
});

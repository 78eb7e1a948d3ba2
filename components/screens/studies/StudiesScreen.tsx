import { Redirect } from 'expo-router';
import { hasStudies } from '@/components/layout/places';
import { Screen } from '@/components/layout/Screen';
import { useMe } from '@/components/queries/SessionProvider';
import { useStudies } from '@/components/queries/studies';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { List } from '@/components/ui/List';
import { Loading } from '@/components/ui/Loading';
import { StudiesEmpty } from './StudiesEmpty';
import { StudyLine } from './StudyLine';
import { studiesWords } from './studiesWords';

/** First page: the studies that the person may see, newest work first. */
export function StudiesScreen() {
  const me = useMe();
  const { data: studies, error, refetch } = useStudies();
  if (!hasStudies(me)) return <Redirect href="/people" />;

  const words = studiesWords(me.roles);
  const mayCreate = words.mayCreate;
  return (
    <Screen
      title={words.title}
      crumbs={[{ label: me.firm.name }]}
      lead={studies?.length ? words.lead : undefined}
      actions={
        mayCreate && studies?.length ? (
          <Button kind="solid" label="New study" href="/studies/new" />
        ) : undefined
      }
    >
      {error && !studies ? (
        <ErrorState
          error={error}
          title="The studies could not be read"
          retry={() => void refetch()}
        />
      ) : null}
      {!studies && !error ? <Loading what="Reading the studies…" /> : null}
      {studies?.length === 0 ? <StudiesEmpty roles={me.roles} /> : null}
      {studies?.length ? (
        <Card>
          <List label={words.title}>
            {studies.map((study) => (
              <StudyLine key={study.id} study={study} />
            ))}
          </List>
        </Card>
      ) : null}
    </Screen>
  );
}

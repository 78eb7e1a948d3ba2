import { pictureOfSet } from '@/components/charts/picture/pictureSources';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { CONFIDENCE_FILES, useConfidenceDownload } from '@/components/queries/confidence';
import { useTaskSetResult } from '@/components/queries/tasks';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import type { ConfidenceKind } from '@/shared/confidence/schemas';
import type { ConfidenceResult } from '@/shared/confidence/types';
import type { TaskSet } from '@/shared/tasks/types';
import { Cautions } from '../../runs/Cautions';
import { confidenceCrumbs, KIND_TITLES, setBadge } from '../confidenceWords';
import { MembersCard } from '../MembersCard';
import { SetFacts } from '../SetFacts';
import { ConvergenceResults } from './ConvergenceResults';
import { EnsembleResults } from './EnsembleResults';
import { SensitivityResults } from './SensitivityResults';

/** What a finished set found. */
export function SetResults({ set }: { set: TaskSet }) {
  const { study } = useCurrentStudy();
  const result = useTaskSetResult<ConfidenceResult>(set);
  const download = useConfidenceDownload(set.id);
  const files = set.kind === 'ensemble' ? (['members', 'result'] as const) : (['result'] as const);
  return (
    <Screen
      title={set.name}
      crumbs={confidenceCrumbs(study, KIND_TITLES[set.kind as ConfidenceKind])}
      badge={<Badge {...setBadge(set)} />}
      picture={pictureOfSet(study, set)}
      actions={files.map((file) => (
        <Button
          key={file}
          label={CONFIDENCE_FILES[file].label}
          busy={download.isPending && download.variables === file}
          onPress={() => download.mutate(file)}
        />
      ))}
    >
      {download.error ? (
        <ErrorState error={download.error} title="The file could not be saved" />
      ) : null}
      {result.error ? (
        <ErrorState
          error={result.error}
          title="The result could not be read"
          retry={() => void result.refetch()}
        />
      ) : null}
      {result.isPending ? <Loading what="Reading the result…" /> : null}
      {result.data ? <Result result={result.data} /> : null}
      <SetFacts set={set} />
      <MembersCard set={set} />
      <Cautions />
    </Screen>
  );
}

function Result({ result }: { result: ConfidenceResult }) {
  switch (result.kind) {
    case 'convergence':
      return <ConvergenceResults result={result} />;
    case 'sensitivity':
      return <SensitivityResults result={result} />;
    case 'ensemble':
      return <EnsembleResults result={result} />;
  }
}

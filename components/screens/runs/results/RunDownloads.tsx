import { RUN_FILES, type RunFile, type useRunDownload } from '@/components/queries/runs';
import { Button } from '@/components/ui/Button';
import type { RunSummary } from '@/shared/runs/types';

interface Props {
  download: ReturnType<typeof useRunDownload>;
  summary: Pick<RunSummary, 'levels' | 'structures'>;
}

/** The run as files. */
export function RunDownloads({ download, summary }: Props) {
  const files: RunFile[] = [
    'case',
    'csv',
    ...(summary.levels.length > 0 ? (['levels'] as const) : []),
    ...(summary.structures.length > 0 ? (['structures'] as const) : []),
    'xlsx',
  ];
  return files.map((file) => (
    <Button
      key={file}
      label={RUN_FILES[file].label}
      busy={download.isPending && download.variables === file}
      onPress={() => download.mutate(file)}
    />
  ));
}

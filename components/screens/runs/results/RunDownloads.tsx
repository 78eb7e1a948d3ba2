import { RUN_FILES, type RunFile, type useRunDownload } from '@/components/queries/runs';
import { Button } from '@/components/ui/Button';

const FILES: RunFile[] = ['case', 'csv', 'xlsx'];
const WITH_STRUCTURES: RunFile[] = ['case', 'csv', 'structures', 'xlsx'];

interface Props {
  download: ReturnType<typeof useRunDownload>;
  /** Something stands in the river. */
  hasStructures: boolean;
}

/** The run as files. */
export function RunDownloads({ download, hasStructures }: Props) {
  return (hasStructures ? WITH_STRUCTURES : FILES).map((file) => (
    <Button
      key={file}
      label={RUN_FILES[file].label}
      busy={download.isPending && download.variables === file}
      onPress={() => download.mutate(file)}
    />
  ));
}

import { RUN_FILES, type RunFile, type useRunDownload } from '@/components/queries/runs';
import { Button } from '@/components/ui/Button';

const FILES: RunFile[] = ['case', 'csv', 'xlsx'];

/** The run as files. */
export function RunDownloads({ download }: { download: ReturnType<typeof useRunDownload> }) {
  return FILES.map((file) => (
    <Button
      key={file}
      label={RUN_FILES[file].label}
      busy={download.isPending && download.variables === file}
      onPress={() => download.mutate(file)}
    />
  ));
}

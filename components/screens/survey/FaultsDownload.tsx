import { useMutation } from '@tanstack/react-query';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { downloadFaults, useKeepRefusal } from '@/components/queries/surveys';
import { errorWords } from '@/components/ui/errorWords';
import { Button } from '@/components/ui/Button';
import type { MatchChoice } from '@/shared/surveys/types';

interface FaultsDownloadProps {
  file: File;
  match: MatchChoice | null;
}

/** The faults as a spreadsheet. The list of them is kept with the study from then on; the file is not. */
export function FaultsDownload({ file, match }: FaultsDownloadProps) {
  const { study } = useCurrentStudy();
  const refusal = useKeepRefusal(study.id);
  const download = useMutation({
    mutationFn: async () => {
      const id = refusal.data ?? (await refusal.mutateAsync({ file, match }));
      if (id !== null) await downloadFaults(id);
    },
  });
  return (
    <Button
      label="Faults as a spreadsheet"
      wide
      busy={download.isPending}
      hint={download.isError ? errorWords(download.error).message : undefined}
      onPress={() => download.mutate()}
    />
  );
}

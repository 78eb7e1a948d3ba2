import { useState } from 'react';
import type { Station } from '@/shared/studies/types';
import { useRemoveStation } from '@/components/queries/stations';
import { Button } from '@/components/ui/Button';
import { ConfirmDialog } from '@/components/ui/ConfirmDialog';
import { Dialog } from '@/components/ui/Dialog';
import { StationForm } from './StationForm';

interface StationDialogProps {
  studyId: number;
  station: Station;
  onClose: () => void;
}

/** Renames, moves or removes one station. */
export function StationDialog({ studyId, station, onClose }: StationDialogProps) {
  const remove = useRemoveStation(studyId);
  const [isLeaving, setIsLeaving] = useState(false);
  if (isLeaving) {
    return (
      <ConfirmDialog
        title={`Remove ${station.name}?`}
        confirm="Remove"
        onClose={() => setIsLeaving(false)}
        onConfirm={() => remove.mutateAsync(station.id).then(onClose)}
      >
        Tables of runs no longer show it. The results themselves stay: they are kept for every place
        along the reach.
      </ConfirmDialog>
    );
  }
  return (
    <Dialog title={station.name} open onClose={onClose}>
      <StationForm studyId={studyId} station={station} onDone={onClose} />
      <Button kind="danger" label="Remove" onPress={() => setIsLeaving(true)} />
    </Dialog>
  );
}

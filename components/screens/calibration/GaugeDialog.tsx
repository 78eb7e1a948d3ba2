import { useState } from 'react';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useGauge, useRemoveGauge } from '@/components/queries/observations';
import { Button } from '@/components/ui/Button';
import { ConfirmDialog } from '@/components/ui/ConfirmDialog';
import { Dialog } from '@/components/ui/Dialog';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import type { GaugeRow } from '@/shared/calibration/types';
import { GaugeForm } from './GaugeForm';

interface Props {
  /** null: a new one. */
  gauge: GaugeRow | null;
  floods: readonly string[];
  /** Chosen place, m. */
  at: number | null;
  onClose: () => void;
}

/** Adds, changes or removes the record of a gauge. */
export function GaugeDialog({ gauge, floods, at, onClose }: Props) {
  const { study } = useCurrentStudy();
  const read = useGauge(gauge?.id ?? null);
  const remove = useRemoveGauge();
  const [isLeaving, setIsLeaving] = useState(false);
  if (gauge && isLeaving)
    return (
      <ConfirmDialog
        title={`Remove the record of ${gauge.name}?`}
        confirm="Remove"
        onClose={() => setIsLeaving(false)}
        onConfirm={() => remove.mutateAsync(gauge.id).then(onClose)}
      >
        Runs are no longer compared with it. What was signed keeps what it said.
      </ConfirmDialog>
    );
  return (
    <Dialog title={gauge ? gauge.name : 'Add a gauge record'} open onClose={onClose}>
      {gauge && read.error ? (
        <ErrorState
          error={read.error}
          title="The record could not be read"
          retry={() => void read.refetch()}
        />
      ) : gauge && !read.data ? (
        <Loading what="Reading the record…" />
      ) : (
        <GaugeForm
          studyId={study.id}
          gauge={read.data ?? null}
          floods={floods}
          at={at}
          onDone={onClose}
        />
      )}
      {gauge ? (
        <Button kind="danger" label="Remove" wide onPress={() => setIsLeaving(true)} />
      ) : null}
    </Dialog>
  );
}

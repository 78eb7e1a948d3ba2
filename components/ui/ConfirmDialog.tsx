import { useState, type ReactNode } from 'react';
import { Button } from './Button';
import { Dialog } from './Dialog';
import { ErrorState } from './ErrorState';
import { Txt } from './Txt';

interface ConfirmDialogProps {
  title: string;
  /** What it means. */
  children: ReactNode;
  /** The verb on the button. */
  confirm: string;
  onConfirm: () => Promise<unknown>;
  onClose: () => void;
}

/** Asks before something that cannot be taken back; stays open and says so when it fails. */
export function ConfirmDialog({
  title,
  children,
  confirm,
  onConfirm,
  onClose,
}: ConfirmDialogProps) {
  const [isBusy, setIsBusy] = useState(false);
  const [failure, setFailure] = useState<unknown>(null);
  const go = async () => {
    setIsBusy(true);
    setFailure(null);
    try {
      await onConfirm();
      onClose();
    } catch (error) {
      setFailure(error);
      setIsBusy(false);
    }
  };
  return (
    <Dialog
      title={title}
      open
      onClose={onClose}
      actions={
        <>
          <Button kind="danger" label={confirm} busy={isBusy} onPress={() => void go()} />
          <Button label="Keep" onPress={onClose} disabled={isBusy} />
        </>
      }
    >
      {typeof children === 'string' ? <Txt>{children}</Txt> : children}
      {failure ? <ErrorState error={failure} /> : null}
    </Dialog>
  );
}

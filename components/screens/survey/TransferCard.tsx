import type { Transfer } from '@/components/queries/uploads';
import { Card } from '@/components/ui/Card';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { Notice } from '@/components/ui/Notice';
import { ProgressBar } from '@/components/ui/ProgressBar';
import { megabytes } from './megabytes';

/** A file on its way to the server. */
export function TransferCard({ fileName, transfer }: { fileName: string; transfer: Transfer }) {
  const { arrived, size, waiting } = transfer;
  const share = size > 0 ? arrived / size : 0;
  const words = `${megabytes(arrived)} of ${megabytes(size)} MB have arrived`;
  return (
    <Card title={`Sending ${fileName}`}>
      <FigureWithUnit
        value={String(Math.floor(100 * share))}
        unit="%"
        label={words}
        size="display"
      />
      <ProgressBar label="Sent" share={share} words={words} />
      {waiting ? (
        <Notice tone="attention" title="No connection">
          What has arrived is kept. It goes on by itself as soon as there is a connection; leave
          this page open. After closing it choose the same file again, and it goes on from there.
        </Notice>
      ) : null}
    </Card>
  );
}

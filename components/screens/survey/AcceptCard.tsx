import { useCurrentStudy } from '@/components/layout/studyContext';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';

interface AcceptCardProps {
  note: string;
  busy: boolean;
  sending: boolean;
  error: Error | null;
  onNote: (note: string) => void;
  onAccept: () => void;
}

/** Takes in what was read, with a note for whoever works with it. */
export function AcceptCard({ note, busy, sending, error, onNote, onAccept }: AcceptCardProps) {
  const { may } = useCurrentStudy();
  const accepts = may('survey.decide');
  return (
    <Card title={accepts ? 'Take it in' : 'Hand it in'}>
      <Txt tone="soft">
        {accepts
          ? 'It becomes a numbered revision that never changes again, and a reach of its own to set bank marks and roughness on.'
          : 'It becomes a numbered revision that never changes again. An engineer looks at it, and accepts it or returns it to you with remarks.'}
      </Txt>
      <TextField
        label="Note"
        optional
        lines={3}
        maxLength={LIMITS.textLong}
        hint="What changed since the last one, what was hard to measure."
        value={note}
        onChange={onNote}
        disabled={sending}
      />
      <Button
        label={accepts ? 'Take in this survey' : 'Hand in this survey'}
        kind="solid"
        wide
        busy={sending}
        disabled={busy}
        hint={busy ? 'It is being read again.' : undefined}
        onPress={onAccept}
      />
      {error ? <ErrorState title="It was not taken in" error={error} /> : null}
    </Card>
  );
}

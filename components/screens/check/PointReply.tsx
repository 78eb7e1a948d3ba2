import { useState } from 'react';
import { View } from 'react-native';
import { usePointStep, type PointStep } from '@/components/queries/reviews';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { ErrorState } from '@/components/ui/ErrorState';
import { TextField } from '@/components/ui/TextField';
import { LIMITS } from '@/shared/limits';
import type { ReviewPoint } from '@/shared/review/types';

interface Props {
  runId: number;
  point: ReviewPoint;
  step: PointStep;
  onDone: () => void;
}

const WORDS: Record<PointStep, { field: string; button: string; needsText: boolean }> = {
  answer: { field: 'Your answer', button: 'Send the answer', needsText: true },
  close: { field: 'Why it is settled', button: 'Close the point', needsText: false },
  reopen: { field: 'What is still open', button: 'Open the point again', needsText: true },
};

/** Words with which a point is answered, closed or opened again. */
export function PointReply({ runId, point, step, onDone }: Props) {
  const { mutate, error, isPending } = usePointStep(runId, point.id);
  const [text, setText] = useState('');
  const [isShort, setIsShort] = useState(false);
  const { field, button, needsText } = WORDS[step];
  const send = () => {
    const isMissing = needsText && text.trim() === '';
    setIsShort(isMissing);
    if (!isMissing) mutate({ step, text: text.trim() }, { onSuccess: onDone });
  };
  return (
    <View style={{ gap: space.one }}>
      <TextField
        label={field}
        value={text}
        onChange={setText}
        optional={!needsText}
        error={isShort && !text.trim() ? 'Write a sentence.' : undefined}
        lines={3}
        maxLength={LIMITS.textLong}
        disabled={isPending}
        autoFocus
      />
      {error ? <ErrorState error={error} title="Not sent" /> : null}
      <ButtonRow>
        <Button label={button} busy={isPending} onPress={send} />
        <Button kind="quiet" label="Leave" onPress={onDone} disabled={isPending} />
      </ButtonRow>
    </View>
  );
}

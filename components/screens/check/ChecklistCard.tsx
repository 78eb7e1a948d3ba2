import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { useAnswerItems } from '@/components/queries/reviews';
import { space } from '@/components/theme/tokens';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { List } from '@/components/ui/List';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import type { ChecklistItem, Review } from '@/shared/review/types';
import type { Run } from '@/shared/runs/types';
import { OutletProbe } from './OutletProbe';
import { outcomeBadge, unanswered } from './reviewWords';

/** What the machine found by itself, and what it asks of the modeller. */
export function ChecklistCard({ run, review }: { run: Run; review: Review }) {
  const { checklist } = review;
  const mayAnswer = review.may.includes('review.answer');
  const waiting = unanswered(checklist).length;
  return (
    <Card
      title="Checklist"
      aside={waiting ? `${waiting} of ${checklist.length} wait for words` : 'computed from the run'}
    >
      <List label="Checklist">
        {checklist.map((item) => (
          <Item key={item.id} runId={run.id} item={item} mayAnswer={mayAnswer}>
            {item.id === OUTLET ? (
              <OutletProbe runId={run.id} review={review} isOpen={item.outcome === 'asked'} />
            ) : null}
          </Item>
        ))}
      </List>
    </Card>
  );
}

/** The item that a second run with a changed outlet settles. */
const OUTLET = 'outletInfluence';

interface ItemProps {
  runId: number;
  item: ChecklistItem;
  mayAnswer: boolean;
  children: ReactNode;
}

function Item({ runId, item, mayAnswer, children }: ItemProps) {
  const [isWriting, setIsWriting] = useState(false);
  const isWaiting = unanswered([item]).length > 0;
  const label = item.answer ? 'Change the words' : isWaiting ? 'Answer' : 'Add words';
  return (
    <View style={styles.item}>
      <View style={styles.head}>
        <Txt strong heading={3}>
          {item.title}
        </Txt>
        <Badge {...outcomeBadge(item)} />
      </View>
      <Txt>{item.finding}</Txt>
      <Txt variant="small" tone="soft">
        {item.rule}
      </Txt>
      {children}
      {item.answer && !isWriting ? (
        <View style={styles.answer}>
          <Txt variant="small" tone="soft">
            The modeller says
          </Txt>
          <Txt>{item.answer}</Txt>
        </View>
      ) : null}
      {isWriting ? (
        <Answer runId={runId} item={item} onDone={() => setIsWriting(false)} />
      ) : mayAnswer && (item.outcome !== 'good' || item.answer) ? (
        <Button
          kind={isWaiting ? 'outline' : 'quiet'}
          label={label}
          name={`${label}: ${item.title}`}
          onPress={() => setIsWriting(true)}
        />
      ) : null}
    </View>
  );
}

function Answer({
  runId,
  item,
  onDone,
}: Omit<ItemProps, 'mayAnswer' | 'children'> & { onDone: () => void }) {
  const save = useAnswerItems(runId);
  const [text, setText] = useState(item.answer ?? '');
  const keep = () =>
    save.mutate({ answers: [{ id: item.id, answer: text.trim() }] }, { onSuccess: onDone });
  return (
    <View style={styles.writing}>
      <TextField
        label={`Your words on ${item.title}`}
        value={text}
        onChange={setText}
        lines={3}
        maxLength={LIMITS.textLong}
        disabled={save.isPending}
        autoFocus
      />
      {save.error ? <ErrorState error={save.error} title="Not saved" /> : null}
      <ButtonRow>
        <Button label="Save the words" busy={save.isPending} onPress={keep} />
        <Button kind="quiet" label="Leave" onPress={onDone} disabled={save.isPending} />
      </ButtonRow>
    </View>
  );
}

const styles = StyleSheet.create({
  item: { gap: space.half },
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: space.one,
    alignItems: 'center',
    justifyContent: 'space-between',
  },
  answer: { paddingTop: space.half },
  writing: { gap: space.one },
});

import { View } from 'react-native';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import type { Review } from '@/shared/review/types';

/** The modeller's note of method, assumptions and limits; all three stand in the report. */
export function NoteCard({ review }: { review: Review }) {
  const parts = [
    ['Method', review.method],
    ['Assumptions', review.assumptions],
    ['Limits', review.limits],
  ] as const;
  return (
    <Card title="The modeller's note" aside={review.requestedBy ?? undefined}>
      {parts.map(([title, text]) => (
        <View key={title}>
          <Txt variant="small" tone="soft" heading={3}>
            {title}
          </Txt>
          <Txt>{text}</Txt>
        </View>
      ))}
    </Card>
  );
}

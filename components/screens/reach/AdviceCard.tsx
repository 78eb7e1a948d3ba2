import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Advice } from '@/shared/reaches/types';
import { formatWithUnit } from '@/shared/units/format';
import { ADVICE_NAMES, groupAdvice, type AdviceGroup } from './groupAdvice';
import { sayIn } from '@/shared/units/message';

interface AdviceCardProps {
  advice: readonly Advice[];
  onChoose: (chainage: number) => void;
}

/** What a careful modeller would look at, kind by kind, with the reason and its source. */
export function AdviceCard({ advice, onChoose }: AdviceCardProps) {
  const groups = groupAdvice(advice);
  return (
    <Card title="Advice" aside={advice.length > 0 ? `${advice.length} to look at` : undefined}>
      {groups.length === 0 ? (
        <Txt tone="soft">
          Nothing stands out: spacing, bed slope, conveyance, bank marks and roughness are within
          the usual bounds.
        </Txt>
      ) : (
        groups.map((group) => <Group key={group.code} group={group} onChoose={onChoose} />)
      )}
    </Card>
  );
}

const FEW = 3;

function Group({ group, onChoose }: { group: AdviceGroup; onChoose: (at: number) => void }) {
  const { code, items } = group;
  const { colours } = useTheme();
  const system = useUnitSystem();
  const [open, setOpen] = useState(false);
  const shown = open ? items : items.slice(0, FEW);
  const sources = [...new Set(items.map(({ source }) => source))];
  return (
    <View style={[styles.group, { borderTopColor: colours.line }]}>
      <Txt strong tone="ochre" heading={3}>
        {ADVICE_NAMES[code]}
        {items.length > 1 ? ` · ${items.length} places` : ''}
      </Txt>
      <View role="list" aria-label={ADVICE_NAMES[code]}>
        {shown.map((advice) => {
          const { chainage, sectionIds, reason, reasonParts } = advice;
          const place = formatWithUnit(chainage, 'chainage', system);
          return (
            <View key={`${chainage}${sectionIds.join()}`} role="listitem" style={styles.item}>
              <Button
                kind="quiet"
                label={place}
                name={`Go to ${place}, ${sectionIds.join(' to ')}`}
                onPress={() => onChoose(chainage)}
              />
              <View style={styles.words}>
                <Txt>{sayIn(system, advice)}</Txt>
                <Txt variant="small" tone="soft">
                  {sayIn(system, { message: reason, parts: reasonParts })}
                </Txt>
              </View>
            </View>
          );
        })}
      </View>
      <Txt variant="small" tone="soft">
        Source: {sources.join('; ')}
      </Txt>
      {items.length > FEW ? (
        <Button
          kind="quiet"
          label={open ? 'Show fewer' : `Show all ${items.length}`}
          onPress={() => setOpen(!open)}
        />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  group: { gap: space.half, paddingTop: space.one * 1.5, borderTopWidth: hairline },
  item: { flexDirection: 'row', alignItems: 'flex-start', columnGap: space.two },
  words: { flex: 1, minWidth: 0, paddingVertical: space.one * 1.25 },
});

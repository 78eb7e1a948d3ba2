import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { NumberField } from '@/components/ui/NumberField';
import { Txt } from '@/components/ui/Txt';
import type { Embankment, StoragePart } from '@/shared/case/caseFile';
import { groundAt } from '@/shared/reaches/sectionGeometry';
import { useEditing } from './editorContext';

/** Stretches of the section that hold water without carrying it, and embankments that keep water out until it is over them. */
export function PartsCard() {
  const { section } = useEditing();
  const count = section.storage?.length ?? 0;
  return (
    <Card title="Storage and embankments" aside={count > 0 ? `${count} storing` : undefined}>
      <Storage />
      <EmbankmentFields side="left" />
      <EmbankmentFields side="right" />
    </Card>
  );
}

function Storage() {
  const { section, put, faultAt } = useEditing();
  const parts = section.storage ?? [];
  const { points, banks } = section;
  const [first, last] = [points[0][0], points[points.length - 1][0]];
  const store = (next: StoragePart[], words: string, gesture?: string) =>
    put({ ...section, storage: [...next].sort((a, b) => a.from - b.from) }, words, gesture);
  const change = (index: number, values: Partial<StoragePart>) =>
    put(
      {
        ...section,
        storage: parts.map((part, i) => (i === index ? { ...part, ...values } : part)),
      },
      `storage part ${index + 1} set`,
      `storage ${section.id} ${index}`,
    );
  /** Where there is room: left of the channel, else right of it, else the middle third. */
  const add = () => {
    const end = parts[parts.length - 1]?.to;
    const room: [number, number][] = [
      ...(banks && end === undefined ? [[first, banks[0]] as [number, number]] : []),
      ...(banks ? [[Math.max(banks[1], end ?? banks[1]), last] as [number, number]] : []),
      [first + (last - first) / 3, first + (2 * (last - first)) / 3],
    ];
    const [from, to] = (room.find(([a, b]) => b > a) ?? room[0]).map(toCentimetre);
    store([...parts, { from, to }], 'storage part added');
  };
  return (
    <>
      <Txt variant="small" tone="soft">
        A storage part fills and empties with the river but carries no flow along it: ponds, bays,
        ground behind obstacles.
      </Txt>
      {parts.map((part, i) => (
        <View key={i} role="group" aria-label={`Storage part ${i + 1}`} style={styles.part}>
          <View style={styles.row}>
            <Half>
              <NumberField
                label="From offset"
                quantity="length"
                value={part.from}
                onChange={(from) => from !== null && change(i, { from })}
                error={faultAt(`storage[${i}].from`)}
              />
            </Half>
            <Half>
              <NumberField
                label="To offset"
                quantity="length"
                value={part.to}
                onChange={(to) => to !== null && change(i, { to })}
                error={faultAt(`storage[${i}].to`)}
              />
            </Half>
          </View>
          <NumberField
            label="Flows above"
            quantity="elevation"
            optional
            hint="Left empty: it never carries flow."
            value={part.flowsAbove ?? null}
            onChange={(flowsAbove) => change(i, { flowsAbove: flowsAbove ?? undefined })}
            error={faultAt(`storage[${i}].flowsAbove`)}
          />
          <View>
            <Button
              kind="quiet"
              label="Take it away"
              name={`Take it away, storage part ${i + 1}`}
              onPress={() =>
                store(
                  parts.filter((_, at) => at !== i),
                  `storage part ${i + 1} taken away`,
                )
              }
            />
          </View>
        </View>
      ))}
      <View>
        <Button label="Add a storage part" onPress={add} />
      </View>
    </>
  );
}

/** A proposal carries no tail of digits, m. */
const toCentimetre = (metres: number) => Math.round(100 * metres) / 100;

const TITLES = { left: 'Left embankment', right: 'Right embankment' } as const;

function EmbankmentFields({ side }: { side: 'left' | 'right' }) {
  const { section, put, faultAt } = useEditing();
  const embankment = section.embankments?.[side];
  const title = TITLES[side];
  const set = (value: Embankment | undefined, words: string) => {
    const { [side]: _, ...others } = section.embankments ?? {};
    const next = value ? { ...others, [side]: value } : others;
    put({ ...section, embankments: next }, words, value && `embankment ${section.id} ${side}`);
  };
  if (!embankment)
    return (
      <View>
        <Button
          label={`Add a ${side} embankment`}
          onPress={() => {
            const { points, banks } = section;
            const end = points[side === 'left' ? 0 : points.length - 1][0];
            const bank =
              banks?.[side === 'left' ? 0 : 1] ?? (points[0][0] + points[points.length - 1][0]) / 2;
            const offset = toCentimetre((end + bank) / 2);
            set(
              { offset, crest: toCentimetre(groundAt(section, offset) + 1) },
              `${side} embankment added`,
            );
          }}
        />
      </View>
    );
  return (
    <View role="group" aria-label={title} style={styles.part}>
      <Txt strong>{title}</Txt>
      <Txt variant="small" tone="soft">
        Ground {side} of it stays dry until the stage is over its crest.
      </Txt>
      <View style={styles.row}>
        <Half>
          <NumberField
            label="Offset"
            quantity="length"
            value={embankment.offset}
            onChange={(offset) =>
              offset !== null && set({ ...embankment, offset }, `${side} embankment set`)
            }
            error={faultAt(`embankments.${side}.offset`)}
          />
        </Half>
        <Half>
          <NumberField
            label="Crest"
            quantity="elevation"
            value={embankment.crest}
            onChange={(crest) =>
              crest !== null && set({ ...embankment, crest }, `${side} embankment set`)
            }
            error={faultAt(`embankments.${side}.crest`)}
          />
        </Half>
      </View>
      <View>
        <Button
          kind="quiet"
          label="Take it away"
          name={`Take it away, ${side} embankment`}
          onPress={() => set(undefined, `${side} embankment taken away`)}
        />
      </View>
    </View>
  );
}

const Half = ({ children }: { children: React.ReactNode }) => (
  <View style={styles.half}>{children}</View>
);

const styles = StyleSheet.create({
  part: { gap: space.one },
  row: { flexDirection: 'row', gap: space.two, alignItems: 'flex-start' },
  half: { flex: 1, minWidth: 0 },
});

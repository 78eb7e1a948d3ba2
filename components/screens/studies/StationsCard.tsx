import { Pressable, StyleSheet } from 'react-native';
import { formatWithUnit } from '@/shared/units/format';
import { useStations } from '@/components/queries/stations';
import { space } from '@/components/theme/tokens';
import { aria } from '@/components/ui/aria';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';

interface StationsCardProps {
  studyId: number;
  /** Chosen place, m. */
  at: number | null;
  onChoose: (chainage: number) => void;
}

/** The named places, in short; choosing one moves the ribbon, and with it every screen of the study. */
export function StationsCard({ studyId, at, onChoose }: StationsCardProps) {
  const { data: stations } = useStations(studyId);
  const system = useUnitSystem();
  return (
    <Card title="Stations">
      {stations?.length === 0 ? (
        <Txt tone="soft">No places named yet. Results are told first where people care.</Txt>
      ) : null}
      {stations?.length ? (
        <List label="Stations">
          {stations.map(({ id, name, chainage }) => (
            <Pressable
              key={id}
              role="button"
              onPress={() => onChoose(chainage)}
              {...aria({ 'aria-current': chainage === at ? 'true' : undefined })}
              style={styles.line}
            >
              <Txt strong={chainage === at} style={styles.name}>
                {name}
              </Txt>
              <Txt tone="soft">{formatWithUnit(chainage, 'chainage', system)}</Txt>
            </Pressable>
          ))}
        </List>
      ) : null}
      <Button
        label={stations?.length ? 'Edit stations' : 'Name stations'}
        href={`/studies/${studyId}/stations`}
      />
    </Card>
  );
}

const styles = StyleSheet.create({
  line: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'center',
    gap: space.two,
    minHeight: space.three + space.half,
  },
  name: { flexShrink: 1 },
});

import { StyleSheet, View } from 'react-native';
import { formatWithUnit } from '@/shared/units/format';
import { useStations } from '@/components/queries/stations';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';

/** The named places, in short. */
export function StationsCard({ studyId }: { studyId: number }) {
  const { data: stations } = useStations(studyId);
  const system = useUnitSystem();
  return (
    <Card title="Stations">
      {stations?.length === 0 ? (
        <Txt tone="soft">No places named yet. Results are told first where people care.</Txt>
      ) : null}
      {stations?.length ? (
        <List label="Stations">
          {stations.map((station) => (
            <View key={station.id} style={styles.line}>
              <Txt style={styles.name}>{station.name}</Txt>
              <Txt tone="soft">{formatWithUnit(station.chainage, 'chainage', system)}</Txt>
            </View>
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
  line: { flexDirection: 'row', justifyContent: 'space-between', gap: space.two },
  name: { flexShrink: 1 },
});

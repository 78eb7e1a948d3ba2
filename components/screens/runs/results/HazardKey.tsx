import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { HAZARD_CLASSES, HAZARD_GUIDELINE, type HazardClass } from '@/shared/hazard/hazardClass';
import { formatWithUnit } from '@/shared/units/format';
import { fromSi, UNITS, type UnitSystem } from '@/shared/units/units';

/** The classes that occur, with the thresholds of the guideline. */
export function HazardKey({ present }: { present: ReadonlySet<HazardClass['label'] | null> }) {
  const system = useUnitSystem();
  return (
    <View style={styles.key}>
      <Txt variant="small" strong>
        {HAZARD_GUIDELINE}
      </Txt>
      {HAZARD_CLASSES.filter(({ label }) => present.has(label)).map((entry) => (
        <Txt key={entry.label} variant="small" tone="soft">
          <Txt variant="small" strong>
            {entry.label}
          </Txt>
          {`  ${entry.meaning} (${limits(entry, system)})`}
        </Txt>
      ))}
      <Txt variant="small" tone="soft">
        Other authorities use the same letters for other limits: follow the local one.
      </Txt>
    </View>
  );
}

function limits({ depth, velocity, depthVelocity }: HazardClass, system: UnitSystem): string {
  if (!Number.isFinite(depth)) return 'above the limits of H5';
  const product = fromSi(fromSi(depthVelocity, 'depth', system), 'depth', system);
  const unit = UNITS[system].depth.symbol;
  return `up to ${formatWithUnit(depth, 'depth', system)} deep, ${formatWithUnit(velocity, 'velocity', system)}, depth × velocity ${product.toFixed(1)} ${unit}²/s`;
}

const styles = StyleSheet.create({ key: { gap: space.half } });

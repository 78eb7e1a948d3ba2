import { StyleSheet, View } from 'react-native';
import { CrossSection } from '@/components/charts/CrossSection';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { ReachSection } from '@/shared/reaches/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';

interface SectionCardProps {
  sections: readonly ReachSection[];
  section: ReachSection;
  onChoose: (chainage: number) => void;
  /** Left out where it may not be changed, or is being changed already. */
  onEdit?: () => void;
}

/** The chosen section: its ground, its bank marks and roughness zones, its size at bank level. */
export function SectionCard({ sections, section, onChoose, onEdit }: SectionCardProps) {
  const system = useUnitSystem();
  const index = sections.indexOf(section);
  const go = (step: number) => onChoose(sections[index + step].chainage);
  const { bankfull, banks } = section;
  return (
    <Card
      title={`Section ${section.id}`}
      aside={formatWithUnit(section.chainage, 'chainage', system)}
    >
      <CrossSection label={`Section ${section.id}`} section={section} unitSystem={system} />
      <Txt variant="small" tone="soft">
        Elevation in {UNITS[system].elevation.symbol} above datum, offset in{' '}
        {UNITS[system].length.symbol}, looking downstream.
      </Txt>
      <View style={styles.figures}>
        <FigureWithUnit
          size="title"
          value={formatQuantity(bankfull.depth, 'depth', system)}
          unit={UNITS[system].depth.symbol}
          label={banks ? 'deep to the lower bank' : 'deep to the lower end'}
        />
        <FigureWithUnit
          size="title"
          value={formatQuantity(bankfull.topWidth, 'length', system)}
          unit={UNITS[system].length.symbol}
          label="wide there"
        />
        <FigureWithUnit
          size="title"
          value={formatQuantity(bankfull.area, 'area', system)}
          unit={UNITS[system].area.symbol}
          label="area there"
        />
      </View>
      {banks ? null : (
        <Txt variant="small" tone="ochre">
          No bank marks: the whole width counts as one zone.
        </Txt>
      )}
      <View style={styles.buttons}>
        <Button label="Upstream" kind="quiet" disabled={index === 0} onPress={() => go(-1)} />
        <Button
          label="Downstream"
          kind="quiet"
          disabled={index === sections.length - 1}
          onPress={() => go(1)}
        />
      </View>
      {onEdit ? <Button label="Set banks and roughness" wide onPress={onEdit} /> : null}
    </Card>
  );
}

const styles = StyleSheet.create({
  figures: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.three, rowGap: space.one },
  buttons: { flexDirection: 'row', justifyContent: 'space-between' },
});

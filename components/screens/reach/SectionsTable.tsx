import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Checkbox } from '@/components/ui/Checkbox';
import { Table, type Column } from '@/components/ui/Table';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { ReachSection } from '@/shared/reaches/types';
import { formatNumber, formatQuantity } from '@/shared/units/format';
import { UNITS, type Quantity, type UnitSystem } from '@/shared/units/units';
import { allSections, describeChoice, toggleSection, type SectionChoice } from './sectionChoice';
import { roughnessByStrip } from './sectionsForm';

interface SectionsTableProps {
  sections: readonly ReachSection[];
  section: ReachSection;
  ticked: SectionChoice;
  onChoose: (chainage: number) => void;
  /** Left out where nothing may be changed. */
  onTick?: (ticked: SectionChoice) => void;
}

/** Every section in figures; ticked ones are what the form changes. */
export function SectionsTable(props: SectionsTableProps) {
  const { sections, section, ticked, onChoose, onTick } = props;
  const system = useUnitSystem();
  const columns = useMemo(() => {
    const tick: Column<ReachSection> = {
      key: 'tick',
      title: 'Change',
      render: ({ id }) => (
        <Checkbox
          label={`Change ${id}`}
          hideLabel
          checked={ticked.includes(id)}
          onChange={() => onTick?.(toggleSection(ticked, sections, id))}
        />
      ),
    };
    const [first, ...rest] = figures(system);
    return onTick ? [first, tick, ...rest] : [first, ...rest];
  }, [system, ticked, sections, onTick]);
  return (
    <Card title="Sections" aside={ticked.length > 0 ? describeChoice(ticked) : undefined}>
      {onTick ? (
        <View style={styles.choose}>
          <Button kind="quiet" label="Tick all" onPress={() => onTick(allSections(sections))} />
          <Button
            kind="quiet"
            label="Tick none"
            disabled={ticked.length === 0}
            onPress={() => onTick([])}
          />
        </View>
      ) : null}
      <Table
        label="Sections of the reach"
        columns={columns}
        rows={sections}
        rowKey={({ id }) => id}
        isChosen={({ id }) => id === section.id}
        onRowPress={({ chainage }) => onChoose(chainage)}
        maxHeight={480}
      />
    </Card>
  );
}

function figures(system: UnitSystem): Column<ReachSection>[] {
  const figure = (
    key: string,
    title: string,
    quantity: Quantity,
    value: (section: ReachSection) => number,
  ): Column<ReachSection> => ({
    key,
    title,
    unit: UNITS[system][quantity].symbol,
    align: 'right',
    render: (section) => formatQuantity(value(section), quantity, system),
  });
  return [
    { key: 'id', title: 'Section', render: ({ id }) => id },
    figure('chainage', 'Chainage', 'chainage', ({ chainage }) => chainage),
    figure('thalweg', 'Lowest point', 'elevation', ({ thalweg }) => thalweg),
    figure('left', 'Left bank', 'elevation', ({ leftBank }) => leftBank),
    figure('right', 'Right bank', 'elevation', ({ rightBank }) => rightBank),
    figure('depth', 'Bankfull depth', 'depth', ({ bankfull }) => bankfull.depth),
    figure('width', 'width', 'length', ({ bankfull }) => bankfull.topWidth),
    figure('area', 'area', 'area', ({ bankfull }) => bankfull.area),
    {
      key: 'roughness',
      title: "Manning's n, left · channel · right",
      render: (section) =>
        roughnessByStrip(section)
          .map((n) => (n === null ? '–' : formatNumber(n, 3)))
          .join(' · '),
    },
    {
      key: 'points',
      title: 'Points',
      align: 'right',
      render: ({ points }) => points.length,
    },
  ];
}

const styles = StyleSheet.create({
  choose: { flexDirection: 'row', columnGap: space.two, marginVertical: -space.one },
});

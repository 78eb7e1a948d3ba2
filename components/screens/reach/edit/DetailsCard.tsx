import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { NumberField } from '@/components/ui/NumberField';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { proposeBanks } from '@/shared/reaches/edit/proposeBanks';
import { formatWithUnit } from '@/shared/units/format';
import { useEditing } from './editorContext';

/** Name, place and bank marks of the section; taking it out. */
export function DetailsCard() {
  const { section, editor, goTo, faultAt } = useEditing();
  const { sections } = editor;
  const index = sections.findIndex(({ id }) => id === section.id);
  const go = (step: number) => goTo(sections[index + step].chainage);
  const takeOut = () => {
    editor.change(
      sections.filter(({ id }) => id !== section.id),
      `${section.id}: taken out`,
    );
    goTo((sections[index + 1] ?? sections[index - 1]).chainage);
  };
  return (
    <Card title="Name, place and banks" aside={`${index + 1} of ${sections.length}`}>
      <View style={styles.apart}>
        <Button kind="quiet" label="Upstream" disabled={index === 0} onPress={() => go(-1)} />
        <Button
          kind="quiet"
          label="Downstream"
          disabled={index === sections.length - 1}
          onPress={() => go(1)}
        />
      </View>
      <NameAndPlace key={section.id} />
      <Banks />
      <View>
        <Button
          kind="danger"
          label="Take the section out"
          name={`Take the section out, ${section.id}`}
          disabled={sections.length <= 2}
          hint={sections.length <= 2 ? 'A reach needs two sections.' : undefined}
          onPress={takeOut}
        />
      </View>
      {faultAt('coordinates') ? (
        <Txt role="alert" tone="brick">
          {faultAt('coordinates')}
        </Txt>
      ) : null}
    </Card>
  );
}

/** Taken over together by a button: a name that is half typed is not yet the section's. */
function NameAndPlace() {
  const { section, editor, goTo } = useEditing();
  const system = useUnitSystem();
  const [name, setName] = useState(section.id);
  const [chainage, setChainage] = useState<number | null>(section.chainage);
  const others = editor.sections.filter(({ id }) => id !== section.id);
  const wanted = name.trim();
  const nameFault =
    wanted === ''
      ? 'Name the section.'
      : others.some(({ id }) => id === wanted)
        ? 'Another section is called so.'
        : undefined;
  const placeFault =
    chainage === null
      ? 'Give its chainage.'
      : others.some((other) => other.chainage === chainage)
        ? 'Another section stands there.'
        : undefined;
  const isSame = wanted === section.id && chainage === section.chainage;
  const canTake = !nameFault && !placeFault && !Number.isNaN(chainage) && !isSame;
  const take = () => {
    if (chainage === null) return;
    const words = [
      wanted !== section.id && `called ${wanted}`,
      chainage !== section.chainage &&
        `moved from ${formatWithUnit(section.chainage, 'chainage', system)} to ${formatWithUnit(chainage, 'chainage', system)}`,
    ].filter(Boolean);
    editor.changeSection(
      section.id,
      { ...section, id: wanted, chainage },
      `${section.id}: ${words.join(', ')}`,
    );
    goTo(chainage);
  };
  return (
    <>
      <View style={styles.pair}>
        <View style={styles.half}>
          <TextField
            label="Section"
            value={name}
            onChange={setName}
            error={nameFault}
            maxLength={100}
          />
        </View>
        <View style={styles.half}>
          <NumberField
            label="Chainage"
            quantity="chainage"
            value={chainage}
            onChange={setChainage}
            error={placeFault}
          />
        </View>
      </View>
      {isSame ? null : (
        <View>
          <Button label="Take name and place over" disabled={!canTake} onPress={take} />
        </View>
      )}
    </>
  );
}

function Banks() {
  const { section, put, faultAt } = useEditing();
  const system = useUnitSystem();
  const proposal = proposeBanks(section);
  const { banks } = section;
  const isProposed = proposal && banks?.join() === proposal.banks.join();
  const set = (side: 0 | 1, value: number | null) => {
    if (value === null || Number.isNaN(value) || !banks) return;
    const next: [number, number] = [...banks];
    next[side] = value;
    put(
      { ...section, banks: next },
      `${side === 0 ? 'left' : 'right'} bank mark set`,
      `bank ${side}`,
    );
  };
  return (
    <>
      {banks ? (
        <View style={styles.pair}>
          {([0, 1] as const).map((side) => (
            <View key={side} style={styles.half}>
              <NumberField
                label={side === 0 ? 'Left bank, offset' : 'Right bank, offset'}
                quantity="length"
                value={banks[side]}
                onChange={(value) => set(side, value)}
                error={faultAt(`banks[${side}]`)}
              />
            </View>
          ))}
        </View>
      ) : (
        <Txt variant="small" tone="ochre">
          No bank marks: the whole width counts as channel.
        </Txt>
      )}
      <View style={styles.buttons}>
        <Button
          label="Propose bank marks"
          disabled={!proposal || Boolean(isProposed)}
          onPress={() =>
            proposal &&
            put(
              { ...section, banks: proposal.banks },
              `bank marks proposed at ${formatWithUnit(proposal.stage, 'elevation', system)}`,
            )
          }
        />
        {banks ? (
          <Button
            kind="quiet"
            label="No bank marks"
            onPress={() => put({ ...section, banks: null }, 'bank marks taken away')}
          />
        ) : null}
      </View>
      <Txt variant="small" tone="soft">
        {proposal
          ? `Proposed: the stage at which the width is least for the mean depth, ${formatWithUnit(proposal.stage, 'elevation', system)} (Wolman 1955). A proposal to look at, not a survey.`
          : 'No stage stands out at which the water leaves the channel; set the marks by hand.'}
      </Txt>
    </>
  );
}

const styles = StyleSheet.create({
  apart: { flexDirection: 'row', justifyContent: 'space-between', gap: space.two },
  pair: { flexDirection: 'row', gap: space.two, alignItems: 'flex-start' },
  half: { flex: 1, minWidth: 0 },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.one },
});

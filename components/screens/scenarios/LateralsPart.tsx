import { StyleSheet, View } from 'react-native';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { NumberField } from '@/components/ui/NumberField';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import type { LateralInflow } from '@/shared/scenarios/schemas';
import { EditorPart, FieldRow } from './EditorPart';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';
import { TimeTableEditor } from './TimeTableEditor';

/** What joins or leaves along the way. */
export function LateralsPart() {
  const { draft, dispatch, isLocked } = useEditing();
  const { laterals } = draft;
  return (
    <EditorPart part="laterals">
      {laterals.length === 0 ? (
        <Txt tone="soft">
          None. Add one for each tributary, or for rain over a stretch; a negative flow takes water
          out.
        </Txt>
      ) : null}
      {laterals.map((lateral, index) => (
        <Lateral key={index} {...{ lateral, index }} />
      ))}
      {isLocked ? null : (
        <Button
          label="Add a lateral inflow"
          disabled={laterals.length >= LIMITS.laterals}
          hint={laterals.length >= LIMITS.laterals ? `At most ${LIMITS.laterals}.` : undefined}
          onPress={() => dispatch({ type: 'lateralAdded' })}
        />
      )}
    </EditorPart>
  );
}

function Lateral({ lateral, index }: { lateral: LateralInflow; index: number }) {
  const { dispatch, isLocked: disabled } = useEditing();
  const { colours } = useTheme();
  const path = `laterals[${index}]`;
  const title = lateral.name || `Lateral inflow ${index + 1}`;
  const change = (to: Partial<LateralInflow>) =>
    dispatch({ type: 'lateralChanged', index, change: to });
  return (
    <View
      role="group"
      aria-label={title}
      style={[styles.lateral, { borderTopColor: colours.line }]}
    >
      <FieldRow>
        <PlacedField path={`${path}.name`} half>
          {(error) => (
            <TextField
              label="Name"
              optional
              maxLength={LIMITS.textShort}
              value={lateral.name}
              onChange={(name) => change({ name })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path={`${path}.from`} half>
          {(error) => (
            <NumberField
              label="From chainage"
              quantity="chainage"
              value={lateral.from}
              onChange={(from) => change({ from })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path={`${path}.to`} half>
          {(error) => (
            <NumberField
              label="To chainage"
              hint="The same as from: it joins at a point."
              quantity="chainage"
              value={lateral.to}
              onChange={(to) => change({ to })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
      </FieldRow>
      <TimeTableEditor
        path={path}
        label={`Flow of ${title}`}
        quantity="flow"
        times={lateral.times}
        values={lateral.flows}
        onChange={(times, flows) => change({ times, flows })}
      />
      {disabled ? null : (
        <Button
          kind="danger"
          label="Remove"
          name={`Remove ${title}`}
          onPress={() => dispatch({ type: 'lateralRemoved', index })}
        />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  lateral: { gap: space.two, paddingTop: space.two, borderTopWidth: hairline },
});

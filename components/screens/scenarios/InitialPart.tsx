import { NumberField } from '@/components/ui/NumberField';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { ColumnTableEditor } from './ColumnTableEditor';
import { EditorPart, FieldRow } from './EditorPart';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';

/** The water at the start. */
export function InitialPart() {
  const { draft, dispatch, isLocked: disabled } = useEditing();
  const { kind, byKind } = draft.initial;
  return (
    <EditorPart part="initial">
      <PlacedField path="initial.kind">
        {(error) => (
          <RadioGroup
            label="How it begins"
            value={kind}
            error={error}
            disabled={disabled}
            onChange={(chosen) => dispatch({ type: 'initialChosen', kind: chosen })}
            options={[
              {
                value: 'steady',
                label: 'Steady flow',
                hint: 'What the first inflow and the outlet make of themselves.',
              },
              { value: 'still', label: 'Still water at one stage' },
              { value: 'profile', label: 'A given water surface and flow' },
              {
                value: 'dam',
                label: 'A dam that fails at the start',
                hint: 'Suddenly and wholly: the upper bound of a failure.',
              },
            ]}
          />
        )}
      </PlacedField>
      {kind === 'still' ? (
        <PlacedField path="initial.stage">
          {(error) => (
            <NumberField
              label="Stage"
              quantity="elevation"
              hint="Above datum. Where the bed lies higher the reach is dry."
              value={byKind.still.stage}
              onChange={(stage) => dispatch({ type: 'initialChanged', change: { stage } })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
      ) : null}
      {kind === 'profile' ? (
        <ColumnTableEditor
          path="initial"
          label="Water surface and flow along the reach"
          columns={[
            { title: 'chainage', quantity: 'chainage' },
            { title: 'stage', quantity: 'elevation' },
            { title: 'flow', quantity: 'flow' },
          ]}
          values={[byKind.profile.chainages, byKind.profile.stages, byKind.profile.flows]}
          onChange={([chainages, stages, flows]) =>
            dispatch({ type: 'initialChanged', change: { chainages, stages, flows } })
          }
        />
      ) : null}
      {kind === 'dam' ? (
        <FieldRow>
          <PlacedField path="initial.chainage" half>
            {(error) => (
              <NumberField
                label="Dam at chainage"
                quantity="chainage"
                value={byKind.dam.chainage}
                onChange={(chainage) => dispatch({ type: 'initialChanged', change: { chainage } })}
                {...{ error, disabled }}
              />
            )}
          </PlacedField>
          <PlacedField path="initial.stageAbove" half>
            {(error) => (
              <NumberField
                label="Stage of the reservoir"
                quantity="elevation"
                value={byKind.dam.stageAbove}
                onChange={(stageAbove) =>
                  dispatch({ type: 'initialChanged', change: { stageAbove } })
                }
                {...{ error, disabled }}
              />
            )}
          </PlacedField>
          <PlacedField path="initial.stageBelow" half>
            {(error) => (
              <NumberField
                label="Stage below the dam"
                optional
                hint="Empty: dry."
                quantity="elevation"
                value={byKind.dam.stageBelow}
                onChange={(stageBelow) =>
                  dispatch({ type: 'initialChanged', change: { stageBelow } })
                }
                {...{ error, disabled }}
              />
            )}
          </PlacedField>
        </FieldRow>
      ) : null}
    </EditorPart>
  );
}

import { Button } from '@/components/ui/Button';
import { NumberField } from '@/components/ui/NumberField';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import type { LocalLossBody } from '@/shared/scenarios/schemas';
import { EditorPart, FieldRow } from './EditorPart';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';
import { StretchFields } from './StretchFields';

/** Head that is lost where the river narrows and widens. */
export function LocalLossesPart() {
  const { draft, dispatch, isLocked } = useEditing();
  const { localLosses } = draft;
  const isFull = localLosses.length >= LIMITS.localLosses;
  return (
    <EditorPart part="localLosses">
      <Txt tone="soft" variant={localLosses.length === 0 ? undefined : 'small'}>
        {localLosses.length === 0 ? 'None. ' : ''}
        Beside friction, the river loses a share of the change of velocity head where it narrows or
        widens. Common practice: 0.1 and 0.3 in gradual transitions, 0.3 and 0.5 at bridges.
      </Txt>
      {localLosses.map((loss, index) => (
        <Loss key={index} {...{ loss, index }} />
      ))}
      {isLocked ? null : (
        <Button
          label="Add a stretch with losses"
          disabled={isFull}
          hint={isFull ? `At most ${LIMITS.localLosses}.` : undefined}
          onPress={() => dispatch({ type: 'localLossAdded' })}
        />
      )}
    </EditorPart>
  );
}

function Loss({ loss, index }: { loss: LocalLossBody; index: number }) {
  const { dispatch, isLocked: disabled } = useEditing();
  const path = `localLosses[${index}]`;
  const change = (to: Partial<LocalLossBody>) =>
    dispatch({ type: 'localLossChanged', index, change: to });
  return (
    <StretchFields
      title={`Losses ${index + 1}`}
      path={path}
      from={loss.from}
      to={loss.to}
      onChange={change}
      onRemove={() => dispatch({ type: 'localLossRemoved', index })}
    >
      <FieldRow>
        <PlacedField path={`${path}.contraction`} half>
          {(error) => (
            <NumberField
              label="Where it narrows"
              hint="Share of the change of velocity head, 0 to 1."
              value={loss.contraction}
              onChange={(contraction) => change({ contraction })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path={`${path}.expansion`} half>
          {(error) => (
            <NumberField
              label="Where it widens"
              hint="Share of the change of velocity head, 0 to 1."
              value={loss.expansion}
              onChange={(expansion) => change({ expansion })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
      </FieldRow>
    </StretchFields>
  );
}

import { Button } from '@/components/ui/Button';
import { NumberField } from '@/components/ui/NumberField';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import type { RoughnessFactorBody } from '@/shared/scenarios/schemas';
import { ColumnTableEditor } from './ColumnTableEditor';
import type { TextColumn } from './columnsText';
import { EditorPart, FieldRow } from './EditorPart';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';
import { StretchFields } from './StretchFields';

const PARTS: { value: RoughnessFactorBody['part']; label: string }[] = [
  { value: 'all', label: 'Whole section' },
  { value: 'channel', label: 'Between the bank marks' },
  { value: 'overbank', label: 'Outside the bank marks' },
];

const COLUMNS: readonly TextColumn[] = [
  { title: 'Depth', quantity: 'depth' },
  { title: 'Multiplier', quantity: 'multiplier' },
];

/** Manning's n of the sections, multiplied. */
export function RoughnessPart() {
  const { draft, dispatch, isLocked } = useEditing();
  const { roughnessFactors } = draft;
  const isFull = roughnessFactors.length >= LIMITS.roughnessFactors;
  return (
    <EditorPart part="roughnessFactors">
      <Txt tone="soft" variant={roughnessFactors.length === 0 ? undefined : 'small'}>
        {roughnessFactors.length === 0 ? 'As in the sections. ' : ''}A multiplier changes Manning’s
        n over a stretch without changing the survey, and may change with depth. Multipliers over
        one place multiply.
      </Txt>
      {roughnessFactors.map((factor, index) => (
        <Factor key={index} {...{ factor, index }} />
      ))}
      {isLocked ? null : (
        <Button
          label="Add a multiplier"
          disabled={isFull}
          hint={isFull ? `At most ${LIMITS.roughnessFactors}.` : undefined}
          onPress={() => dispatch({ type: 'roughnessFactorAdded' })}
        />
      )}
    </EditorPart>
  );
}

function Factor({ factor, index }: { factor: RoughnessFactorBody; index: number }) {
  const { dispatch, isLocked: disabled } = useEditing();
  const path = `roughnessFactors[${index}]`;
  const title = `Multiplier ${index + 1}`;
  const change = (to: Partial<RoughnessFactorBody>) =>
    dispatch({ type: 'roughnessFactorChanged', index, change: to });
  const { depths, factors } = factor;
  const isConstant = factors.length <= 1;
  return (
    <StretchFields
      title={title}
      path={path}
      from={factor.from}
      to={factor.to}
      onChange={change}
      onRemove={() => dispatch({ type: 'roughnessFactorRemoved', index })}
    >
      <FieldRow>
        <PlacedField path={`${path}.part`} half>
          {(error) => (
            <SelectField
              label="Part of the section"
              value={factor.part}
              options={PARTS}
              onChange={(part) => change({ part: part as RoughnessFactorBody['part'] })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path={`${path}.kind`} half>
          {() => (
            <SelectField
              label="Multiplier"
              value={isConstant ? 'constant' : 'depth'}
              options={[
                { value: 'constant', label: 'The same at every depth' },
                { value: 'depth', label: 'By depth' },
              ]}
              disabled={disabled}
              onChange={(kind) =>
                change(
                  kind === 'constant'
                    ? { depths: [0], factors: factors.slice(0, 1) }
                    : { depths: [0, 2], factors: [factors[0] ?? 1, factors[0] ?? 1] },
                )
              }
            />
          )}
        </PlacedField>
        {isConstant ? (
          <PlacedField path={`${path}.factors`} half>
            {(error) => (
              <NumberField
                label="Multiplier of n"
                hint="1 leaves n as it is; 1.2 is 20 % rougher."
                value={factors[0] ?? null}
                onChange={(value) =>
                  change(
                    value === null
                      ? { depths: [], factors: [] }
                      : { depths: [0], factors: [value] },
                  )
                }
                {...{ error, disabled }}
              />
            )}
          </PlacedField>
        ) : null}
      </FieldRow>
      {isConstant ? null : (
        <ColumnTableEditor
          path={path}
          label={`${title} by depth over the lowest bed of the part`}
          columns={COLUMNS}
          values={[depths, factors]}
          onChange={([newDepths, newFactors]) => change({ depths: newDepths, factors: newFactors })}
        />
      )}
    </StretchFields>
  );
}

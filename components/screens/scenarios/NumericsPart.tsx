import { Button } from '@/components/ui/Button';
import { NumberField } from '@/components/ui/NumberField';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { CASE_DEFAULTS } from '@/shared/case/caseFile';
import { proposals } from '@/shared/scenarios/proposals';
import { formatNumber, formatChosenLength } from '@/shared/units/format';
import { EditorPart, FieldRow } from './EditorPart';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';
import { runSize } from './runSize';
import { TimeField } from './TimeField';
import { q, say, sayIn } from '@/shared/units/message';

/** How finely and how long it is computed. */
export function NumericsPart() {
  const { draft, dispatch, reach, isLocked: disabled } = useEditing();
  const system = useUnitSystem();
  const { numerics } = draft;
  const change = (to: Partial<typeof numerics>) =>
    dispatch({ type: 'numericsChanged', change: to });
  const upstream = draft.upstream.byKind[draft.upstream.kind];
  const proposed = reach ? proposals(reach.sections, upstream, system) : null;
  const size = reach ? runSize(numerics, reach) : null;
  const takes =
    proposed &&
    (['cellSize', 'duration', 'outputInterval'] as const).some(
      (key) => numerics[key] !== proposed[key],
    );
  return (
    <EditorPart part="numerics">
      <FieldRow>
        <PlacedField path="numerics.cellSize" half>
          {(error) => (
            <NumberField
              label="Cell size"
              quantity="length"
              hint={
                proposed
                  ? `Fits this reach: ${formatChosenLength(proposed.cellSize, system)}.`
                  : undefined
              }
              value={numerics.cellSize}
              onChange={(cellSize) => change({ cellSize })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path="numerics.duration" half>
          {(error) => (
            <TimeField
              label="Duration"
              unit="h"
              hint={
                proposed
                  ? `The flood passes in ${formatNumber(proposed.duration / 3600, 0)} h.`
                  : undefined
              }
              value={numerics.duration}
              onChange={(duration) => change({ duration })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path="numerics.outputInterval" half>
          {(error) => (
            <TimeField
              label="Result kept every"
              unit="min"
              hint="Peaks are taken from every step, not from these times alone."
              value={numerics.outputInterval}
              onChange={(outputInterval) => change({ outputInterval })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
      </FieldRow>
      {size ? (
        <Txt variant="small" tone="soft">
          {size}
        </Txt>
      ) : null}
      {proposed && takes && !disabled ? (
        <Button
          kind="quiet"
          label="Take the values that fit"
          onPress={() =>
            change({
              cellSize: proposed.cellSize,
              duration: proposed.duration,
              outputInterval: proposed.outputInterval,
            })
          }
        />
      ) : null}
      <FieldRow>
        <PlacedField path="numerics.order" half>
          {(error) => (
            <SelectField
              label="Order of the scheme"
              hint="First order is quicker and blunts the wave."
              value={String(numerics.order)}
              options={[
                { value: '2', label: 'Second' },
                { value: '1', label: 'First' },
              ]}
              onChange={(order) => change({ order: Number(order) })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path="numerics.courant" half>
          {(error) => (
            <NumberField
              label="Courant number"
              optional
              hint={`Empty: ${CASE_DEFAULTS.courant}.`}
              value={numerics.courant}
              onChange={(courant) => change({ courant })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path="numerics.dryDepth" half>
          {(error) => (
            <NumberField
              label="Dry below a depth of"
              optional
              hint={`Empty: ${sayIn(system, say`${q(CASE_DEFAULTS.dryDepth, 'depth', { figures: 1 })}`)}.`}
              quantity="depth"
              value={numerics.dryDepth}
              onChange={(dryDepth) => change({ dryDepth })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
      </FieldRow>
      <FieldRow>
        <PlacedField path="numerics.momentum">
          {(error) => (
            <SelectField
              label="Momentum of the flow"
              hint="By its parts, channel and overbank run at their own velocities; it matters where overbank flow speeds up or slows down."
              value={numerics.momentum ?? CASE_DEFAULTS.momentum}
              options={[
                { value: 'uniform', label: 'One velocity over the section' },
                { value: 'compound', label: 'By the parts of the section' },
              ]}
              onChange={(momentum) => change({ momentum: momentum as 'uniform' | 'compound' })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
      </FieldRow>
    </EditorPart>
  );
}

import { Button } from '@/components/ui/Button';
import { NumberField } from '@/components/ui/NumberField';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { outletSlopeOf } from '@/shared/scenarios/proposals';
import { formatWithUnit } from '@/shared/units/format';
import { ColumnTableEditor } from './ColumnTableEditor';
import { EditorPart } from './EditorPart';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';
import { TimeTableEditor } from './TimeTableEditor';

/** Where the water leaves. */
export function OutletPart() {
  const { draft, dispatch, scenario, reach, isLocked } = useEditing();
  const system = useUnitSystem();
  const { kind, byKind } = draft.downstream;
  const proposed = reach ? outletSlopeOf(reach.sections) : scenario.proposals.outletSlope;
  return (
    <EditorPart part="downstream">
      <PlacedField path="downstream.kind">
        {(error) => (
          <RadioGroup
            label="How the water leaves"
            value={kind}
            error={error}
            disabled={isLocked}
            onChange={(chosen) => dispatch({ type: 'downstreamChosen', kind: chosen })}
            options={[
              {
                value: 'normalDepth',
                label: 'Normal depth',
                hint: 'The river goes on alike below the last section.',
              },
              {
                value: 'stage',
                label: 'Stage against time',
                hint: 'A lake, a tide, a larger river.',
              },
              {
                value: 'rating',
                label: 'Rating curve',
                hint: 'Flow by stage, from a gauge or a weir.',
              },
              {
                value: 'criticalDepth',
                label: 'Critical depth',
                hint: 'A free overfall below the last section.',
              },
              {
                value: 'open',
                label: 'Open',
                hint: 'Waves leave without reflection: for short reaches.',
              },
              { value: 'wall', label: 'A wall', hint: 'Nothing leaves.' },
            ]}
          />
        )}
      </PlacedField>
      {kind === 'normalDepth' ? (
        <PlacedField path="downstream.slope">
          {(error) => (
            <>
              <NumberField
                label="Slope at the outlet"
                quantity="slope"
                hint={`The bed of the lower reach falls by ${formatWithUnit(proposed, 'slope', system)}.`}
                value={byKind.normalDepth.slope}
                onChange={(slope) => dispatch({ type: 'downstreamChanged', change: { slope } })}
                error={error}
                disabled={isLocked}
              />
              {!isLocked && byKind.normalDepth.slope !== proposed ? (
                <Button
                  kind="quiet"
                  label="Take the slope of the bed"
                  onPress={() =>
                    dispatch({ type: 'downstreamChanged', change: { slope: proposed } })
                  }
                />
              ) : null}
            </>
          )}
        </PlacedField>
      ) : null}
      {kind === 'stage' ? (
        <TimeTableEditor
          path="downstream"
          label="Stage at the outlet"
          quantity="stage"
          times={byKind.stage.times}
          values={byKind.stage.stages}
          onChange={(times, stages) =>
            dispatch({ type: 'downstreamChanged', change: { times, stages } })
          }
        />
      ) : null}
      {kind === 'rating' ? (
        <ColumnTableEditor
          path="downstream"
          label="Rating curve"
          columns={[
            { title: 'stage', quantity: 'elevation' },
            { title: 'flow', quantity: 'flow' },
          ]}
          values={[byKind.rating.stages, byKind.rating.flows]}
          onChange={([stages, flows]) =>
            dispatch({ type: 'downstreamChanged', change: { stages, flows } })
          }
        />
      ) : null}
    </EditorPart>
  );
}

import { useState } from 'react';
import { NumberField } from '@/components/ui/NumberField';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { Txt } from '@/components/ui/Txt';
import { SCS_RECESSION_RATIO, USUAL_GAMMA_EXPONENT } from '@/shared/scenarios/hydrographs';
import type { ReservoirInflow } from '@/shared/scenarios/schemas';
import { ColumnTableEditor } from './ColumnTableEditor';
import { useEditing } from './editorContext';
import { GeneratedInflow } from './GeneratedInflow';
import { PlacedField } from './PlacedField';
import { TimeTableEditor } from './TimeTableEditor';

const EMPTY: Record<ReservoirInflow['kind'], ReservoirInflow> = {
  table: { kind: 'table', times: [], flows: [] },
  generated: {
    kind: 'generated',
    shape: 'nrcs',
    baseFlow: null,
    peakFlow: null,
    timeToPeak: null,
    recessionRatio: SCS_RECESSION_RATIO,
    gammaExponent: USUAL_GAMMA_EXPONENT,
  },
};

/** A level pool at the head of the reach: what it holds, what comes in, what leaves beside its dam. */
export function ReservoirFields() {
  const { draft, dispatch, isLocked: disabled } = useEditing();
  const { storage, initialStage, inflow, spillway } = draft.upstream.byKind.reservoir;
  const change = (to: Partial<typeof draft.upstream.byKind.reservoir>) =>
    dispatch({ type: 'upstreamChanged', change: to });
  // Looking at the other kind loses nothing that was typed.
  const [left, setLeft] = useState(EMPTY);
  const choose = (kind: ReservoirInflow['kind']) => {
    setLeft({ ...left, [inflow.kind]: inflow });
    change({ inflow: left[kind] });
  };
  return (
    <>
      <ColumnTableEditor
        path="upstream.storage"
        label="Storage of the reservoir"
        columns={[
          { title: 'stage', quantity: 'elevation' },
          { title: 'volume', quantity: 'storage' },
        ]}
        values={[storage.stages, storage.volumes]}
        onChange={([stages, volumes]) => change({ storage: { stages, volumes } })}
      />
      <PlacedField path="upstream.initialStage" half>
        {(error) => (
          <NumberField
            label="Stage at the start"
            quantity="elevation"
            hint="Of the reservoir, above datum; within the table."
            value={initialStage}
            onChange={(stage) => change({ initialStage: stage })}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
      <PlacedField path="upstream.inflow.kind">
        {(error) => (
          <RadioGroup
            label="What comes into the reservoir"
            value={inflow.kind}
            onChange={choose}
            options={[
              {
                value: 'table',
                label: 'A table of inflow against time',
                hint: 'One row holds throughout; 0 on a dry day.',
              },
              { value: 'generated', label: 'A flood of a given shape into the reservoir' },
            ]}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
      {inflow.kind === 'generated' ? (
        <GeneratedInflow
          path="upstream.inflow"
          inflow={inflow}
          onChange={(to) => change({ inflow: { ...inflow, ...to } })}
        />
      ) : (
        <TimeTableEditor
          path="upstream.inflow"
          label="Inflow into the reservoir"
          quantity="flow"
          times={inflow.times}
          values={inflow.flows}
          onChange={(times, flows) => change({ inflow: { kind: 'table', times, flows } })}
        />
      )}
      <ColumnTableEditor
        path="upstream.spillway"
        label="Spillway rating (optional)"
        columns={[
          { title: 'stage', quantity: 'elevation' },
          { title: 'flow', quantity: 'flow' },
        ]}
        values={[spillway.stages, spillway.flows]}
        onChange={([stages, flows]) => change({ spillway: { stages, flows } })}
      />
      <Txt variant="small" tone="soft">
        {
          "Spillway and outlets that are left out let nothing through. Add the dam under Structures, at the reach's first section."
        }
      </Txt>
    </>
  );
}

import { RadioGroup } from '@/components/ui/RadioGroup';
import { Txt } from '@/components/ui/Txt';
import { EditorPart } from './EditorPart';
import { useEditing } from './editorContext';
import { GeneratedInflow } from './GeneratedInflow';
import { PlacedField } from './PlacedField';
import { ReservoirFields } from './ReservoirFields';
import { TimeTableEditor } from './TimeTableEditor';

/** What comes in at the upstream end. */
export function UpstreamPart() {
  const { draft, dispatch, isLocked } = useEditing();
  const { kind, byKind } = draft.upstream;
  return (
    <EditorPart part="upstream">
      <PlacedField path="upstream.kind">
        {(error) => (
          <RadioGroup
            label="What comes in"
            value={kind}
            error={error}
            disabled={isLocked}
            onChange={(chosen) => dispatch({ type: 'upstreamChosen', kind: chosen })}
            options={[
              {
                value: 'generated',
                label: 'A flood of a given shape',
                hint: 'From its peak, the time to it and the base flow.',
              },
              { value: 'table', label: 'A table of flow against time' },
              {
                value: 'stage',
                label: 'Stage against time',
                hint: 'Where a level is known and the flow is not.',
              },
              {
                value: 'reservoir',
                label: 'A reservoir behind a dam',
                hint: 'A level pool; the dam and what stands in it are structures at the first section.',
              },
              { value: 'wall', label: 'Nothing: a wall' },
            ]}
          />
        )}
      </PlacedField>
      {kind === 'generated' ? (
        <GeneratedInflow
          path="upstream"
          inflow={byKind.generated}
          onChange={(change) => dispatch({ type: 'upstreamChanged', change })}
        />
      ) : null}
      {kind === 'reservoir' ? <ReservoirFields /> : null}
      {kind === 'table' ? (
        <TimeTableEditor
          path="upstream"
          label="Inflow table"
          quantity="flow"
          times={byKind.table.times}
          values={byKind.table.flows}
          onChange={(times, flows) =>
            dispatch({ type: 'upstreamChanged', change: { times, flows } })
          }
        />
      ) : null}
      {kind === 'stage' ? (
        <TimeTableEditor
          path="upstream"
          label="Stage at the upstream end"
          quantity="stage"
          times={byKind.stage.times}
          values={byKind.stage.stages}
          onChange={(times, stages) =>
            dispatch({ type: 'upstreamChanged', change: { times, stages } })
          }
        />
      ) : null}
      {kind === 'wall' ? (
        <Txt tone="soft">
          No flow crosses the first section. Used for a dam break whose reservoir lies within the
          reach.
        </Txt>
      ) : null}
    </EditorPart>
  );
}

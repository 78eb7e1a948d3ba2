import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { NumberField } from '@/components/ui/NumberField';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { formatWithUnit } from '@/shared/units/format';
import { FromToFields } from '../FromToFields';
import { sectionsInScope, type ScopeChoice } from '../sectionScope';
import { useEditing } from './editorContext';
import { STRETCH_TOOLS, TOOL_NAMES, tryTool, type Outcome, type StretchTool } from './stretchTools';
import { ThinningTable } from './ThinningTable';

const HINTS: Record<StretchTool, string> = {
  fill: 'On the ruled surface that the solver itself lays between two sections: bank to bank, lowest bed to lowest bed.',
  thin: 'Leaves out points nearer than the tolerance to the line through the others (Douglas & Peucker 1973). Ends, lowest point and marks stay.',
  shift: 'Adds to every elevation, for another datum or a mended benchmark. Below 0 lowers.',
  turn: 'For sections taken looking upstream: offsets are mirrored within their span.',
  banks:
    'At the stage where the width is least for the mean depth (Wolman 1955). Look at each afterwards.',
};
const AMOUNT = {
  fill: { label: 'No farther apart than', quantity: 'chainage' },
  thin: { label: 'Tolerance', quantity: 'elevation' },
  shift: { label: 'Raise by', quantity: 'elevation' },
} as const;

/** One operation on the section shown, a stretch, or all; what it comes to is said before it is done. */
export function StretchCard() {
  const { section, editor } = useEditing();
  const system = useUnitSystem();
  const [tool, setTool] = useState<StretchTool>('fill');
  const [amounts, setAmounts] = useState<Partial<Record<StretchTool, number | null>>>({});
  const [scope, setScope] = useState<ScopeChoice>({ scope: 'all', from: null, to: null });
  const { sections } = editor;
  const ids = useMemo(
    () => sectionsInScope(scope, sections, section, []),
    [scope, sections, section],
  );
  const amount = amounts[tool] ?? null;
  const { outcome, fault } = useMemo(
    () => attempt(tool, sections, ids, amount),
    [tool, sections, ids, amount],
  );
  const field = tool in AMOUNT ? AMOUNT[tool as keyof typeof AMOUNT] : null;
  const isNothing =
    !outcome ||
    (outcome.sections.length === sections.length &&
      outcome.sections.every((s, i) => s === sections[i]));
  const apply = () => {
    if (!outcome) return;
    const by =
      field && amount !== null ? ` (${formatWithUnit(amount, field.quantity, system)})` : '';
    editor.unread.clear();
    editor.change(outcome.sections, `${TOOL_NAMES[tool]}${by}: ${outcome.words}`);
  };
  return (
    <Card title="Over a stretch">
      <SelectField
        label="What to do"
        value={tool}
        options={STRETCH_TOOLS.map((value) => ({ value, label: TOOL_NAMES[value] }))}
        onChange={setTool}
        hint={HINTS[tool]}
      />
      {field ? (
        <NumberField
          key={tool}
          label={field.label}
          quantity={field.quantity}
          value={amount}
          onChange={(value) => setAmounts({ ...amounts, [tool]: value })}
          error={fault ?? undefined}
        />
      ) : fault ? (
        <Txt tone="brick">{fault}</Txt>
      ) : null}
      <RadioGroup
        label="Where"
        value={scope.scope}
        onChange={(chosen) => setScope({ ...scope, scope: chosen })}
        options={[
          { value: 'all', label: `All ${sections.length} sections` },
          { value: 'stretch', label: 'A stretch of the reach' },
          { value: 'here', label: `The one shown, ${section.id}` },
        ]}
      />
      {scope.scope === 'stretch' ? <FromToFields stretch={scope} onChange={setScope} /> : null}
      {outcome?.cost && outcome.cost.length > 0 ? <ThinningTable cost={outcome.cost} /> : null}
      <Txt role="status">{outcome ? `${outcome.words}.`.replace('..', '.') : ''}</Txt>
      <View>
        <Button label={TOOL_NAMES[tool]} disabled={isNothing} onPress={apply} />
      </View>
    </Card>
  );
}

function attempt(...given: Parameters<typeof tryTool>): {
  outcome: Outcome | null;
  fault: string | null;
} {
  const [, , , amount] = given;
  if (Number.isNaN(amount)) return { outcome: null, fault: null };
  try {
    return { outcome: tryTool(...given), fault: null };
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    return { outcome: null, fault: error.message };
  }
}

import { CrestEditor } from './CrestEditor';
import { BreachEstimates } from './BreachEstimates';
import { BreachOpening } from './BreachOpening';
import { BreachStart } from './BreachStart';
import { DamFields } from './DamFields';
import { useStructure } from './structureContext';

/** A dam that fails: its crest, how it begins, what the regressions make of it, and the breach that is routed. */
export function BreachFields() {
  const { structure, path, change } = useStructure('breach');
  return (
    <>
      <CrestEditor path={path} label="Crest of the dam" crest={structure} onChange={change} />
      <BreachStart />
      <DamFields />
      <BreachEstimates />
      <BreachOpening />
    </>
  );
}

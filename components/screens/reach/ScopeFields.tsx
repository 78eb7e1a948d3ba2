import { RadioGroup } from '@/components/ui/RadioGroup';
import type { Reach, ReachSection } from '@/shared/reaches/types';
import { FromToFields } from './FromToFields';
import type { SectionChoice } from './sectionChoice';
import type { ScopeChoice } from './sectionScope';

interface ScopeFieldsProps {
  reach: Reach;
  section: ReachSection;
  ticked: SectionChoice;
  scope: ScopeChoice;
  onChange: (scope: ScopeChoice) => void;
}

/** Which sections the change goes to. */
export function ScopeFields({ reach, section, ticked, scope, onChange }: ScopeFieldsProps) {
  return (
    <>
      <RadioGroup
        label="Sections"
        value={scope.scope}
        onChange={(chosen) => onChange({ ...scope, scope: chosen })}
        options={[
          { value: 'here', label: `The one shown, ${section.id}` },
          { value: 'stretch', label: 'A stretch of the reach' },
          {
            value: 'ticked',
            label: `Those ticked in the table (${ticked.length})`,
          },
          { value: 'all', label: `All ${reach.sections.length}` },
        ]}
      />
      {scope.scope === 'stretch' ? <FromToFields stretch={scope} onChange={onChange} /> : null}
    </>
  );
}

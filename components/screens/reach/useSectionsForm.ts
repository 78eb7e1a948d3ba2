import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useYupForm } from '@/components/forms/useYupForm';
import { isApiError } from '@/components/queries/ApiError';
import { reachKeys, useChangeSections } from '@/components/queries/reaches';
import type { Reach, ReachSection } from '@/shared/reaches/types';
import type { SectionChoice } from './sectionChoice';
import { sectionsInScope, type ScopeChoice } from './sectionScope';
import { sectionsFormSchema, sectionsFormStart, toSectionsChange } from './sectionsForm';

interface SectionsFormOptions {
  reach: Reach;
  section: ReachSection;
  ticked: SectionChoice;
  onSaved: (ids: SectionChoice | null) => void;
}

/** The form with the sections it goes to. A conflict loads the newer reach and keeps what was typed. */
export function useSectionsForm({ reach, section, ticked, onSaved }: SectionsFormOptions) {
  const client = useQueryClient();
  const change = useChangeSections(reach.studyId, reach.id);
  const [scope, setScope] = useState<ScopeChoice>({
    scope: ticked.length > 0 ? 'ticked' : 'here',
    from: null,
    to: null,
  });
  // The form starts from the section shown when it was opened; going along the reach leaves what was typed.
  const [initial] = useState(() => sectionsFormStart(section));
  const ids = sectionsInScope(scope, reach.sections, section, ticked);

  const form = useYupForm({
    schema: sectionsFormSchema,
    initial,
    onSubmit: async (values) => {
      onSaved(null);
      try {
        await change.mutateAsync(toSectionsChange(values, ids, reach.version));
        onSaved(ids);
      } catch (error) {
        if (!isApiError(error, 'conflict')) throw error;
        await client.invalidateQueries({ queryKey: reachKeys.one(reach.id) });
      }
    },
  });
  return { form, scope, setScope, ids, isConflict: isApiError(change.error, 'conflict') };
}

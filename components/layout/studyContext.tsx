import { createContext, useContext } from 'react';
import type { Study, StudyAction } from '@/shared/studies/types';

interface CurrentStudy {
  study: Study;
  /** What the person may do here: no button for what the server would refuse. */
  may: (action: StudyAction) => boolean;
}

export const CurrentStudyContext = createContext<CurrentStudy | null>(null);

/** The study that the screen belongs to; read before any of its screens is shown. */
export function useCurrentStudy(): CurrentStudy {
  const current = useContext(CurrentStudyContext);
  if (!current) throw new Error('useCurrentStudy stands outside the screens of a study');
  return current;
}

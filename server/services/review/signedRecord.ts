import type { RunResiduals } from '../../../shared/calibration/types';
import type { ChecklistItem, ReviewPoint } from '../../../shared/review/types';
import type { Station, Study } from '../../../shared/studies/types';

/** What is fixed by a signature beside the frozen case and the results: names and places as they were. */
export interface SignedRecord {
  firmName: string;
  study: Pick<Study, 'title' | 'clientName' | 'place' | 'verticalDatum' | 'unitSystem' | 'purpose'>;
  stations: Station[];
  sentBy: string;
  sentAt: string;
  method: string;
  assumptions: string;
  limits: string;
  checklist: ChecklistItem[];
  points: ReviewPoint[];
  /** Left out in signatures that were given before there was any. */
  observed?: RunResiduals | null;
}

import type { Paper } from '../../../shared/reports/types';
import { annexPdf } from './annexPdf';
import type { AnnexFacts } from './types';

export interface AnnexTask {
  facts: AnnexFacts;
  paper: Paper;
}

/** Entry of the worker thread that draws the annex. */
export default ({ facts, paper }: AnnexTask): Promise<Uint8Array> => annexPdf(facts, paper);

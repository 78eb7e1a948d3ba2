import { backwaters } from './cases/backwaters';
import { bores } from './cases/bores';
import { bumps } from './cases/bumps';
import { damBreaks } from './cases/damBreaks';
import { floodFront } from './cases/floodFront';
import { levelPoolBreach } from './cases/levelPoolBreach';
import { naturalRivers } from './cases/naturalRivers';
import { parabolicTrough } from './cases/parabolicTrough';
import { poolOverWeir } from './cases/poolOverWeir';
import { prescribedDepths } from './cases/prescribedDepths';
import { riemannTests } from './cases/riemannTests';
import { smallWave } from './cases/smallWave';
import { roughDamBreak } from './cases/roughDamBreak';
import { stillWater } from './cases/stillWater';
import { uniformFlows } from './cases/uniformFlows';
import type { PublishedCase } from './publishedCase';

export { runPublishedCase, type CaseOptions } from './runPublishedCase';
export type { PublishedCase } from './publishedCase';

/** In the order of reading. A new case is a file in `cases/` and its line here. */
export const PUBLISHED_CASES: readonly PublishedCase[] = [
  ...stillWater,
  ...damBreaks,
  roughDamBreak,
  ...riemannTests,
  ...bumps,
  ...prescribedDepths,
  ...uniformFlows,
  ...backwaters,
  ...naturalRivers,
  parabolicTrough,
  floodFront,
  smallWave,
  ...bores,
  poolOverWeir,
  levelPoolBreach,
];

const BY_ID = new Map(PUBLISHED_CASES.map((published) => [published.id, published]));

export const publishedCase = (id: string): PublishedCase | undefined => BY_ID.get(id);

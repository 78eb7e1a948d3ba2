import type { Advice, ReachSection } from '../../../../shared/reaches/types';
import { adviseAdverseSlope } from './adverseSlope';
import { adviseConveyanceJump } from './conveyanceJump';
import { adviseLowEnds } from './lowEnds';
import { adviseMissingBanks } from './missingBanks';
import { adviseRoughness } from './roughnessRange';
import { adviseSpacing } from './spacing';
import type { AdviceRule } from './types';

const RULES: AdviceRule[] = [
  adviseMissingBanks,
  adviseRoughness,
  adviseSpacing,
  adviseAdverseSlope,
  adviseConveyanceJump,
  adviseLowEnds,
];

/** What a careful modeller would look at again, from upstream to downstream. */
export const adviseReach = (sections: ReachSection[]): Advice[] =>
  RULES.flatMap((rule) => rule(sections)).sort((a, b) => a.chainage - b.chainage);

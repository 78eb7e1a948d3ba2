import type { Advice, AdviceCode } from '@/shared/reaches/types';

export const ADVICE_NAMES: Record<AdviceCode, string> = {
  spacing: 'Sections far apart',
  adverseSlope: 'Bed rises downstream',
  conveyanceJump: 'Conveyance changes suddenly',
  noBanks: 'Bank marks missing',
  roughnessRange: 'Roughness out of the usual range',
  lowEnds: 'Ends of the section low',
};

export interface AdviceGroup {
  code: AdviceCode;
  items: Advice[];
}

/** Advice of one kind together, in the order in which the kinds first come; within a kind by place. */
export function groupAdvice(advice: readonly Advice[]): AdviceGroup[] {
  const groups = new Map<AdviceCode, Advice[]>();
  for (const one of advice) {
    const items = groups.get(one.code);
    if (items) items.push(one);
    else groups.set(one.code, [one]);
  }
  return [...groups].map(([code, items]) => ({
    code,
    items: items.sort((a, b) => a.chainage - b.chainage),
  }));
}

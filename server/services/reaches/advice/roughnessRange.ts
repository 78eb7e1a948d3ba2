import { ROUGHNESS_RANGE, ROUGHNESS_SOURCE } from '../../../../shared/reaches/roughnessTable';
import { named, type AdviceRule } from './types';

export const adviseRoughness: AdviceRule = (sections) => {
  const bare = sections.filter(({ roughness }) => roughness.length === 0);
  const ids = bare.map(({ id }) => id);
  const missing =
    bare.length === 0
      ? []
      : [
          {
            code: 'roughnessRange' as const,
            sectionIds: ids,
            chainage: bare[0].chainage,
            message: `${named(ids)} ${ids.length === 1 ? 'has' : 'have'} no roughness.`,
            reason:
              "The survey gave no Manning's n. A run can be asked for when every section has it.",
            source: ROUGHNESS_SOURCE,
          },
        ];
  const { min, max } = ROUGHNESS_RANGE;
  const outside = sections.flatMap(({ id, chainage, roughness }) => {
    const odd = [...new Set(roughness.map(([, n]) => n))].filter((n) => n < min || n > max);
    if (odd.length === 0) return [];
    return [
      {
        code: 'roughnessRange' as const,
        sectionIds: [id],
        chainage,
        message: `${id} has a Manning's n of ${odd.join(' and ')}.`,
        reason: `Published values lie between ${min} and ${max}.`,
        source: ROUGHNESS_SOURCE,
      },
    ];
  });
  return [...missing, ...outside];
};

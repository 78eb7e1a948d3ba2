import { named, type AdviceRule } from './types';

/** All in one: a survey without marks is one matter, not one a section. */
export const adviseMissingBanks: AdviceRule = (sections) => {
  const bare = sections.filter(({ banks }) => !banks);
  if (bare.length === 0) return [];
  const ids = bare.map(({ id }) => id);
  return [
    {
      code: 'noBanks',
      sectionIds: ids,
      chainage: bare[0].chainage,
      message: `${named(ids)} ${ids.length === 1 ? 'has' : 'have'} no bank marks.`,
      reason:
        'Without them channel and floodplain are joined from section to section as one, and conveyance just above bank is not divided.',
      source: 'Chow (1959), Open-Channel Hydraulics, section 6-5: channel of compound section',
    },
  ];
};

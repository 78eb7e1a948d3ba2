import type { Embankment } from '../../case/caseFile';
import type { Section } from '../../surveys/types';

/** Both embankments, where there are any, each changed alike; to be spread into a section. */
export function mapEmbankments(
  { embankments }: Pick<Section, 'embankments'>,
  change: (embankment: Embankment) => Embankment,
): Pick<Section, 'embankments'> {
  if (!embankments) return {};
  const { left, right } = embankments;
  return {
    embankments: { ...(left && { left: change(left) }), ...(right && { right: change(right) }) },
  };
}

import type { Section } from '../../shared/surveys/types';

/** A trapezoid with floodplains, falling 1 in 1000: bed 6 m wide, banks 3 m up. SI. */
export const plainSections = (count = 4, spacing = 500): Section[] =>
  Array.from({ length: count }, (_, i) => {
    const bed = 10 - 0.001 * spacing * i;
    return {
      id: `XS-${String(i + 1).padStart(2, '0')}`,
      chainage: i * spacing,
      points: [
        [0, bed + 6],
        [10, bed + 3.2],
        [20, bed + 3],
        [26, bed],
        [32, bed],
        [38, bed + 3],
        [48, bed + 3.2],
        [58, bed + 6],
      ],
      roughness: [
        [0, 0.06],
        [20, 0.035],
        [38, 0.06],
      ],
      banks: [20, 38],
      coordinates: null,
    };
  });

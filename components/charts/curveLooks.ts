import type { Colours } from '@/components/theme/tokens';

export type MarkShape = 'circle' | 'square' | 'triangle' | 'diamond' | 'cross';

export interface CurveLook {
  colour: keyof Colours;
  dash?: string;
  shape: MarkShape;
  width: number;
}

/** Colour, dash and mark go together: each of them alone tells one curve from another. */
export const CURVE_LOOKS: readonly CurveLook[] = [
  { colour: 'water', shape: 'circle', width: 2 },
  { colour: 'ink', dash: '9 5', shape: 'square', width: 1.75 },
  { colour: 'earth', dash: '3 4', shape: 'triangle', width: 2 },
  { colour: 'soft', dash: '12 4 3 4', shape: 'diamond', width: 1.75 },
];
/** What was observed: open crosses in ink, never a line. */
export const OBSERVED_LOOK = 4;
const OBSERVED: CurveLook = { colour: 'ink', shape: 'cross', width: 1.5 };

export const lookOf = (look: number): CurveLook =>
  look === OBSERVED_LOOK ? OBSERVED : CURVE_LOOKS[look % CURVE_LOOKS.length];

import { fillBetween } from '@/shared/reaches/edit/interpolateSections';
import { proposeBanks } from '@/shared/reaches/edit/proposeBanks';
import { reverseOffsets } from '@/shared/reaches/edit/reverseOffsets';
import { shiftDatum } from '@/shared/reaches/edit/shiftDatum';
import { thinningCost, thinPoints, type ThinningCost } from '@/shared/reaches/edit/thinPoints';
import type { Section } from '@/shared/surveys/types';

export const STRETCH_TOOLS = ['fill', 'thin', 'shift', 'turn', 'banks'] as const;
export type StretchTool = (typeof STRETCH_TOOLS)[number];

export const TOOL_NAMES: Record<StretchTool, string> = {
  fill: 'Put sections in between',
  thin: 'Thin the points out',
  shift: 'Raise or lower all levels',
  turn: 'Exchange left and right',
  banks: 'Propose bank marks',
};

/** What a tool would do to the sections it goes to. */
export interface Outcome {
  sections: readonly Section[];
  /** What it comes to, said before it is done. */
  words: string;
  cost?: { id: string; cost: ThinningCost }[];
}

/**
 * What a tool makes of the sections; `amount` is its spacing, tolerance or rise, m, null where it is not given. Throws a
 * RangeError with words for the person where it cannot be.
 */
export function tryTool(
  tool: StretchTool,
  sections: readonly Section[],
  ids: readonly string[],
  amount: number | null,
): Outcome | null {
  const chosen = new Set(ids);
  const each = (change: (section: Section) => Section) =>
    sections.map((section) => (chosen.has(section.id) ? change(section) : section));
  if (chosen.size === 0) return null;
  switch (tool) {
    case 'fill':
      return amount === null ? null : filled(sections, chosen, amount);
    case 'thin':
      return amount === null ? null : thinned(sections, each, amount);
    case 'shift':
      return amount === null || amount === 0
        ? null
        : { sections: each((s) => shiftDatum(s, amount)), words: counted(chosen.size) };
    case 'turn':
      return { sections: each(reverseOffsets), words: counted(chosen.size) };
    case 'banks':
      return proposed(sections, each, chosen.size);
  }
}

const counted = (count: number) => (count === 1 ? '1 section' : `${count} sections`);

function filled(
  sections: readonly Section[],
  chosen: ReadonlySet<string>,
  spacing: number,
): Outcome {
  if (!(spacing > 0)) throw new RangeError('The spacing is above 0.');
  if (chosen.size < 2) throw new RangeError('Choose a stretch with two sections or more.');
  const made = fillBetween(sections, chosen, spacing);
  const count = made.length - sections.length;
  return {
    sections: made,
    words: count === 0 ? 'No gap is wider than that.' : `${counted(count)} more`,
  };
}

function thinned(
  sections: readonly Section[],
  each: (change: (section: Section) => Section) => Section[],
  tolerance: number,
): Outcome {
  if (!(tolerance > 0)) throw new RangeError('The tolerance is above 0.');
  const made = each((section) => thinPoints(section, tolerance));
  const cost = made.flatMap((section, i) =>
    section === sections[i] ? [] : [{ id: section.id, cost: thinningCost(sections[i], section) }],
  );
  const out = cost.reduce((sum, { cost: c }) => sum + c.pointsBefore - c.pointsAfter, 0);
  return {
    sections: made,
    cost,
    words:
      out === 0
        ? 'No point can be left out at that tolerance.'
        : `${out} points fewer in ${counted(cost.length)}`,
  };
}

function proposed(
  sections: readonly Section[],
  each: (change: (section: Section) => Section) => Section[],
  count: number,
): Outcome {
  const made = each((section) => {
    const proposal = proposeBanks(section);
    return proposal ? { ...section, banks: proposal.banks } : section;
  });
  const set = made.filter((section, i) => section !== sections[i]).length;
  return {
    sections: made,
    words: `Marks for ${set} of ${counted(count)}; the others stay as they are`,
  };
}

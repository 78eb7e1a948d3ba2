import type { ChecklistItem } from '../../../../shared/review/types';
import { asSaid, sayIn } from '../../../../shared/units/message';
import type { UnitSystem } from '../../../../shared/units/units';
import { breach } from './breach';
import { calibration } from './calibration';
import { dryCells } from './dryCells';
import { gridSize } from './gridSize';
import { initialState } from './initialState';
import { outletInfluence } from './outletInfluence';
import { QUESTIONS } from './questions';
import { roughness } from './roughness';
import { sectionEnds } from './sectionEnds';
import { suddenFailure } from './suddenFailure';
import { supercritical } from './supercritical';
import { surveyAdvice } from './surveyAdvice';
import { timeStep } from './timeStep';
import type { ChecklistFacts, ChecklistRule } from './types';
import { volumeBalance } from './volumeBalance';
import { warnings } from './warnings';

/** In the order in which they are read. A new item is one file and one line. */
const RULES: ChecklistRule[] = [
  volumeBalance,
  timeStep,
  dryCells,
  supercritical,
  outletInfluence,
  surveyAdvice,
  gridSize,
  calibration,
  roughness,
  sectionEnds,
  initialState,
  breach,
  suddenFailure,
  warnings,
  ...QUESTIONS,
];

/** The items with their words in these units. */
export const checklistItems = (
  facts: ChecklistFacts,
  system: UnitSystem,
): Omit<ChecklistItem, 'answer'>[] =>
  RULES.flatMap((rule) => rule(facts) ?? []).map(({ finding, rule, ...item }) => ({
    ...item,
    finding: sayIn(system, asSaid(finding)),
    rule: sayIn(system, asSaid(rule)),
  }));

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
import type { ChecklistFacts, ChecklistRule, FoundItem } from './types';
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

export const checklistItems = (facts: ChecklistFacts): FoundItem[] =>
  RULES.flatMap((rule) => rule(facts) ?? []);

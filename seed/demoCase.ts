import type { CaseFile } from '../shared/case/caseFile';
import { buildCase } from '../shared/scenarios/buildCase';
import { lowerVeshall } from './reaches/lowerVeshall';
import { quenlowValley } from './reaches/quenlowValley';
import { damFailure, designFlood } from './scenarios';

/** The design flood on the Lower Veshall as a case file, without a database. */
export function demoCase(): CaseFile {
  const sections = lowerVeshall();
  return buildCase(designFlood(1, sections), sections, 'Lower Veshall at Tornick: 1 in 100 year');
}

/** The failing dam on the Quenlow as a case file. */
export function damBreakCase(): CaseFile {
  const sections = quenlowValley();
  return buildCase(damFailure(1, sections), sections, 'Quenlow valley: sudden failure of the dam');
}

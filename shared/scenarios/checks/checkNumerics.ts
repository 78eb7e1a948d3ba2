import { CASE_LIMITS } from '../../case/caseLimits';
import type { ScenarioBody } from '../schemas';
import { inflowOf, peakOf } from '../hydrographs';
import type { Findings } from './Findings';
import type { ReachFacts } from './reachFacts';
import { q, say } from '../../units/message';

/** Points on the rising limb that a flood wave needs in time (Fread & Lewis 1993; common practice). */
const POINTS_ON_RISE = 20;

export function checkNumerics(body: ScenarioBody, reach: ReachFacts, findings: Findings) {
  const { cellSize, duration, outputInterval, courant, dryDepth } = body.numerics;
  const hasCells = findings.number('numerics.cellSize', cellSize, 'Give the cell size.', {
    when: (size) => size <= 0,
    say: 'Cell size is above 0.',
  });
  if (hasCells) checkCellCount(cellSize!, reach, findings);
  const hasDuration = findings.number('numerics.duration', duration, 'Give how long to route.', {
    when: (time) => time <= 0 || time > CASE_LIMITS.duration,
    say: 'The duration is above 0 and at most thirty years.',
  });
  const hasInterval = findings.number(
    'numerics.outputInterval',
    outputInterval,
    'Give how often the result is kept.',
    { when: (time) => time <= 0, say: 'The interval is above 0.' },
  );
  if (hasDuration && hasInterval)
    checkOutputs(duration!, outputInterval!, reach.sections.length, findings);
  if (courant !== null && !(courant > 0 && courant <= 1))
    findings.fault('numerics.courant', 'The Courant number lies above 0 and not above 1.');
  if (dryDepth !== null && !(dryDepth > 0 && dryDepth <= 0.1))
    findings.fault(
      'numerics.dryDepth',
      say`The dry depth lies above 0 and not above ${q(0.1, 'depth')}.`,
    );
  const peak = peakOf(inflowOf(body.upstream));
  if (hasInterval && peak && peak.time > 0 && outputInterval! > peak.time / POINTS_ON_RISE)
    findings.doubt(
      'numerics.outputInterval',
      `The rising limb is kept at fewer than ${POINTS_ON_RISE} times; its curve will look cornered.`,
    );
}

function checkCellCount(cellSize: number, reach: ReachFacts, findings: Findings) {
  const cells = Math.max(1, Math.round(reach.length / cellSize));
  if (cells > CASE_LIMITS.cells)
    findings.fault(
      'numerics.cellSize',
      say`That makes ${cells.toLocaleString('en-GB')} cells; at most ${CASE_LIMITS.cells.toLocaleString('en-GB')} are routed. Use ${q(Math.ceil(reach.length / CASE_LIMITS.cells), 'length')} or more.`,
    );
  else if (cellSize > reach.length / 2)
    findings.fault('numerics.cellSize', 'The reach needs two cells or more.');
  else if (cellSize > reach.leastSpacing)
    findings.doubt(
      'numerics.cellSize',
      say`Cells are longer than the least distance of two sections, ${q(reach.leastSpacing, 'length', { decimals: 0 })}: what lies between is smoothed.`,
    );
}

function checkOutputs(duration: number, interval: number, sections: number, findings: Findings) {
  const outputs = Math.ceil(duration / interval) + 1;
  const most = Math.min(
    CASE_LIMITS.outputTimes,
    Math.floor(CASE_LIMITS.outputValues / Math.max(1, sections)),
  );
  if (interval > duration)
    findings.fault('numerics.outputInterval', 'The interval is longer than the run.');
  else if (outputs > most)
    findings.fault(
      'numerics.outputInterval',
      `That keeps ${outputs.toLocaleString('en-GB')} times; at most ${most.toLocaleString('en-GB')} fit this reach. Use ${Math.ceil(duration / (most - 1))} s or more.`,
    );
}

import { CASE_LIMITS } from '../../../case/caseLimits';
import { crestPoints, highestOf } from '../../../structures/crests';
import type { ScenarioBody } from '../../schemas';
import type { BreachBody } from '../../structures/schemas';
import type { Findings } from '../Findings';
import type { ReachFacts } from '../reachFacts';
import { checkCrest } from './checkCrest';
import { q, say } from '../../../units/message';

export function checkBreach(
  breach: BreachBody,
  path: string,
  findings: Findings,
  { numerics }: ScenarioBody,
  reach: ReachFacts,
) {
  const { bottomLevel, startLevel, formationTime } = breach;
  const hasCrest = checkCrest(findings, path, breach, 'Give the crest of the dam.');
  checkTrigger(breach, path, findings, numerics.duration);
  findings.number(
    `${path}.formationTime`,
    formationTime,
    'Give the formation time; take it from an estimate below, or 0 for a sudden failure.',
    {
      when: (time) => time < 0 || time > CASE_LIMITS.duration,
      say: 'The formation time is not negative.',
    },
  );
  const hasWidth = findings.number(
    `${path}.bottomWidth`,
    breach.bottomWidth,
    'Give the width of the full breach at its bottom; take it from an estimate below.',
    { when: (width) => width <= 0 || width > 1e5, say: 'The width is above 0.' },
  );
  const hasBottom = findings.number(
    `${path}.bottomLevel`,
    bottomLevel,
    'Give the level to which the breach grows down.',
  );
  findings.number(`${path}.sideSlope`, breach.sideSlope, 'Give the slope of its sides.', {
    when: (slope) => slope < 0 || slope > 20,
    say: 'The side slope, horizontal to vertical, lies between 0 and 20.',
  });
  checkCoefficients(breach, path, findings);
  if (breach.mode === 'piping')
    findings.number(`${path}.startLevel`, startLevel, 'Give the level at which the pipe begins.');
  if (hasBottom && startLevel !== null && startLevel < bottomLevel!)
    findings.fault(`${path}.startLevel`, 'It begins below its own bottom; a breach grows down.');
  if (hasCrest) checkPlace(breach, path, findings, hasWidth);
  if (hasBottom && breach.chainage !== null && bottomLevel! < reach.bedAt(breach.chainage) - 0.05)
    findings.doubt(
      `${path}.bottomLevel`,
      say`It lies below the bed there, which is at ${q(reach.bedAt(breach.chainage), 'elevation')}.`,
    );
}

function checkTrigger(
  { trigger, triggerTime, triggerStage }: BreachBody,
  path: string,
  findings: Findings,
  duration: number | null,
) {
  if (trigger === 'stage') {
    findings.number(
      `${path}.triggerStage`,
      triggerStage,
      'Give the stage of the water above it at which it begins to fail.',
    );
    return;
  }
  const sound = findings.number(
    `${path}.triggerTime`,
    triggerTime,
    'Give when it begins to fail, from the start of the run.',
    {
      when: (time) => time < 0 || time > CASE_LIMITS.duration,
      say: 'The time is counted from the start of the run and not negative.',
    },
  );
  if (sound && duration !== null && triggerTime! >= duration)
    findings.doubt(`${path}.triggerTime`, 'The run ends before the dam begins to fail.');
}

function checkCoefficients(
  { weirCoefficient, orificeCoefficient }: BreachBody,
  path: string,
  findings: Findings,
) {
  if (weirCoefficient !== null)
    findings.number(`${path}.weirCoefficient`, weirCoefficient, '', {
      when: (c) => c <= 0 || c > 4,
      say: say`The coefficient is above 0; ${q(1.7, 'weirCoefficient')} is a broad crest.`,
    });
  if (orificeCoefficient !== null)
    findings.number(`${path}.orificeCoefficient`, orificeCoefficient, '', {
      when: (c) => c <= 0 || c > 1,
      say: 'The coefficient lies above 0 and not above 1.',
    });
}

/** The breach against the crest that it is cut into. */
function checkPlace(breach: BreachBody, path: string, findings: Findings, hasWidth: boolean) {
  const { offsets, bottomWidth } = breach;
  const [left, right] = [offsets[0], offsets[offsets.length - 1]];
  const centre = breach.centre ?? 0.5 * (left + right);
  if (!Number.isFinite(centre)) findings.fault(`${path}.centre`, 'Write a number.');
  else if (centre < left || centre > right)
    findings.fault(`${path}.centre`, 'The middle of the breach lies outside the crest.');
  else if (
    hasWidth &&
    (centre - 0.5 * bottomWidth! < left - 1e-6 || centre + 0.5 * bottomWidth! > right + 1e-6)
  )
    findings.fault(
      `${path}.bottomWidth`,
      'The breach reaches beyond the crest. Make it narrower, move its middle, or lengthen the crest.',
    );
  const top = highestOf(crestPoints(breach));
  for (const key of ['bottomLevel', 'startLevel'] as const) {
    const level = breach[key];
    if (level !== null && level > top)
      findings.fault(`${path}.${key}`, 'It lies above the highest point of the crest.');
  }
}

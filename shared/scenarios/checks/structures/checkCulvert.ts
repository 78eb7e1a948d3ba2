import type { CulvertBody } from '../../structures/schemas';
import type { Findings } from '../Findings';
import { checkCoefficient } from './checkCoefficient';
import { checkCrest } from './checkCrest';
import { q, say } from '../../../units/message';

/** Fall over length of a barrel that cannot be meant. */
const STEEPEST = 0.5;

export function checkCulvert(culvert: CulvertBody, path: string, findings: Findings) {
  const { shape, barrels, invertUp, invertDown } = culvert;
  const size = (key: 'diameter' | 'width' | 'height', what: string) =>
    findings.number(`${path}.${key}`, culvert[key], `Give the ${what} of a barrel.`, {
      when: (value) => value <= 0 || value > 100,
      say: say`The ${what} is above 0 and not above ${q(100, 'length')}.`,
    });
  if (shape === 'circular') size('diameter', 'diameter');
  else {
    size('width', 'width');
    size('height', 'height');
  }
  findings.number(`${path}.barrels`, barrels, 'Give the number of barrels.', {
    when: (count) => count < 1 || count > 100 || !Number.isInteger(count),
    say: 'The number of barrels is a whole number from 1 to 100.',
  });
  findings.number(`${path}.n`, culvert.n, "Give Manning's n of the barrel; concrete 0.012.", {
    when: (n) => n <= 0 || n > 1,
    say: "Manning's n lies above 0 and not above 1.",
  });
  const hasLength = findings.number(
    `${path}.length`,
    culvert.length,
    'Give the length of the barrel.',
    { when: (length) => length <= 0 || length > 1e4, say: 'The length is above 0.' },
  );
  const hasUp = findings.number(
    `${path}.invertUp`,
    invertUp,
    'Give the level of the invert at its upstream end.',
  );
  const hasDown = findings.number(
    `${path}.invertDown`,
    invertDown,
    'Give the level of the invert at its downstream end.',
  );
  if (hasLength && hasUp && hasDown) {
    const slope = (invertUp! - invertDown!) / culvert.length!;
    if (Math.abs(slope) > STEEPEST)
      findings.fault(
        `${path}.invertDown`,
        'That makes the barrel steeper than 1 in 2. Check the inverts and the length.',
      );
    else if (slope < 0)
      findings.doubt(`${path}.invertDown`, 'The barrel rises in the direction of the river.');
  }
  if (culvert.inlet.startsWith('box') !== (shape === 'box'))
    findings.fault(
      `${path}.inlet`,
      shape === 'box' ? 'Choose an inlet of a box.' : 'Choose an inlet of a pipe.',
    );
  checkCrest(findings, path, culvert, null);
  checkCoefficient(findings, `${path}.crestCoefficient`, culvert.crestCoefficient);
}

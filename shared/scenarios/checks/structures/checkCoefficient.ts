import type { Findings } from '../Findings';

/** What is usual of C_d: Bos (1989), Discharge Measurement Structures; Chow (1959). */
const USUAL = { least: 0.5, most: 1.1 };

/** A discharge coefficient, where it is given. */
export function checkCoefficient(findings: Findings, path: string, value: number | null) {
  if (value === null) return;
  const sound = findings.number(path, value, '', {
    when: (coefficient) => coefficient <= 0 || coefficient > 2,
    say: 'The coefficient lies above 0 and not above 2.',
  });
  if (sound && (value < USUAL.least || value > USUAL.most))
    findings.doubt(
      path,
      `Discharge coefficients lie between ${USUAL.least} and ${USUAL.most} as a rule. Is it C_d, which has no unit?`,
    );
}

/** A coefficient of contraction of the jet under a gate or a deck, where it is given. */
export function checkContraction(findings: Findings, path: string, value: number | null) {
  if (value !== null)
    findings.number(path, value, '', {
      when: (coefficient) => coefficient < 0.5 || coefficient > 1,
      say: 'The coefficient of contraction lies between 0.5 and 1.',
    });
}

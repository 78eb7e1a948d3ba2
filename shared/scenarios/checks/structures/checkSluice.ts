import type { SluiceBody } from '../../structures/schemas';
import { q, say } from '../../../units/message';
import { checkSeries } from '../checkSeries';
import type { Findings } from '../Findings';
import { checkContraction } from './checkCoefficient';

export function checkSluice(sluice: SluiceBody, path: string, findings: Findings) {
  findings.number(`${path}.width`, sluice.width, 'Give the clear width of the gates.', {
    when: (width) => width <= 0 || width > 1e4,
    say: say`The width is above 0 and not above ${q(1e4, 'length', { decimals: 0 })}.`,
  });
  findings.number(`${path}.sill`, sluice.sill, 'Give the level of the sill.');
  checkSeries(findings, {
    path,
    names: ['times', 'openings'],
    columns: [sluice.times, sluice.openings],
    missing: 'Give the opening above the sill against time; one row holds throughout.',
    first: 'Time',
    value: (opening) => (opening < 0 ? 'An opening cannot be negative; 0 is closed.' : null),
  });
  checkContraction(findings, `${path}.contraction`, sluice.contraction);
}

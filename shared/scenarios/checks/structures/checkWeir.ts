import type { WeirBody } from '../../structures/schemas';
import type { Findings } from '../Findings';
import { checkCrest } from './checkCrest';
import { checkCoefficient } from './checkCoefficient';

export function checkWeir(weir: WeirBody, path: string, findings: Findings) {
  checkCrest(findings, path, weir, 'Give the crest: offset and level of its points.');
  checkCoefficient(findings, `${path}.coefficient`, weir.coefficient);
}

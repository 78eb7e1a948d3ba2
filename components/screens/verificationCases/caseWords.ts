import { goesOn } from '@/components/queries/verificationCases';
import type { BadgeTone } from '@/components/ui/Badge';
import type { VerificationCaseRow } from '@/shared/verificationCases/types';
import { formatError } from '@/shared/verificationCases/words';

interface State {
  label: string;
  tone: BadgeTone;
}

/** How a case stands, in two words: what goes on first, then what was found last. */
export function stateOf({ latest, result }: VerificationCaseRow): State {
  if (latest?.state === 'queued') return { label: 'Waiting', tone: 'earth' };
  if (latest?.state === 'running')
    return { label: `Running, ${Math.floor(100 * latest.progress)} %`, tone: 'earth' };
  if (latest?.state === 'failed') return { label: 'Stopped with a fault', tone: 'brick' };
  if (result)
    return result.within
      ? { label: 'Within bounds', tone: 'moss' }
      : { label: 'Outside bounds', tone: 'brick' };
  if (latest?.state === 'cancelled') return { label: 'Cancelled', tone: 'soft' };
  return { label: 'Not run yet', tone: 'soft' };
}

/** The numbers of the last result on its finest grid; null before there is one. */
export function errorWords({ result }: VerificationCaseRow): string | null {
  if (!result) return null;
  const { stage, flow } = result;
  if (stage.max < 1e-12 && flow.max < 1e-9) return 'No difference but rounding';
  return `Mean difference ${formatError(stage.l1)} m, ${formatError(flow.l1)} m³/s`;
}

/** All of them in a sentence. */
export function countWords(cases: readonly VerificationCaseRow[]): string {
  const count = (test: (row: VerificationCaseRow) => boolean) => cases.filter(test).length;
  const within = count(({ result }) => result?.within === true);
  if (cases.every((row) => row.result === null && row.latest === null))
    return `None of the ${cases.length} cases has been run yet.`;
  const others = [
    [count(({ result }) => result?.within === false), 'outside'],
    [count(goesOn), 'under way'],
    [count(({ latest }) => latest?.state === 'failed'), 'stopped with a fault'],
    [count((row) => row.result === null && !goesOn(row)), 'without a result'],
    [count(({ result }) => result?.isCurrent === false), 'of an older solver'],
  ] as const;
  const rest = others.flatMap(([n, word]) => (n > 0 ? [`${n} ${word}`] : []));
  return `${[`${within} of ${cases.length} within their bounds`, ...rest].join(', ')}.`;
}

import type { Fault } from '@/shared/errors';

/** Parts of the editor, in the order of the page. */
export const PARTS = [
  'details',
  'upstream',
  'laterals',
  'structures',
  'roughnessFactors',
  'localLosses',
  'downstream',
  'initial',
  'numerics',
] as const;
export type Part = (typeof PARTS)[number];

export const PART_TITLES: Record<Part, string> = {
  details: 'Scenario',
  upstream: 'Upstream end',
  laterals: 'Lateral inflows',
  structures: 'Structures',
  roughnessFactors: 'Roughness by stretch and depth',
  localLosses: 'Losses at narrows and widenings',
  downstream: 'Outlet',
  initial: 'Initial state',
  numerics: 'Numerical settings',
};

/**
 * Where on the page a fault of the body is shown. A series is edited as one table, so a fault of its third value
 * stands at the table: `upstream.times[2]` at `upstream.values`.
 */
export const placeOf = (path: string): string =>
  path.replace(
    /\.(times|flows|stages|chainages|volumes|openings|offsets|levels|depths|factors)(\[\d+\].*)?$/,
    '.values',
  );

/** Identifier of the place in the document, for jumping to it. */
export const anchorOf = (path: string): string =>
  `scenario-${placeOf(path)
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/-$/, '')}`;

export function partOf(path: string): Part {
  const head = /^[a-zA-Z]+/.exec(path)?.[0];
  return PARTS.find((part) => part === head) ?? 'details';
}

/** What is said at one place: the messages of its faults, the first of a long row of them counted. */
export function messageAt(faults: readonly Fault[], path: string): string | undefined {
  const here = faults.filter((fault) => placeOf(fault.path) === placeOf(path));
  if (here.length === 0) return undefined;
  const [{ path: first, message }] = here;
  const row = /\[(\d+)\]$/.exec(first);
  const placed =
    row && placeOf(first) !== first ? `Row ${Number(row[1]) + 1}: ${message}` : message;
  return here.length === 1 ? placed : `${placed} (and ${here.length - 1} more)`;
}

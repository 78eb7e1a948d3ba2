import type { SectionPoint } from '../../case/caseFile';

/** As much of a section as both a survey and a case file have. */
interface Ground {
  id: string;
  chainage: number;
  points: SectionPoint[];
}

/** How the ground that was routed departs from the survey, in words for the report: `as surveyed`, or what was changed. */
export function departureWords(surveyed: readonly Ground[], routed: readonly Ground[]): string {
  const before = new Map(surveyed.map((section) => [section.id, section]));
  const after = new Set(routed.map(({ id }) => id));
  const pairs = routed.flatMap((now) => {
    const was = before.get(now.id);
    return was ? [{ was, now }] : [];
  });
  const counts: [number, string][] = [
    [routed.length - pairs.length, 'added'],
    [surveyed.filter(({ id }) => !after.has(id)).length, 'taken out'],
    [
      pairs.filter(({ was, now }) => !samePoints(was.points, now.points)).length,
      'with other points',
    ],
    [pairs.filter(({ was, now }) => was.chainage !== now.chainage).length, 'at another chainage'],
  ];
  const said = counts.filter(([count]) => count > 0).map(([count, what]) => `${count} ${what}`);
  return said.length === 0 ? 'as surveyed' : `working geometry; sections: ${said.join(', ')}`;
}

const samePoints = (a: readonly SectionPoint[], b: readonly SectionPoint[]) =>
  a.length === b.length && a.every(([y, z], i) => y === b[i][0] && z === b[i][1]);

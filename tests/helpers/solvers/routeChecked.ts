import { routeCase, type RouteOptions } from '@/server/solvers';
import type { CaseFile } from '@/shared/case/caseFile';
import type { ResultFile } from '@/shared/case/resultFile';
import { validateCase } from '@/shared/case/validateCase';

/** Volume may be lost to rounding only. */
const VOLUME_TOLERANCE = 1e-12;

/** Routes a valid case and holds it to what every run must keep: finite numbers, no negative depth, nowhere a peak
 *  below the end state, and water neither made nor lost. */
export function routeChecked(caseFile: CaseFile, options?: RouteOptions): ResultFile {
  expect(validateCase(caseFile).faults).toEqual([]);
  const result = routeCase(caseFile, options);
  expect(Math.abs(result.volume.relativeError)).toBeLessThanOrEqual(VOLUME_TOLERANCE);
  const { cells, sections, volume, times } = result;
  for (const value of Object.values(volume)) expect(Number.isFinite(value)).toBe(true);
  for (const [name, values] of Object.entries<(number | null)[]>({ ...cells })) {
    const faulty = values.findIndex((value) => value !== null && !Number.isFinite(value));
    expect({ name, faulty }).toEqual({ name, faulty: -1 });
  }
  expect(cells.finalDepth.findIndex((depth) => depth < 0)).toBe(-1);
  const overPeak = cells.finalStage.findIndex((stage, i) => stage > cells.peakStage[i] + 1e-12);
  expect(overPeak).toBe(-1);
  for (const section of sections) {
    for (const name of ['stage', 'depth', 'flow', 'area', 'velocity', 'froude'] as const) {
      expect(section[name]).toHaveLength(times.length);
      const faulty = section[name].findIndex((value) => !Number.isFinite(value));
      expect({ id: section.id, name, faulty }).toEqual({ id: section.id, name, faulty: -1 });
    }
    expect(section.depth.findIndex((depth) => depth < 0)).toBe(-1);
  }
  return result;
}

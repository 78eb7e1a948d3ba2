import type { SectionInput } from '@/shared/case/caseFile';
import { findRoot } from '@/server/solvers/exact/tools/findRoot';
import { buildCase, GRAVITY, steadyFlow, steadyStage } from '../../helpers/solvers/caseBuilders';
import { naturalProfile } from '../../helpers/solvers/naturalProfile';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { hydraulicsAt, stripsBetween } from '../../helpers/solvers/polygonHydraulics';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Ten kilometres of river with banks and floodplains, steady, cells of 25 m, against an adaptive integration of the
 *  gradually varied flow equation over the exact polygons, which shares nothing with the solver. */
const SLOPE = 0.0006;
const sections = naturalReach(7, { length: 10_000, spacing: 250, slope: SLOPE });

function normalStage(section: SectionInput, flow: number): number {
  const strips = stripsBetween(section, section, 0);
  const bed = Math.min(...section.points.map(([, z]) => z));
  const carried = (stage: number) => hydraulicsAt(strips, stage).conveyance * Math.sqrt(SLOPE);
  return findRoot((stage) => carried(stage) - flow, bed + 0.05, bed + 15);
}

function stageErrors(flow: number, cellSize: number) {
  const stageAtEnd = normalStage(sections[sections.length - 1], flow);
  const { cells } = routeChecked(
    buildCase({
      sections,
      upstream: { kind: 'inflow', ...steadyFlow(flow) },
      downstream: { kind: 'stage', ...steadyStage(stageAtEnd) },
      initial: { kind: 'steady' },
      numerics: { cellSize, duration: 7200, outputInterval: 7200 },
    }),
  );
  const places = [...cells.chainage].reverse();
  const exact = naturalProfile(sections, GRAVITY, flow, stageAtEnd, places).reverse();
  const errors = cells.finalStage.map((stage, i) => Math.abs(stage - exact[i]));
  const flowError = Math.max(...cells.finalFlow.map((found) => Math.abs(found / flow - 1)));
  return {
    mean: errors.reduce((sum, error) => sum + error, 0) / errors.length,
    largest: Math.max(...errors),
    flowError,
  };
}

describe('steady flow in a natural reach', () => {
  it.each([
    // Flow (m³/s): in the channel, over bank, high over the plains. Limits of the mean and the largest error in cells of
    // 25 m: a quarter more than measured. The largest stand where the ground has an edge, at surveyed sections.
    [60, 3.4e-4, 3e-3],
    [250, 3.4e-4, 1.8e-3],
    [700, 2.4e-4, 1.6e-3],
  ])('%d m³/s', (flow, meanLimit, largestLimit) => {
    const fine = stageErrors(flow, 25);
    expect(fine.flowError).toBeLessThan(1e-8);
    expect(fine.mean).toBeLessThan(meanLimit);
    expect(fine.largest).toBeLessThan(largestLimit);
    const coarse = stageErrors(flow, 50);
    expect(Math.log2(coarse.mean / fine.mean)).toBeGreaterThan(1.7);
  });
});

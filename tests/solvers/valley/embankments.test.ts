import type { SectionInput } from '@/shared/case/caseFile';
import { ruledSurface, sectionAt } from '@/server/solvers/geometry/ruledSurface';
import { partedSweep } from '@/server/solvers/geometry/partedSweep';
import { buildCase, steadyFlow } from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** A channel 20 m wide and 3 m deep; behind an embankment up to 4 m on its right lies ground 100 m wide and 1 m up. */
function polder(chainage: number, bed: number, crest = 4): SectionInput {
  return {
    id: `P${chainage}`,
    chainage,
    points: [
      [0, bed + 8],
      [0, bed],
      [20, bed],
      [20, bed + 3],
      [20, bed + 1],
      [120, bed + 1],
      [120, bed + 8],
    ].filter(([x, z], k) => !(k === 4 && x === 20 && z === bed + 1)) as [number, number][],
    roughness: [[0, 0.03]],
    embankments: { right: { offset: 20, crest: bed + crest } },
  };
}

/** Sections of the polder, the embankment's inner slope made a plain fall from its top at 20 m to the ground at 22 m. */
const section = (chainage: number, bed: number, crest?: number): SectionInput => {
  const made = polder(chainage, bed, crest);
  made.points.splice(4, 0, [22, bed + 1]);
  return made;
};

const behindAt = (stage: number): number =>
  98 * (stage - 1) + 0.5 * 2 * (Math.min(stage, 3) - 1) + 2 * Math.max(0, stage - 3);

describe('low embankments', () => {
  it('hold the ground behind them dry up to the crest, and fill it over 0.2 m above', () => {
    const shape = sectionAt(ruledSurface(section(0, 0), section(1, 0)), 0);
    const areas = (stages: number[]) => partedSweep(shape, Float64Array.from(stages), false).area;
    const [low, crest, half, full, high] = areas([2, 4, 4.1, 4.2, 5]);
    expect(low).toBeCloseTo(40, 12);
    expect(crest).toBeCloseTo(80, 12);
    expect(half).toBeCloseTo(82 + 0.5 * behindAt(4.1), 10);
    expect(full).toBeCloseTo(84 + behindAt(4.2), 10);
    expect(high).toBeCloseTo(100 + behindAt(5), 10);
  });

  it('let what is behind them flow from where it is full, wholly 0.5 m higher', () => {
    const shape = sectionAt(ruledSurface(section(0, 0), section(1, 0)), 0);
    const { flowArea } = partedSweep(shape, Float64Array.of(4.2, 4.45, 4.7), false);
    expect(flowArea[0]).toBeCloseTo(84, 10);
    expect(flowArea[1]).toBeCloseTo(89 + 0.5 * behindAt(4.45), 10);
    expect(flowArea[2]).toBeCloseTo(94 + behindAt(4.7), 10);
  });

  it.each([1.5, 3.9, 4.1, 4.4, 6])('still water at %d m stays still', (stage) => {
    const { cells } = routeChecked(
      buildCase({
        sections: [section(0, 0.6), section(300, 0.5), section(800, 0)],
        upstream: { kind: 'wall' },
        downstream: { kind: 'wall' },
        initial: { kind: 'still', stage },
        numerics: { cellSize: 20, duration: 900, outputInterval: 900 },
      }),
    );
    expect(Math.max(...cells.finalStage.map((eta) => Math.abs(eta - stage)))).toBeLessThan(1e-12);
    expect(Math.max(...cells.peakFlow.map(Math.abs))).toBeLessThan(1e-9);
  });

  it('still water stays still on a natural river with embankments and storage here and there', () => {
    const sections = naturalReach(3, { length: 2000, spacing: 200, slope: 0.0005 }).map(
      (one, k): SectionInput => {
        const [left, right] = one.banks!;
        const top = Math.max(
          ...one.points.filter(([x]) => x === left || x === right).map((p) => p[1]),
        );
        return {
          ...one,
          ...(k % 3 !== 0 && {
            embankments: {
              left: { offset: left, crest: top + 0.3 },
              right: { offset: right, crest: top + 0.5 },
            },
          }),
          ...(k % 2 === 0 && { storage: [{ from: 0, to: 0.5 * left, flowsAbove: top + 0.4 }] }),
        };
      },
    );
    for (const stage of [2, 4.1, 5]) {
      const { cells } = routeChecked(
        buildCase({
          sections,
          upstream: { kind: 'wall' },
          downstream: { kind: 'wall' },
          initial: { kind: 'still', stage },
          numerics: { cellSize: 20, duration: 600, outputInterval: 600, momentum: 'compound' },
        }),
      );
      expect(Math.max(...cells.finalStage.map((eta) => Math.abs(eta - stage)))).toBeLessThan(1e-12);
    }
  });

  it('below their crests a flood runs as in the channel alone; over them it is held back', () => {
    const flood = (sections: SectionInput[], peak: number) =>
      routeChecked(
        buildCase({
          sections,
          upstream: { kind: 'inflow', times: [0, 1800, 3600], flows: [20, peak, 20] },
          downstream: { kind: 'normalDepth', slope: 0.0005 },
          initial: { kind: 'steady' },
          numerics: { cellSize: 40, duration: 7200, outputInterval: 300 },
        }),
      );
    const reach = (crest: number) =>
      [0, 2000, 4000].map((x) => section(x, 0.0005 * (4000 - x), crest));
    const dry = flood(reach(4), 60);
    expect(dry.sections[1].peak.depth).toBeLessThan(4);
    const high = flood(reach(7.5), 60);
    dry.sections[1].stage.forEach((stage, k) =>
      // The levels of the two tables stand at other heights.
      expect(Math.abs(stage - high.sections[1].stage[k])).toBeLessThan(2e-3),
    );
    const over = flood(reach(4), 300);
    const held = flood(reach(7.5), 300);
    expect(over.sections[1].peak.depth).toBeGreaterThan(4);
    expect(over.sections[2].peak.flow).toBeLessThan(0.8 * held.sections[2].peak.flow);
    expect(over.volume.final).toBeGreaterThan(1.3 * dry.volume.final);
  });

  it('do not let ground that lies lower than the river count as its bed', () => {
    const low = { ...section(0, 2), points: section(0, 2).points };
    low.points = low.points.map(([x, z]): [number, number] =>
      x > 20 && z < 4 ? [x, 0.5] : [x, z],
    );
    const { cells } = routeChecked(
      buildCase({
        sections: [low, { ...low, id: 'below', chainage: 500 }],
        upstream: { kind: 'inflow', ...steadyFlow(5) },
        downstream: { kind: 'wall' },
        initial: { kind: 'still', stage: 2.5 },
        numerics: { cellSize: 50, duration: 600, outputInterval: 600 },
      }),
    );
    expect(cells.bed.every((bed) => bed === 2)).toBe(true);
    expect(cells.initialStage.every((stage) => stage === 2.5)).toBe(true);
  });
});

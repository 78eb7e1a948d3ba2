import type { CaseFile } from '@/shared/case/caseFile';
import type { StructureInput } from '@/shared/case/structures';
import { buildCase, steadyFlow, steadyStage } from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { steadyStart } from '../../helpers/solvers/steadyStart';
import { channel } from '../structures/structureCases';

const weir: StructureInput = {
  kind: 'weir',
  id: 'weir',
  chainage: 1000,
  crest: [
    [0, 4],
    [20, 3.5],
    [60, 4.5],
  ],
  form: 'broad',
};

const river = (parts: Partial<CaseFile>): CaseFile =>
  buildCase({
    sections: naturalReach(5, { length: 2000, spacing: 200, slope: 0.001 }),
    upstream: { kind: 'inflow', ...steadyFlow(60) },
    downstream: { kind: 'normalDepth', slope: 0.001 },
    initial: { kind: 'steady' },
    numerics: { cellSize: 20, duration: 60, outputInterval: 60 },
    ...parts,
  });

describe('a steady start', () => {
  it.each<[string, Partial<CaseFile>]>([
    ['a river', {}],
    ['a weir', { structures: [weir] }],
    [
      'a withdrawal and local losses',
      {
        laterals: [{ from: 800, to: 900, ...steadyFlow(-15) }],
        localLosses: [{ from: 300, to: 1500, contraction: 0.1, expansion: 0.3 }],
      },
    ],
  ])('is the one that steps come to, without them: %s', (_, parts) => {
    const atOnce = steadyStart(river(parts), 'newton');
    const bySteps = steadyStart(river(parts), 'steps');
    expect(atOnce.residual).toBeLessThan(1e-8);
    expect(bySteps.residual).toBeLessThan(1e-8);
    expect(bySteps.steps).toBeGreaterThan(8 * atOnce.steps);
    atOnce.stage.forEach((stage, i) =>
      expect(Math.abs(stage - bySteps.stage[i])).toBeLessThan(1e-7),
    );
  });

  it('of a shooting river with a jump settles as well', () => {
    const sections = naturalReach(5, { length: 2000, spacing: 200, slope: 0.02 });
    const jump = river({
      sections,
      structures: [
        {
          ...weir,
          crest: [
            [0, 24],
            [60, 24],
          ],
        },
      ],
    });
    expect(steadyStart(jump, 'newton').residual).toBeLessThan(1e-8);
  });

  it('knows that a withdrawal takes no more than what comes', () => {
    const { residual, flow } = steadyStart(
      river({ laterals: [{ from: 1000, to: 1000, ...steadyFlow(-80) }] }),
      'newton',
    );
    expect(residual).toBeLessThan(1e-8);
    expect(flow[40]).toBeCloseTo(60, 6);
    expect(flow[60]).toBe(0);
  });
});

const gate: StructureInput = {
  kind: 'sluice',
  id: 'gate',
  chainage: 500,
  width: 10,
  sill: 0,
  times: [0],
  openings: [0],
};
const brief = { cellSize: 20, duration: 0.1, outputInterval: 0.1 };

describe('a steady start before what is shut', () => {
  it('says what holds the flow up', () => {
    const { warnings } = routeChecked(
      channel([gate], {
        upstream: { kind: 'inflow', ...steadyFlow(15) },
        downstream: { kind: 'normalDepth', slope: 0.0005 },
        initial: { kind: 'steady' },
        numerics: brief,
      }),
    );
    const { message, chainage } = warnings.find(({ code }) => code === 'initialNotSettled')!;
    expect(message).toContain('gate at chainage 500 m');
    expect(chainage).toBe(500);
  });

  it('begins with the water level with the stage upstream, without flow', () => {
    const { cells } = routeChecked(
      channel([gate], {
        upstream: { kind: 'stage', ...steadyStage(3) },
        downstream: { kind: 'stage', ...steadyStage(1) },
        initial: { kind: 'steady' },
        numerics: brief,
      }),
    );
    cells.chainage.forEach((x, i) => expect(cells.initialStage[i]).toBeCloseTo(x < 500 ? 3 : 1, 9));
    expect(Math.max(...cells.peakFlow.map(Math.abs))).toBeLessThan(1e-9);
  });

  it('lets no pool beyond stand higher than it would run back over', () => {
    const crestAt = (chainage: number, level: number): StructureInput => ({
      ...weir,
      id: `weir ${chainage}`,
      chainage,
      crest: [
        [0, level],
        [20, level],
      ],
    });
    const { cells } = routeChecked(
      channel([crestAt(400, 4), crestAt(800, 6)], {
        upstream: { kind: 'stage', ...steadyStage(3) },
        downstream: { kind: 'stage', ...steadyStage(1) },
        initial: { kind: 'steady' },
        numerics: brief,
      }),
    );
    cells.chainage.forEach((x, i) =>
      expect(cells.initialStage[i]).toBeCloseTo(x < 400 ? 3 : x < 800 ? 4 : 1, 9),
    );
  });

  it('begins empty where nothing comes', () => {
    const { cells } = routeChecked(
      channel([gate], {
        upstream: { kind: 'inflow', ...steadyFlow(0) },
        downstream: { kind: 'stage', ...steadyStage(1) },
        initial: { kind: 'steady' },
        numerics: brief,
      }),
    );
    expect(Math.max(...cells.initialStage)).toBeLessThan(1.01);
  });

  it('of a reservoir that stands lower than the pool below it releases nothing', () => {
    const { reservoir, cells } = routeChecked(
      channel(
        [
          {
            ...weir,
            chainage: 500,
            crest: [
              [0, 6],
              [20, 6],
            ],
          },
          { ...weir, id: 'outlet', chainage: 0 },
        ],
        {
          upstream: {
            kind: 'reservoir',
            stages: [0, 10],
            volumes: [0, 1e6],
            initialStage: 5,
            inflow: steadyFlow(0),
          },
          downstream: { kind: 'stage', ...steadyStage(1) },
          initial: { kind: 'steady' },
          numerics: brief,
        },
      ),
    );
    expect(reservoir!.release[0]).toBe(0);
    expect(cells.initialStage[0]).toBeCloseTo(6, 9);
  });
});

import { execFileSync } from 'node:child_process';
import type { StructureInput, WeirInput } from '@/shared/case/structures';
import { buildCase } from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { channel } from './structureCases';

/** A weir, a gate beside it and a bridge on a natural river in flood. */
function river(order: 1 | 2) {
  const sections = naturalReach(5, { length: 3000, spacing: 200, slope: 0.001 });
  const bedNear = (x: number) => {
    const near = sections.reduce((a, b) =>
      Math.abs(b.chainage - x) < Math.abs(a.chainage - x) ? b : a,
    );
    return Math.min(...near.points.map(([, z]) => z));
  };
  const bed = bedNear(1200);
  const structures: StructureInput[] = [
    {
      kind: 'weir',
      id: 'weir',
      chainage: 1200,
      form: 'broad',
      crest: [
        [0, bed + 3],
        [40, bed + 2],
      ],
    },
    {
      kind: 'sluice',
      id: 'gate',
      chainage: 1200,
      width: 4,
      sill: bed + 0.2,
      times: [0, 1800],
      openings: [0.3, 1.5],
    },
    {
      kind: 'bridge',
      id: 'bridge',
      chainage: 2200,
      piers: 'triangular',
      obstructed: 0.12,
      soffit: bedNear(2200) + 3,
      deck: [
        [0, bedNear(2200) + 5],
        [60, bedNear(2200) + 5],
      ],
    },
  ];
  return buildCase({
    sections,
    structures,
    upstream: { kind: 'inflow', times: [0, 1200, 4800], flows: [15, 250, 20] },
    downstream: { kind: 'normalDepth', slope: 0.001 },
    initial: { kind: 'steady' },
    numerics: { cellSize: 25, duration: 5400, outputInterval: 300, order },
  });
}

describe('structures together', () => {
  it.each([1, 2] as const)(
    'side by side and in a row, order %d: volume kept, the flood passed on',
    (order) => {
      const result = routeChecked(river(order));
      const [weir, gate, bridge] = result.structures!;
      expect(weir.chainage).toBe(gate.chainage);
      expect(gate.flow[0]).toBeGreaterThan(0);
      expect(weir.stageUp).toEqual(gate.stageUp);
      for (const { flow, stageUp, regime } of result.structures!) {
        expect(flow).toHaveLength(result.times.length);
        expect(flow.every(Number.isFinite)).toBe(true);
        expect(stageUp.every(Number.isFinite)).toBe(true);
        expect(regime).toHaveLength(result.times.length);
      }
      expect(weir.peak.flow + gate.peak.flow).toBeGreaterThan(100);
      expect(bridge.peak.flow).toBeGreaterThan(100);
    },
  );

  it('name where they were moved to', () => {
    const weir: WeirInput = {
      kind: 'weir',
      id: 'old weir',
      chainage: 507,
      form: 'broad',
      crest: [
        [0, 3],
        [20, 3],
      ],
    };
    const { warnings, structures } = routeChecked(channel([weir]));
    const moved = warnings.find(({ code }) => code === 'structureMoved');
    expect(moved?.message).toContain('old weir stands at chainage 507.00 m');
    expect(structures![0].chainage).toBe(500);
  });

  it('are computed alike from the command line', () => {
    const caseFile = river(2);
    const output = execFileSync('npm', ['run', '--silent', 'route', '--', '-'], {
      input: JSON.stringify(caseFile),
      encoding: 'utf8',
      maxBuffer: 64 * 1024 * 1024,
      stdio: ['pipe', 'pipe', 'ignore'],
    });
    expect(JSON.parse(output).structures).toEqual(routeChecked(caseFile).structures);
  }, 120_000);
});

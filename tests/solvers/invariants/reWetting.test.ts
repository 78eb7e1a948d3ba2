import { buildCase } from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** A river that is dry, carries a flood, runs dry and carries the same flood again: the second comes as the first did. */
it('a flood over a bed that fell dry is the flood over the dry bed', () => {
  const sections = naturalReach(14, { length: 3000, spacing: 200, slope: 0.003 });
  const flood = (start: number): [number, number][] => [
    [start, 0],
    [start + 900, 120],
    [start + 2700, 0],
  ];
  const second = 28_800;
  const series = [...flood(0), ...flood(second)];
  const { sections: found, volume } = routeChecked(
    buildCase({
      sections,
      upstream: {
        kind: 'inflow',
        times: series.map(([time]) => time),
        flows: series.map(([, flow]) => flow),
      },
      downstream: { kind: 'normalDepth', slope: 0.003 },
      initial: { kind: 'still', stage: -10 },
      numerics: { cellSize: 25, duration: second + 14_400, outputInterval: 60 },
    }),
  );
  const index = second / 60;
  found.slice(1).forEach(({ flow, depth }, k) => {
    const peak = (from: number) => Math.max(...flow.slice(from, from + 240));
    const [first, again] = [peak(0), peak(index)];
    // Dry but for the drops that hollows keep.
    expect(depth[index]).toBeLessThan(0.05);
    expect(first).toBeLessThan(k === 0 ? 120 : 119);
    expect(first).toBeGreaterThan(80);
    expect(Math.abs(again / first - 1)).toBeLessThan(1e-4);
    expect(Math.abs(flow.indexOf(again) - index - flow.indexOf(first))).toBeLessThanOrEqual(1);
  });
  expect(volume.final).toBeLessThan(1e-3 * volume.inflow);
});

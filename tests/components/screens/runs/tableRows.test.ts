import { tableRows } from '@/components/screens/runs/results/tableRows';

test('a long series is thinned, but its first, last and highest rows stay', () => {
  const times = Array.from({ length: 5761 }, (_, i) => i * 30);
  const values = times.map((t) => (t === 61_230 ? 44.66 : 40 + Math.sin(t / 9000)));
  const rows = tableRows({ times, values }, 150);
  expect(rows.length).toBeLessThanOrEqual(152);
  expect(rows[0].time).toBe(0);
  expect(rows.at(-1)?.time).toBe(172_800);
  expect(rows).toContainEqual({ time: 61_230, value: 44.66 });
});

test('a short one is whole', () => {
  expect(tableRows({ times: [0, 1], values: [5, 6] }, 150)).toHaveLength(2);
});

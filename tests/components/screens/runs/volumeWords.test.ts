import { volumeLines, volumeSentence } from '@/components/screens/runs/results/volumeWords';
import { summary } from './summary';

test('a balance that closes to rounding is said to close', () => {
  expect(volumeSentence(summary())).toBe(
    'The volume balance closes: less than 0.001 % is unaccounted for.',
  );
});

test('one that does not asks for the reason', () => {
  const { volume } = summary();
  const off = summary({ volume: { ...volume, error: -18_000, relativeError: -4e-4 } });
  expect(volumeSentence(off)).toContain('off by 0.040 %');
  expect(volumeLines(off, 'metric').at(-1)?.value).toBe('−18,000 m³, 0.040 %');
});

test('lateral flow is named by its direction and left out where there is none', () => {
  const names = (lateral: number) =>
    volumeLines(summary({ volume: { ...summary().volume, lateral } }), 'metric').map(
      ({ name }) => name,
    );
  expect(names(0)).toHaveLength(5);
  expect(names(500)).toContain('Came in along the way');
  expect(names(-500)).toContain('Taken out along the way');
});

test('volumes are told in the units of the study', () => {
  // 1000 m³ are 35,315 ft³: 1 ft = 0.3048 m exactly (NIST SP 811).
  expect(volumeLines(summary(), 'usCustomary')[0].value).toBe('35,315 ft³');
});

import {
  bandOf,
  estimateRows,
  timeBand,
} from '@/components/screens/scenarios/structures/estimateRows';
import type { DamInputs } from '@/shared/breach/breachEstimates';

const inputs: DamInputs = {
  waterDepth: 10,
  breachHeight: 10,
  damHeight: 10,
  waterVolume: 2e6,
  storage: 2e6,
  failure: 'overtopping',
  embankment: 'earthfill',
  erodibility: 'high',
  crestWidth: null,
  faceSlopes: null,
};
const rowOf = (id: string, change: Partial<DamInputs> = {}, sideSlope: number | null = null) =>
  estimateRows({ ...inputs, ...change }, sideSlope).find((row) => row.id === id)!;

describe('estimates of a breach as rows', () => {
  it('fill the fields so that the average width is that of the regression', () => {
    const { width, taken } = rowOf('froehlich2008');
    // One to one over 10 m: as wide on average as at mid height.
    expect(taken!.bottomWidth! + taken!.sideSlope! * 10).toBeCloseTo(width!.value, 0);
    expect(taken!.formationTime! % 60).toBe(0);
  });
  it('take the side slope that is typed where the authors give none', () => {
    expect(rowOf('usbr1988', {}, 0.5).taken!.sideSlope).toBe(0.5);
    expect(rowOf('usbr1988').taken!.sideSlope).toBe(1);
  });
  it('cannot be taken where an input is missing or the sides would meet', () => {
    expect(rowOf('macDonald1984').taken).toBeNull();
    expect(rowOf('froehlich1995', { waterVolume: 500 }).taken).toBeNull();
  });
  it('read with their bands in the units of the study', () => {
    const { width, formationTime } = rowOf('usbr1988');
    expect(bandOf(width, 'length', 'metric')).toBe('30.0 (13.5 to 99.0)');
    expect(bandOf(width, 'length', 'usCustomary')).toBe('98.4 (44.3 to 324.8)');
    expect(timeBand(formationTime)).toBe('0 h 20 (0 h 05 to 8 h 55)');
    expect(bandOf(null, 'length', 'metric')).toBe('–');
  });
});

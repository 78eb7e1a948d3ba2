import { createBreach } from '../../../server/solvers/structures/breach';

/** An orifice, Q = C_o A √(2g Δh): free to its middle, drowned by the difference of the stages (Henderson 1966, ch. 6). */
const GRAVITY = 9.80665;
const orifice = (area: number, head: number) => 0.6 * area * Math.sqrt(2 * GRAVITY * head);

const breach = () => {
  const dam = createBreach(
    {
      kind: 'breach',
      id: 'Dam',
      chainage: 0,
      crest: [
        [0, 20],
        [100, 20],
      ],
      trigger: { kind: 'time', time: 0 },
      mode: 'piping',
      growth: 'linear',
      formationTime: 1000,
      startLevel: 10,
      bottomLevel: 8,
      bottomWidth: 4,
      sideSlope: 1,
    },
    0,
    GRAVITY,
  );
  dam.follow!(19, 0);
  return dam;
};
/** Half grown: 2 m wide from 9 to 15 m, its middle at 12 m. */
const water = (stageDown: number) => ({
  stageUp: 19,
  energyUp: 19,
  stageDown,
  cellUp: 1,
  cellDown: 2,
  isForward: true,
  time: 500,
});

test('a pipe is an orifice under the head over its middle', () => {
  const dam = breach();
  expect(dam.flow(water(9))).toBeCloseTo(orifice(12, 7), 9);
  expect(dam.regime()).toBe('pipe');
  // Tailwater below the middle is not felt.
  expect(dam.flow(water(12))).toBeCloseTo(orifice(12, 7), 9);
});

test('tailwater over its middle leaves the difference of the stages', () => {
  const dam = breach();
  expect(dam.flow(water(15))).toBeCloseTo(orifice(12, 4), 9);
  expect(dam.regime()).toBe('drownedPipe');
});

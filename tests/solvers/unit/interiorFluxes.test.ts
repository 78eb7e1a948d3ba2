import { createInteriorFluxes } from '../../../server/solvers/riemann/interiorFluxes';
import { fluxesBetween } from './fluxesBetween';
import { at, kernelParts } from './kernelParts';
import { natural, rectangle, trapezoid } from './sections';

const G = 9.81;

describe('fluxes between cells', () => {
  it.each([
    ['rectangle', rectangle(5)],
    ['trapezoid', trapezoid(4, 2)],
    ['natural', natural('a', 0, 0)],
  ])('are those of the state where both sides are equal: %s', (_, section) => {
    for (const velocity of [0, 0.7, -2.2, 9, -11]) {
      const { volume, left, right, area } = fluxesBetween(
        section,
        [3.4, velocity],
        [3.4, velocity],
      );
      const flow = velocity * area[1];
      expect(volume).toBeCloseTo(flow, 9);
      // Momentum is counted from the pressure at the face, which both cells share.
      expect(left).toBeCloseTo(flow * velocity, 8);
      expect(right).toBeCloseTo(flow * velocity, 8);
    }
  });

  // HLL between two states of a unit-width rectangle: volume (s_R q_L - s_L q_R + s_L s_R Δh)/(s_R - s_L) and momentum
  // with q²/h + g h²/2, s_L = min(0, u_L - c_L, u_R - c_R), s_R = max(0, …): Harten, Lax and van Leer (1983).
  it.each([
    [
      [2, 0.5],
      [1.6, 1.2],
    ],
    [
      [1.2, 2],
      [1.5, -1],
    ],
    [
      [0.8, 6],
      [0.7, 5],
    ],
  ] as [[number, number], [number, number]][])('are HLL in a rectangle: %j %j', (l, r) => {
    const [hL, uL] = l;
    const [hR, uR] = r;
    const [cL, cR] = [Math.sqrt(G * hL), Math.sqrt(G * hR)];
    const sL = Math.min(0, uL - cL, uR - cR);
    const sR = Math.max(0, uL + cL, uR + cR);
    const volume = (sR * hL * uL - sL * hR * uR + sL * sR * (hR - hL)) / (sR - sL);
    const [mL, mR] = [hL * uL * uL + (G * hL * hL) / 2, hR * uR * uR + (G * hR * hR) / 2];
    const momentum = (sR * mL - sL * mR + sL * sR * (hR * uR - hL * uL)) / (sR - sL);
    const found = fluxesBetween(rectangle(1), l, r);
    expect(found.volume).toBeCloseTo(volume, 9);
    expect(found.left + (G * hL * hL) / 2).toBeCloseTo(momentum, 8);
    expect(found.right + (G * hR * hR) / 2).toBeCloseTo(momentum, 8);
  });

  it('mirror: swapping and turning both sides turns the volume and keeps the momentum', () => {
    const section = natural('a', 0, 0);
    const one = fluxesBetween(section, [3.1, 1.4], [2.2, -0.6]);
    const other = fluxesBetween(section, [2.2, 0.6], [3.1, -1.4]);
    expect(other.volume).toBeCloseTo(-one.volume, 9);
    expect(other.left).toBeCloseTo(one.right, 8);
    expect(other.right).toBeCloseTo(one.left, 8);
  });

  it('are nothing at all between dry cells and in still water', () => {
    const dry = fluxesBetween(natural('a', 0, 0), [-1, 0], [-1, 0]);
    expect([dry.volume, dry.left, dry.right]).toEqual([0, 0, 0]);
    const still = fluxesBetween(natural('a', 0, 0), [4.4, 0], [4.4, 0]);
    expect([still.volume + 0, still.left + 0, still.right + 0]).toEqual([0, 0, 0]);
  });

  it('push still water against a dry step only as far as its pressure reaches', () => {
    const { workspace, tables, state } = kernelParts(
      at(rectangle(4, 20), 0, 0),
      at(rectangle(4, 20), 20, 12),
      2,
    );
    // Beds at 3 m and 9 m; water to 5 m: the second cell stays a dry island.
    state.placeAtStage(1, 5);
    createInteriorFluxes(workspace, tables)();
    expect(workspace.fluxArea[1]).toBe(0);
    expect(workspace.fluxLeft[1] + 0).toBe(0);
  });

  it('are driven by the smaller of both differences of area where the sections differ', () => {
    // Cells of a reach that widens from 10 m to 13 m: the first is 10.75 m wide, the second 12.25 m.
    const { workspace, tables, state } = kernelParts(
      at(rectangle(10), 0),
      at(rectangle(13), 20),
      2,
    );
    const bed = workspace.bed[1];
    state.placeAtStage(1, bed + 2.1);
    state.placeAtStage(2, bed + 2);
    createInteriorFluxes(workspace, tables)();
    // HLL of still water, s = ±√(g h) of the deeper: s_L s_R ΔA/(s_R - s_L) = c ΔA/2, with ΔA = 10.75 m × 0.1 m.
    const c = Math.sqrt(G * 2.1);
    expect(workspace.fluxArea[1] / (0.5 * c * 1.075)).toBeCloseTo(1, 6);
  });

  it('let water fall onto a dry bed', () => {
    const section = rectangle(1);
    const { volume } = fluxesBetween(section, [1, 0], [0, 0]);
    // HLL with s_L = -c, s_R = 2c on a unit depth: 2c/3 = 2.0880613 (Fraccarollo and Toro 1995, dry right). The exact
    // flow of Ritter is 8/27 c = 0.928. The front speed is an integral over the levels of a table.
    expect(volume / ((2 / 3) * Math.sqrt(G))).toBeCloseTo(1, 3);
  });
});

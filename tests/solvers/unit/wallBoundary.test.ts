import { createWallBoundary } from '../../../server/solvers/boundaries/wallBoundary';
import { downstreamEnd, upstreamEnd } from '../../../server/solvers/boundaries/endState';
import { at, kernelParts } from './kernelParts';
import { rectangle } from './sections';

/** Hydrostatic force over density on a width b between two depths: g b (h1² - h2²)/2 (any text on hydraulics). */
const force = (g: number, b: number, h1: number, h2: number) => 0.5 * g * b * (h1 * h1 - h2 * h2);

test.each([
  ['downstream', 3, 1],
  ['upstream', 1, -1],
] as const)(
  '%s: water at rest that stands higher at the wall presses by its depth there',
  (_, cell, outward) => {
    const { workspace, tables, state } = kernelParts(at(rectangle(2), 0), at(rectangle(2), 30), 3);
    const { bed, gravity, slopeStage, fluxLeft, fluxRight, fluxArea } = workspace;
    for (let i = 1; i <= 3; i++) state.placeAtStage(i, bed[i] + 2 + 0.1 * outward * (i - cell));
    slopeStage[cell] = 0.1 * outward;
    const end = outward === 1 ? downstreamEnd(3) : upstreamEnd();
    createWallBoundary(workspace, tables, end)(0);
    const flux = outward === 1 ? fluxLeft[3] : fluxRight[0];
    expect(fluxArea[end.face]).toBe(0);
    // Half a cell further the surface is 0.05 m higher.
    expect(flux).toBeCloseTo(force(gravity, 2, 2.05, 2), 9);
  },
);

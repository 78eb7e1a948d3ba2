import { normalDepth, routeCase } from '../../../server/solvers';
import type { CaseFile } from '../../../shared/case/caseFile';
import { at } from './kernelParts';
import { rectangle } from './sections';

/** A rectangular channel of 1 km on a slope, with a steady inflow onto a dry bed. */
function channel(slope: number, flow: number, cellSize: number): CaseFile {
  const section = rectangle(10, 5, 0.03);
  return {
    format: 'spate-case/1',
    title: 'Steep channel',
    gravity: 9.81,
    sections: [at(section, 0, 1000 * slope), at(section, 1000)],
    upstream: { kind: 'inflow', times: [0], flows: [flow] },
    downstream: { kind: 'normalDepth', slope },
    laterals: [],
    structures: [],
    initial: { kind: 'still', stage: -1 },
    numerics: { cellSize, duration: 1800, outputInterval: 1800 },
  };
}

describe('flow on steep slopes', () => {
  // The bed falls by up to 20 flow depths from cell to cell: no cell can be sloped, and friction is stiff. Uniform depth
  // from Manning's formula; it must hold at both ends too. 5e-4 is the error of the tables next to the bed.
  it.each([
    [0.05, 20, 10],
    [0.2, 20, 10],
    [0.1, 2, 50],
  ])('is uniform on %d with %d m³/s in cells of %d m', (slope, flow, cellSize) => {
    const caseFile = channel(slope, flow, cellSize);
    const depth = normalDepth(caseFile.sections[0], flow, slope) ?? NaN;
    const { cells, volume } = routeCase(caseFile);
    for (const found of cells.finalDepth) expect(Math.abs(found / depth - 1)).toBeLessThan(5e-4);
    for (const found of cells.finalFlow) expect(Math.abs(found / flow - 1)).toBeLessThan(1e-6);
    expect(Math.abs(volume.relativeError)).toBeLessThan(1e-12);
  });
});

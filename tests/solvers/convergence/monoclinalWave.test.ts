import { floodFront } from '@/server/verificationCases/cases/floodFront';
import { orderTable } from '../../helpers/solvers/orderTable';
import { publishedErrors } from '../../orderTables/publishedErrors';

describe('a flood front of constant form', () => {
  // Limits on the finest grid, half as much again as measured: of the surface (m) and of the flow (m³/s of some 90); least
  // orders. The tables of sections, good to some 1e-4 of the conveyance, take from the order at second order.
  it.each<[1 | 2, number, number, number]>([
    [1, 1.3e-2, 1.4, 0.95],
    [2, 3.1e-6, 1.6e-4, 1.6],
  ])('is followed at order %d', (order, surfaceLimit, flowLimit, leastOrder) => {
    const rows = publishedErrors(floodFront, { name: `order ${order}`, numerics: { order } });
    const table = (which: 0 | 1, of: string) =>
      orderTable(`Flood front ${of} order ${order}`, floodFront.grids, (cells) => {
        return rows.find((row) => row.cells === cells)!.errors[which];
      });
    const surface = table(0, 'surface');
    const flow = table(1, 'flow');
    expect(surface.finest).toBeLessThan(surfaceLimit);
    expect(flow.finest).toBeLessThan(flowLimit);
    expect(surface.order).toBeGreaterThan(leastOrder);
    expect(flow.order).toBeGreaterThan(leastOrder);
  });
});

import { readFileSync } from 'node:fs';
import path from 'node:path';
import { orderBetween } from '../../orderTables/gridRow';
import { readMarkdown } from '../../orderTables/markdown';
import { SCHEMES } from '../../orderTables/schemes';
import { ORDER_TABLES } from '../../orderTables/tables';

/** The tables that the solver's documentation shows say what the solver does today. */
const text = readFileSync(path.join(process.cwd(), 'server/solvers/orderTables.md'), 'utf8');

describe('the order tables', () => {
  it('hold every case on four grids', () => {
    for (const { id, grids } of ORDER_TABLES) {
      expect(grids.length).toBeGreaterThanOrEqual(4);
      for (const rows of readMarkdown(text, id))
        expect(rows.map(({ cells }) => cells)).toEqual(grids);
    }
  });

  // Least orders of the finest pair by both schemes: of the surface or area, and of the flow where it is not steady.
  it.each<[string, RegExp, [number, number], [number, number] | null]>([
    ['smooth steady flow', /^(bump-(sub|trans)|prescribed-[ab])/, [0.95, 1.9], null],
    ['steady flow beside a jump', /^(bump-jump|prescribed-[cd])/, [0.85, 1.75], null],
    ['natural rivers', /^river/, [0.95, 1.75], null],
    ['smooth unsteady flow', /^(manufactured-gaining|flood-front)/, [0.95, 1.65], [0.95, 1.9]],
    ['shocks', /^(dam-(stoker|t.*-wet)|states-1|bore|surge)/, [0.65, 0.7], [0.7, 0.8]],
    ['dry fronts', /^(dam-ritter|dam-t.*-dry|states-[345])/, [0.5, 0.7], [0.65, 0.9]],
    ['moving shores', /^parabolic/, [1, 0.7], [1, 1.2]],
  ])('%s', (_name, ids, water, flow) => {
    const tables = ORDER_TABLES.filter(({ id }) => ids.test(id));
    expect(tables.length).toBeGreaterThan(0);
    for (const { id } of tables) {
      readMarkdown(text, id).forEach((rows, scheme) => {
        const [coarse, fine] = rows.slice(-2);
        expect({ id, order: orderBetween(coarse, fine, 0)! >= water[scheme] }).toEqual({
          id,
          order: true,
        });
        if (flow) expect(orderBetween(coarse, fine, 1)).toBeGreaterThanOrEqual(flow[scheme]);
      });
    }
  });

  it.each([
    'dam-stoker-1',
    'dam-triangle-dry',
    'states-1',
    'prescribed-b',
    'flood-front',
    'manufactured-gaining',
  ])('of %s are those of a fresh run (else: npm run order-tables)', (id) => {
    const table = ORDER_TABLES.find((each) => each.id === id)!;
    const grids = table.grids.slice(1, 3);
    const kept = readMarkdown(text, id);
    SCHEMES.forEach((scheme, s) => {
      table.errors(scheme, grids).forEach(({ cells, errors }) => {
        const row = kept[s].find((each) => each.cells === cells)!;
        errors.forEach((error, which) => {
          if (error > 1e-6) expect(Math.abs(row.errors[which] / error - 1)).toBeLessThan(0.01);
        });
      });
    });
  });
});

/** Routes every case of the order tables by every scheme and writes server/solvers/orderTables.md: npm run order-tables. */
import { writeFileSync } from 'node:fs';
import { SOLVER_VERSION } from '@/server/solvers';
import { caseMarkdown } from './markdown';
import { SCHEMES } from './schemes';
import { ORDER_TABLES } from './tables';

const FILE = 'server/solvers/orderTables.md';

const INTRODUCTION = `# Order tables

Mean errors (L1) of the solver against exact solutions, and the order observed between neighbouring grids,
log(e1/e2)/log(n2/n1). Written by \`npm run order-tables\` with solver ${SOLVER_VERSION}; a test holds the file to fresh
numbers. Where a jump stands its surroundings are left out.

What to expect: 1 and 2 in smooth flow. A shock or a dry front holds every scheme to order 1 in the mean, first-order HLL to
0.6 to 0.9; the dry tip in a triangle is thinner than any cell for longer. Near 1e-4 of the depth the tables of the sections
end the fall, and on natural sections the edges of the ground. The flow of a steady case is even to what its settling leaves.
A dash: rounding, or the last of the settling, is all that is left.
`;

const sections = ORDER_TABLES.map((table) => {
  const began = performance.now();
  const results = SCHEMES.map((scheme) => table.errors(scheme));
  process.stderr.write(`${table.id} ${((performance.now() - began) / 1000).toFixed(1)} s\n`);
  return caseMarkdown(table, results);
});
writeFileSync(FILE, [INTRODUCTION, ...sections].join('\n'));

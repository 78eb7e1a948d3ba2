import { MUTATIONS } from './list';
import type { Mutation } from './mutation';
import { createMutatedTree } from './mutatedTree';
import { firstFailure } from './runTests';

/**
 * Is there a test for every term of the solver? Spoils one after the other in copies of the tree and runs the tests that
 * must see it: `npm run mutants [-- part of a name]`. Ends with 1 where one survives.
 */
const LANES = 2;

void main(process.argv[2] ?? '');

async function main(wanted: string): Promise<void> {
  const mutations = MUTATIONS.filter(({ what }) => what.includes(wanted));
  const trees = Array.from({ length: LANES }, createMutatedTree);
  const survivors: Mutation[] = [];
  const began = performance.now();
  try {
    const sound = await firstFailure(trees[0].root, [...new Set(mutations.flatMap(testsOf))]);
    if (sound !== null) throw new Error(`Fails without any mutation: ${sound}`);
    const waiting = [...mutations];
    await Promise.all(
      trees.map(async (tree) => {
        for (let next = waiting.shift(); next !== undefined; next = waiting.shift()) {
          tree.apply(next);
          const killer = await firstFailure(tree.root, next.tests);
          tree.revert(next);
          if (killer === null) survivors.push(next);
          console.log(`${killer === null ? 'SURVIVED' : 'killed  '} ${next.what}`);
          console.log(`           ${killer ?? next.tests.join(', ')}`);
        }
      }),
    );
  } finally {
    for (const tree of trees) tree.remove();
  }
  const minutes = ((performance.now() - began) / 60_000).toFixed(1);
  console.log(`${mutations.length} mutants, ${survivors.length} survived, ${minutes} minutes`);
  process.exitCode = survivors.length > 0 ? 1 : 0;
}

/** The fast kernel's test is no part of the readable one's soundness. */
function testsOf({ tests, isFast }: Mutation): readonly string[] {
  return isFast ? [] : tests;
}

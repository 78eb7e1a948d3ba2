import { MUTATIONS } from './list';
import type { Mutation } from './mutation';
import { createMutatedTree, type MutatedTree } from './mutatedTree';
import { failureOf } from './runTest';

/**
 * Is there a test for every term of the solver? Spoils one after the other in copies of the tree and runs the tests that
 * must see it: `npm run mutants [-- part of a name]`. Ends with 1 where one survives.
 */
const LANES = 2;

interface Killer {
  file: string;
  test: string;
}

void main(process.argv[2] ?? '');

async function main(wanted: string): Promise<void> {
  const mutations = MUTATIONS.filter(({ what }) => what.includes(wanted));
  const waiting = [...mutations];
  const survivors: Mutation[] = [];
  const sound = new Map<string, Promise<string | null>>();
  const began = performance.now();

  async function work(tree: MutatedTree): Promise<void> {
    for (let next = waiting.shift(); next !== undefined; next = waiting.shift()) {
      tree.apply(next);
      const killer = await killerOf(tree.root, next);
      tree.revert(next);
      if (killer === null) survivors.push(next);
      else await mustBeSound(tree.root, next, killer.file);
      console.log(`${killer === null ? 'SURVIVED' : 'killed  '} ${next.what}`);
      console.log(
        `           ${killer ? `${killer.file}: ${killer.test}` : next.tests.join(', ')}`,
      );
    }
  }

  /** A test that fails without the mutation as well has not seen it. */
  async function mustBeSound(root: string, { isFast }: Mutation, file: string): Promise<void> {
    const key = `${file} ${isFast}`;
    const known = sound.get(key) ?? failureOf(root, file);
    sound.set(key, known);
    const failure = await known;
    if (failure !== null) throw new Error(`${file} fails without any mutation: ${failure}`);
  }

  const trees = Array.from({ length: LANES }, createMutatedTree);
  try {
    await Promise.all(trees.map(work));
  } finally {
    for (const tree of trees) tree.remove();
  }
  const minutes = ((performance.now() - began) / 60_000).toFixed(1);
  console.log(`${mutations.length} mutants, ${survivors.length} survived, ${minutes} minutes`);
  process.exitCode = survivors.length > 0 ? 1 : 0;
}

async function killerOf(root: string, { tests }: Mutation): Promise<Killer | null> {
  for (const file of tests) {
    const test = await failureOf(root, file);
    if (test !== null) return { file, test };
  }
  return null;
}

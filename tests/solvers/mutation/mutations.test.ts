import { existsSync } from 'node:fs';
import path from 'node:path';

import { MUTATIONS } from '../../mutation/list';
import { mutated, originalText } from '../../mutation/mutatedTree';

it.each(MUTATIONS)('the mutation "$what" applies, and has tests', (mutation) => {
  expect(mutated(originalText(mutation.file), mutation)).not.toBe(originalText(mutation.file));
  for (const name of mutation.tests) {
    expect(existsSync(path.join(__dirname, '..', `${name}.test.ts`))).toBe(true);
  }
});

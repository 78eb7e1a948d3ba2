import { unknownPaths } from '@/server/middleware/unknownPaths';
import { check } from '@/server/middleware/validate';
import { object, string } from 'yup';

describe('what a schema does not know', () => {
  it('is named by its path, through objects and lists', () => {
    const given = { a: 1, b: { c: 2, d: 3 }, list: [{ x: 1 }, { x: 1, y: 2 }] };
    const known = { a: 1, b: { c: 2 }, list: [{ x: 1 }, { x: 1 }] };
    expect(unknownPaths(given, known)).toEqual(['b.d', 'list[1].y']);
  });

  it('is refused where the schema would leave it out without a word', async () => {
    const schema = object({ name: string().required() }).noUnknown();
    await expect(check(schema, { name: 'Veshall' })).resolves.toEqual({ name: 'Veshall' });
    await expect(check(schema, { name: 'Veshall', naem: 'x' })).rejects.toMatchObject({
      faults: [{ path: 'naem' }],
    });
  });
});

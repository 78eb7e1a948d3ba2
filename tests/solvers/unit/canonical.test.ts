import { caseHash } from '../../../server/solvers';
import { canonical } from '../../../shared/case/canonical';
import { soundCase } from './soundCase';

describe('canonical JSON', () => {
  it('sorts keys and leaves out white space and what is undefined', () => {
    expect(canonical({ b: [1, { z: null, a: 'ü"' }], a: 1e21, c: undefined })).toBe(
      '{"a":1e+21,"b":[1,{"a":"ü\\"","z":null}]}',
    );
  });

  it('reads back as the same value', () => {
    const value = soundCase();
    expect(JSON.parse(canonical(value))).toEqual(value);
  });

  it.each([[NaN], [Infinity], [() => 1], [undefined]])(
    'refuses what JSON cannot say: %p',
    (value) => {
      expect(() => canonical({ a: [value] })).toThrow(TypeError);
    },
  );
});

describe('the hash of a case', () => {
  it('does not depend on the order of keys', () => {
    const value = soundCase();
    const turned = Object.fromEntries(Object.entries(value).reverse()) as unknown as typeof value;
    expect(caseHash(turned)).toBe(caseHash(value));
  });

  it('changes with every number', () => {
    const value = soundCase();
    const before = caseHash(value);
    value.sections[1].points[2][1] += 1e-9;
    expect(caseHash(value)).not.toBe(before);
  });

  // SHA-256 of "{}" as sha256sum prints it.
  it('is SHA-256 of the canonical text', () => {
    expect(caseHash({} as never)).toBe(
      'sha256:44136fa355b3678a1146ad16f7e8649e94fb4fc21fe77e8310c060f61caaff8a',
    );
  });
});

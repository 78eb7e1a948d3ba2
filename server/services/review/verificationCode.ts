import { randomInt } from 'node:crypto';

/** Digits and capitals without those that are taken for one another (I, L, O, U). */
const SIGNS = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';
const LENGTH = 16;

/** 80 bits: nobody finds one by trying. */
export const makeCode = (): string =>
  Array.from({ length: LENGTH }, () => SIGNS[randomInt(SIGNS.length)]).join('');

/** As it is printed: four groups of four. */
export const showCode = (code: string): string => code.replaceAll(/(.{4})(?=.)/g, '$1-');

/** A code as it was typed, as it is stored; null where it can be none. */
export function readCode(typed: string): string | null {
  const code = typed
    .toUpperCase()
    .replaceAll(/[\s-]/g, '')
    .replaceAll('O', '0')
    .replaceAll(/[IL]/g, '1');
  return code.length === LENGTH && [...code].every((sign) => SIGNS.includes(sign)) ? code : null;
}

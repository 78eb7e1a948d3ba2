import { array, lazy, mixed, number } from 'yup';
import { LIMITS } from '../limits';

/** A number of a form in SI; null while it is missing. */
export const real = () => number().min(-1e9).max(1e9).nullable().default(null);

/** A volume in m³: reservoirs hold more than any level or flow is large. */
const volume = () => number().min(-1e13).max(1e13);
export const realVolume = () => volume().nullable().default(null);

/** One column of a table. */
export const series = () =>
  array()
    .of(number().min(-1e9).max(1e9).required())
    .max(LIMITS.hydrographPoints)
    .default([])
    .required();
export const volumes = () =>
  array().of(volume().required()).max(LIMITS.hydrographPoints).default([]).required();

/** One of several shapes, told apart by its `kind`. */
export const byKind = <T extends Record<string, { isType: unknown } | object>>(kinds: T) =>
  lazy((value: { kind?: string } | undefined) => {
    const schema = kinds[value?.kind ?? ''];
    const choose = `Choose one of: ${Object.keys(kinds).join(', ')}.`;
    return (schema ?? mixed().oneOf([], choose).required(choose)) as never;
  });

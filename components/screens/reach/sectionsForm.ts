import { array, number, object, string, type InferType } from 'yup';
import type { SectionsChangeBody } from '@/shared/reaches/schemas';
import type { ReachSection } from '@/shared/reaches/types';

const offset = (message: string) => number().nullable().default(null).required(message);
const manning = () =>
  number()
    .nullable()
    .default(null)
    .required("Give Manning's n.")
    .moreThan(0, "Manning's n is above 0.")
    .max(1, "Manning's n is below 1.");

/** What the form asks: what becomes of the bank marks, and what of the roughness. Offsets in m. */
export const sectionsFormSchema = object({
  banks: string().oneOf(['keep', 'set', 'clear']).default('keep').required(),
  leftBank: number()
    .nullable()
    .default(null)
    .when('banks', { is: 'set', then: () => offset('Give the offset of the left bank.') }),
  rightBank: number()
    .nullable()
    .default(null)
    .when('banks', {
      is: 'set',
      then: () =>
        offset('Give the offset of the right bank.').test(
          'order',
          'The right bank lies right of the left one, looking downstream.',
          (right, { parent }) =>
            right == null || parent.leftBank == null || right > Number(parent.leftBank),
        ),
    }),
  roughness: string().oneOf(['keep', 'byBank', 'byOffset']).default('keep').required(),
  left: number().nullable().default(null).when('roughness', { is: 'byBank', then: manning }),
  channel: number().nullable().default(null).when('roughness', { is: 'byBank', then: manning }),
  right: number().nullable().default(null).when('roughness', { is: 'byBank', then: manning }),
  zones: array()
    .of(object({ from: number().nullable().default(null), n: number().nullable().default(null) }))
    .default([])
    .when('roughness', {
      is: 'byOffset',
      then: (zones) =>
        zones
          .of(object({ from: offset('Give the offset where it begins.'), n: manning() }))
          .min(1, 'Give at least one zone.')
          .max(100, 'At most 100 zones.')
          .test('rising', (given, context) => {
            const at = (given ?? []).findIndex(
              ({ from }, index) =>
                index > 0 && from != null && from <= Number(given?.[index - 1].from),
            );
            return (
              at < 1 ||
              context.createError({
                path: `zones[${at}].from`,
                message: 'Zones run from left to right: this one begins before the last.',
              })
            );
          }),
    }),
});

export type SectionsFormValues = InferType<typeof sectionsFormSchema>;

/** Starts from the one section chosen; where there are several, from the first, as a proposal. */
export function sectionsFormStart(section: ReachSection | undefined): SectionsFormValues {
  const [leftBank, rightBank] = section?.banks ?? [null, null];
  const roughness = section?.roughness ?? [];
  const [left = null, channel = null, right = null] = section?.banks
    ? roughnessByStrip(section)
    : [];
  return {
    banks: 'keep',
    leftBank,
    rightBank,
    roughness: 'keep',
    left,
    channel,
    right,
    zones: roughness.length
      ? roughness.map(([from, n]) => ({ from, n }))
      : [{ from: section?.points[0][0] ?? 0, n: null }],
  };
}

/** Manning's n in the middle of the left, channel and right strip; without bank marks that of the middle only. */
export function roughnessByStrip(section: ReachSection): (number | null)[] {
  const { points, banks } = section;
  const [first, last] = [points[0][0], points[points.length - 1][0]];
  if (!banks) return [roughnessAt(section, (first + last) / 2)];
  const edges = [first, ...banks, last];
  return [0, 1, 2].map((strip) => roughnessAt(section, (edges[strip] + edges[strip + 1]) / 2));
}

/** Manning's n that holds at an offset; null where none is given. */
export function roughnessAt({ roughness }: Pick<ReachSection, 'roughness'>, at: number) {
  const zone = [...roughness].reverse().find(([from]) => from <= at);
  return zone?.[1] ?? roughness[0]?.[1] ?? null;
}

/** Whether the form asks for anything at all. */
export const changesNothing = ({ banks, roughness }: SectionsFormValues): boolean =>
  banks === 'keep' && roughness === 'keep';

/** The change that is sent; what is kept is left out. Values have passed the schema. */
export function toSectionsChange(
  values: SectionsFormValues,
  sectionIds: readonly string[],
  version: number,
): SectionsChangeBody {
  const { banks, leftBank, rightBank, roughness, left, channel, right, zones } = values;
  return {
    version,
    sectionIds: [...sectionIds],
    ...(banks === 'clear' && { banks: null }),
    ...(banks === 'set' && { banks: [Number(leftBank), Number(rightBank)] }),
    ...(roughness === 'byBank' && {
      roughnessByBank: { left: Number(left), channel: Number(channel), right: Number(right) },
    }),
    ...(roughness === 'byOffset' && {
      roughness: (zones ?? []).map(({ from, n }): [number, number] => [Number(from), Number(n)]),
    }),
  } as SectionsChangeBody;
}

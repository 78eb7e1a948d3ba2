import { bottomWidthOf, breachEstimates } from '../shared/breach/breachEstimates';
import { damDataOf, damInputsOf } from '../shared/scenarios/structures/damData';
import { newStructure } from '../shared/scenarios/structures/newStructure';
import type { BreachBody, DamData } from '../shared/scenarios/structures/schemas';
import { crestOverGround, sectionNear } from '../shared/structures/crests';
import type { Section } from '../shared/surveys/types';
import { QUENLOW_DAM, quenlowReservoir } from './reaches/quenlowValley';

/** Crest above the full reservoir, m. */
const FREEBOARD = 0.6;
const ESTIMATE = 'froehlich2008';
const MINUTE = 60;

const rounded = (data: Partial<DamData>): Partial<DamData> =>
  Object.fromEntries(
    Object.entries(data).map(([key, value]) => [key, Number(Number(value).toPrecision(4))]),
  );

/** The Quenlow dam, a fill that erodes: width, sides and time as the regression of 2008 gives them for its reservoir. */
export function failingDam(sections: Section[]): BreachBody {
  const { chainage } = QUENLOW_DAM;
  const upstream = { kind: 'wall' } as const;
  const crest = crestOverGround(sectionNear(sections, chainage), quenlowReservoir() + FREEBOARD);
  const dam: BreachBody = {
    ...(newStructure('breach', { chainage, sections, upstream, taken: [] }) as BreachBody),
    id: 'Quenlow dam',
    offsets: crest.map(([offset]) => offset),
    levels: crest.map(([, level]) => level),
    trigger: 'stage',
    triggerStage: quenlowReservoir(),
    mode: 'piping',
    startLevel: Math.round(quenlowReservoir() - 4),
    note: 'Seepage at mid height is the mode that the inspection of the dam found likeliest. Nothing more is known of the fill, so a regression on many failures was taken; the sudden failure stands beside it as the upper bound.',
  };
  const data = damDataOf(dam, upstream, sections);
  const known: BreachBody = { ...dam, dam: { ...dam.dam, ...rounded(data) } };
  const inputs = damInputsOf(known);
  const estimate = inputs && breachEstimates(inputs).find(({ id }) => id === ESTIMATE);
  if (!inputs || !estimate?.width || !estimate.formationTime || estimate.sideSlope === null)
    throw new Error('The demo dam has no estimate.');
  const { width, sideSlope, formationTime } = estimate;
  const bottom = bottomWidthOf(width.value, sideSlope, inputs.breachHeight);
  return {
    ...known,
    bottomWidth: Math.round(bottom * 10) / 10,
    sideSlope,
    formationTime: Math.round(formationTime.value / MINUTE) * MINUTE,
    estimate: ESTIMATE,
  };
}

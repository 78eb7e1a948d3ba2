import type { StructureInput } from '../../case/structures';
import { estimateSentence } from '../../breach/breachEstimates';
import { crestPoints } from '../../structures/crests';
import type { BreachBody, CulvertBody, StructureBody } from './schemas';

/** A structure as the case file has it. Throws an Error that names the first number that is missing. */
export function buildStructure(body: StructureBody, path: string): StructureInput {
  const given = (value: number | null, name: string): number => {
    if (value === null) throw new Error(`The scenario is incomplete: ${path}.${name}`);
    return value;
  };
  const note = noteOf(body);
  const base = {
    id: body.id,
    chainage: given(body.chainage, 'chainage'),
    ...(note && { note }),
  };
  switch (body.kind) {
    case 'weir':
      return {
        kind: 'weir',
        ...base,
        crest: crestPoints(body),
        form: body.form,
        ...where('coefficient', body.coefficient),
      };
    case 'sluice':
      return {
        kind: 'sluice',
        ...base,
        width: given(body.width, 'width'),
        sill: given(body.sill, 'sill'),
        times: body.times,
        openings: body.openings,
        ...where('contraction', body.contraction),
      };
    case 'culvert':
      return {
        kind: 'culvert',
        ...base,
        ...sizeOf(body, given),
        barrels: given(body.barrels, 'barrels'),
        n: given(body.n, 'n'),
        length: given(body.length, 'length'),
        invertUp: given(body.invertUp, 'invertUp'),
        invertDown: given(body.invertDown, 'invertDown'),
        inlet: body.inlet,
        ...(body.offsets.length > 0 && {
          crest: crestPoints(body),
          ...where('crestCoefficient', body.crestCoefficient),
        }),
      };
    case 'bridge':
      return {
        kind: 'bridge',
        ...base,
        piers: body.piers,
        obstructed: given(body.obstructed, 'obstructed'),
        soffit: given(body.soffit, 'soffit'),
        ...where('contraction', body.contraction),
        ...(body.offsets.length > 0 && {
          deck: crestPoints(body),
          ...where('deckCoefficient', body.deckCoefficient),
        }),
      };
    case 'breach':
      return {
        kind: 'breach',
        ...base,
        crest: crestPoints(body),
        trigger:
          body.trigger === 'time'
            ? { kind: 'time', time: given(body.triggerTime, 'triggerTime') }
            : { kind: 'stage', stage: given(body.triggerStage, 'triggerStage') },
        mode: body.mode,
        growth: body.growth,
        formationTime: given(body.formationTime, 'formationTime'),
        bottomWidth: given(body.bottomWidth, 'bottomWidth'),
        bottomLevel: given(body.bottomLevel, 'bottomLevel'),
        sideSlope: given(body.sideSlope, 'sideSlope'),
        ...where('centre', body.centre),
        ...where('startLevel', body.startLevel),
        ...where('weirCoefficient', body.weirCoefficient),
        ...where('orificeCoefficient', body.mode === 'piping' ? body.orificeCoefficient : null),
      };
  }
}

function sizeOf(body: CulvertBody, given: (value: number | null, name: string) => number) {
  return body.shape === 'circular'
    ? ({ shape: 'circular', diameter: given(body.diameter, 'diameter') } as const)
    : ({
        shape: 'box',
        width: given(body.width, 'width'),
        height: given(body.height, 'height'),
      } as const);
}

/** What the modeller says of it, and of a breach where its values come from: it goes into the frozen case and the report. */
function noteOf(body: StructureBody): string {
  const own = body.note.trim();
  if (body.kind !== 'breach') return own;
  return [estimateSentence((body satisfies BreachBody).estimate), own].filter(Boolean).join(' ');
}

/** A field that may be left out, where it is given. */
const where = <K extends string>(key: K, value: number | null): { [P in K]?: number } =>
  value === null ? {} : ({ [key]: value } as { [P in K]: number });

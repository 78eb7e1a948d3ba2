import { bankLevels, bankfullWidth, thalwegOf } from '../../reaches/sectionGeometry';
import { crestOverGround, sectionNear } from '../../structures/crests';
import type { Section } from '../../surveys/types';
import type { Upstream } from '../schemas';
import type { DamData, StructureBody } from './schemas';

interface Where {
  chainage: number;
  sections: readonly Section[];
  upstream: Upstream;
  /** Ids that are taken. */
  taken: readonly string[];
}

/** Manning's n of a concrete barrel (Chow 1959, table 5-6). */
const CONCRETE = 0.013;
/** Heights and shares of a first guess; each is looked at and mended in the form. */
const WEIR_SHARE = 0.4;
const GATE_SHARE = 0.6;
const BARREL_SHARE = 0.6;
const LARGEST_PIPE = 3;
const ROAD_WIDTH = 12;
const COVER = 0.3;
const DECK = 0.8;
const DAM_SHARE = 0.8;

/** A structure as it could stand at a place: its crest from the section there, its sill on the bed. What only the modeller knows is left empty. */
export function newStructure(kind: StructureBody['kind'], where: Where): StructureBody {
  const { chainage, sections, upstream } = where;
  const section = sectionNear(sections, chainage);
  const bed = tenth(thalwegOf(section));
  const banks = bankLevels(section);
  const depth = Math.max(0.5, Math.min(...banks) - bed);
  const width = bankfullWidth(section);
  const standing = { id: freeName(kind, where.taken), chainage, note: '' };
  const crestAt = (level: number) => columns(crestOverGround(section, tenth(level)));

  switch (kind) {
    case 'weir':
      return {
        kind,
        ...standing,
        ...crestAt(bed + WEIR_SHARE * depth),
        form: 'broad',
        coefficient: null,
      };
    case 'sluice':
      return {
        kind,
        ...standing,
        width: tenth(GATE_SHARE * width),
        sill: bed,
        times: [0],
        openings: [tenth(0.5 * depth)],
        contraction: null,
      };
    case 'culvert': {
      const diameter = Math.max(0.3, Math.min(LARGEST_PIPE, tenth(BARREL_SHARE * depth)));
      const fall = tenth(ROAD_WIDTH * slopeAt(sections, chainage));
      return {
        kind,
        ...standing,
        shape: 'circular',
        diameter,
        width: diameter,
        height: diameter,
        barrels: Math.max(1, Math.min(10, Math.floor((0.5 * width) / (1.5 * diameter)))),
        n: CONCRETE,
        length: ROAD_WIDTH,
        invertUp: bed,
        invertDown: bed - fall,
        inlet: 'concretePipeSquareEdge',
        ...crestAt(Math.max(Math.max(...banks), bed + 1.4 * diameter) + COVER),
        crestCoefficient: null,
      };
    }
    case 'bridge': {
      const soffit = tenth(Math.max(...banks) + COVER);
      return {
        kind,
        ...standing,
        piers: 'semicircular',
        obstructed: 0.05,
        soffit,
        contraction: null,
        ...crestAt(soffit + DECK),
        deckCoefficient: null,
      };
    }
    case 'breach': {
      const top = tenth(damTop(section, bed, chainage, sections, upstream));
      return {
        kind,
        ...standing,
        ...crestAt(top),
        trigger: 'stage',
        triggerTime: null,
        triggerStage: top,
        mode: 'overtopping',
        growth: 'sine',
        formationTime: null,
        bottomWidth: null,
        bottomLevel: bed,
        sideSlope: null,
        centre: middleOfBed(section, bed),
        startLevel: null,
        weirCoefficient: null,
        orificeCoefficient: null,
        dam: emptyDam(),
        estimate: '',
      };
    }
  }
}

export const emptyDam = (): DamData => ({
  height: null,
  waterDepth: null,
  waterVolume: null,
  storage: null,
  crestWidth: null,
  faceSlopes: null,
  embankment: 'earthfill',
  erodibility: 'high',
});

/** The top of a reservoir's table at the head; elsewhere most of the height of the valley. */
function damTop(
  section: Section,
  bed: number,
  chainage: number,
  sections: readonly Section[],
  upstream: Upstream,
): number {
  const stages = upstream.kind === 'reservoir' ? upstream.storage.stages : [];
  if (chainage === sections[0].chainage && stages.length > 0) return stages[stages.length - 1];
  const ends = Math.min(section.points[0][1], section.points[section.points.length - 1][1]);
  return bed + DAM_SHARE * (ends - bed);
}

/** The breach grows where the valley is deepest. */
function middleOfBed({ points }: Section, bed: number): number {
  const low = points.filter(([, z]) => z <= bed + 0.15).map(([y]) => y);
  return low.length > 0 ? tenth(0.5 * (Math.min(...low) + Math.max(...low))) : 0;
}

function slopeAt(sections: readonly Section[], chainage: number): number {
  const next = Math.max(
    1,
    sections.findIndex((section) => section.chainage > chainage),
  );
  const [above, below] = [sections[next - 1], sections[next]];
  const slope = (thalwegOf(above) - thalwegOf(below)) / (below.chainage - above.chainage);
  return Math.min(Math.max(slope, 0), 0.1);
}

const NAMES: Record<StructureBody['kind'], string> = {
  weir: 'Weir',
  sluice: 'Sluice',
  culvert: 'Culvert',
  bridge: 'Bridge',
  breach: 'Dam',
};

export function freeName(kind: StructureBody['kind'], taken: readonly string[]): string {
  for (let number = 1; ; number++) {
    const name = `${NAMES[kind]} ${number}`;
    if (!taken.includes(name)) return name;
  }
}

const columns = (crest: readonly (readonly [number, number])[]) => ({
  offsets: crest.map(([offset]) => offset),
  levels: crest.map(([, level]) => level),
});

const tenth = (value: number) => Math.round(value * 10) / 10;

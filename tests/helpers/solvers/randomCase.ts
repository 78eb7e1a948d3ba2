import type { CaseFile, Downstream, Initial, SectionInput } from '@/shared/case/caseFile';
import {
  CULVERT_INLET_NAMES,
  PIER_SHAPE_NAMES,
  type CrestPoint,
  type StructureInput,
} from '@/shared/case/structures';
import { Faults } from '@/shared/case/validate/faults';
import { checkStorage } from '@/shared/case/validate/sectionPartFaults';
import { buildCase, steadyStage } from './caseBuilders';
import { naturalReach, wildReach } from './naturalReach';
import { seededRandom } from './seededRandom';

interface Chance {
  random(): number;
  between(low: number, high: number): number;
  pick<T>(choices: readonly T[]): T;
}

function chanceOf(seed: number): Chance {
  const random = seededRandom(seed);
  return {
    random,
    between: (low, high) => low + (high - low) * random(),
    pick: (choices) => choices[Math.floor(random() * choices.length)],
  };
}

export const STRUCTURE_KINDS = ['weir', 'sluice', 'culvert', 'bridge', 'breach'] as const;

/** What a drawn case holds besides a river and a flood. */
export interface RandomParts {
  structures?: boolean;
  /** Storage parts, embankments, roughness factors, local losses and the momentum coefficient */
  valley?: boolean;
}

/** A small river with a flood, drawn by chance: slopes from 1:10,000 to 1:10, floods of up to 500 m³/s within five minutes
 *  or at once, every kind of end and start; each fourth river has sections without likeness to each other. */
export function randomCase(seed: number, parts: RandomParts = {}): CaseFile {
  const chance = chanceOf(1000 + seed);
  const { random, pick } = chance;
  const slope = 10 ** (-4 + 3 * random());
  const wild = seed % 4 === 3;
  const plain = wild
    ? wildReach(seed, 8, 60)
    : naturalReach(seed, { length: 1200, spacing: 200, slope });
  const length = plain[plain.length - 1].chainage;
  const bed = lowest(plain[plain.length - 1]);
  const crest = lowest(plain[0]);
  const base = 100 * random() ** 2;
  const peak = base + 400 * random();
  const downstream = pick<Downstream>([
    { kind: 'normalDepth', slope: Math.max(slope, 1e-4) },
    { kind: 'stage', times: [0, 900], stages: [bed + 3 * random(), bed + 4 * random()] },
    { kind: 'rating', stages: [bed + 0.2, bed + 3, bed + 8], flows: [0, 120, 900] },
    { kind: 'criticalDepth' },
    { kind: 'open' },
    { kind: 'wall' },
  ]);
  const initial = pick<Initial>([
    { kind: 'still', stage: bed + 4 * random() },
    { kind: 'still', stage: bed - 1 },
    { kind: 'dam', chainage: length / 2, stageAbove: crest + 6 * random(), stageBelow: null },
    {
      kind: 'profile',
      chainages: [0, length],
      stages: [crest + 1 + 2 * random(), bed + 1 + 2 * random()],
      flows: [5, 5],
    },
    ...(wild || downstream.kind === 'wall' ? [] : [{ kind: 'steady' } as const]),
  ]);
  const caseFile = buildCase({
    sections: plain,
    upstream: pick<CaseFile['upstream']>([
      { kind: 'inflow', times: [0, 300, 900], flows: [base, peak, base] },
      { kind: 'inflow', times: [0, 1], flows: [0, peak] },
      { kind: 'wall' },
      { kind: 'stage', ...steadyStage(crest + 3 * random()) },
    ]),
    downstream,
    laterals: pick([
      [],
      [{ from: 0.3 * length, to: 0.6 * length, times: [0, 600], flows: [0, 80 * random()] }],
      [{ from: 0.5 * length, to: 0.5 * length, times: [0], flows: [-60 * random()] }],
    ]),
    initial,
    numerics: {
      cellSize: pick([20, 30, 45]),
      duration: 900,
      outputInterval: 300,
      order: pick([1, 2, 2] as const),
    },
  });
  if (parts.valley) addValley(caseFile, chance);
  if (parts.structures) addStructures(caseFile, seed, chance);
  return caseFile;
}

function lowest({ points }: SectionInput): number {
  return Math.min(...points.map(([, z]) => z));
}

/** One structure of each kind in turn, in two of three cases a second one of any kind, in every fifth a reservoir. */
function addStructures(caseFile: CaseFile, seed: number, chance: Chance): void {
  const { sections } = caseFile;
  const length = sections[sections.length - 1].chainage;
  const bedAt = (x: number): number => {
    const k = Math.max(
      1,
      sections.findIndex(({ chainage }) => chainage >= x),
    );
    const [a, b] = [sections[k - 1], sections[k]];
    const f = (x - a.chainage) / (b.chainage - a.chainage);
    return (1 - f) * lowest(a) + f * lowest(b);
  };
  const places = [chance.between(0.2, 0.5) * length];
  if (chance.random() < 2 / 3) {
    places.push(chance.random() < 0.2 ? places[0] : chance.between(0.55, 0.9) * length);
  }
  if (seed % 5 === 4) {
    const bed = lowest(sections[0]);
    const full = bed + chance.between(3, 10);
    caseFile.upstream = {
      kind: 'reservoir',
      stages: [bed, full, full + 5],
      volumes: [0, chance.between(1e4, 5e5), chance.between(6e5, 2e6)],
      initialStage: bed + chance.random() * (full - bed),
      inflow: { times: [0, 600], flows: [20 * chance.random(), 300 * chance.random()] },
      spillway: { stages: [full - 1, full + 3], flows: [0, 400 * chance.random()] },
    };
    places.push(0);
  }
  caseFile.structures = places.map((chainage, k) => {
    const kind = k === 0 ? STRUCTURE_KINDS[seed % 5] : chance.pick(STRUCTURE_KINDS);
    const one = chainage === 0 && kind === 'bridge' ? 'weir' : kind;
    return drawStructure(one, `${one} ${k}`, chainage, bedAt(chainage), chance);
  });
}

function drawStructure(
  kind: StructureInput['kind'],
  id: string,
  chainage: number,
  bed: number,
  { random, between, pick }: Chance,
): StructureInput {
  const crestFrom = (low: number, high: number): CrestPoint[] => {
    const level = bed + between(low, high);
    return [
      [0, level + random()],
      [between(5, 20), level],
      [between(25, 80), level + random()],
    ];
  };
  switch (kind) {
    case 'weir':
      return { kind, id, chainage, crest: crestFrom(0.3, 5), form: pick(['broad', 'sharp']) };
    case 'sluice':
      return {
        kind,
        id,
        chainage,
        width: between(2, 25),
        sill: bed + between(-0.5, 2),
        times: [0, 300, 600],
        openings: [pick([0, between(0, 2)]), between(0, 4), pick([0, between(0, 2)])],
      };
    case 'culvert': {
      const common = {
        kind,
        id,
        chainage,
        barrels: pick([1, 2, 4]),
        n: between(0.012, 0.03),
        length: between(8, 60),
        invertUp: bed + between(-0.3, 1),
        invertDown: bed + between(-1, 0.3),
        crest: crestFrom(2, 6),
      };
      const isBox = random() < 0.5;
      const inlet = pick(CULVERT_INLET_NAMES.filter((name) => name.startsWith('box') === isBox));
      return isBox
        ? { ...common, inlet, shape: 'box', width: between(1, 6), height: between(0.8, 3) }
        : { ...common, inlet, shape: 'circular', diameter: between(0.6, 3) };
    }
    case 'bridge':
      return {
        kind,
        id,
        chainage,
        piers: pick(PIER_SHAPE_NAMES),
        obstructed: between(0, 0.4),
        soffit: bed + between(1, 5),
        deck: crestFrom(5, 7),
      };
    case 'breach': {
      const crest = crestFrom(3, 9);
      const level = Math.min(...crest.map(([, z]) => z));
      const mode = pick(['overtopping', 'piping'] as const);
      const bottomLevel = bed + between(-0.2, 1);
      return {
        kind,
        id,
        chainage,
        crest,
        trigger: pick([
          { kind: 'time', time: between(0, 500) },
          { kind: 'stage', stage: level - between(-0.2, 1.5) },
        ]),
        mode,
        growth: pick(['linear', 'sine']),
        formationTime: pick([0, between(60, 900)]),
        bottomWidth: between(3, 0.9 * crest[2][0]),
        bottomLevel,
        sideSlope: between(0, 1.5),
        ...(mode === 'piping' && { startLevel: bottomLevel + 0.4 * (level - bottomLevel) }),
      };
    }
  }
}

/** Parts of the sections and of the stretch, each in about half of the cases. */
function addValley(caseFile: CaseFile, chance: Chance): void {
  const { random, between, pick } = chance;
  const { sections, numerics } = caseFile;
  const length = sections[sections.length - 1].chainage;
  const withStorage = random() < 0.5;
  const withEmbankments = random() < 0.5;
  for (const section of sections) {
    const { points, banks } = section;
    const first = points[0][0];
    const last = points[points.length - 1][0];
    if (!banks || !(banks[0] > first + 1) || !(banks[1] < last - 1)) continue;
    // The channel must be the lowest ground that water reaches first.
    const inside = points.filter(([x]) => x > banks[0] && x < banks[1]).map(([, z]) => z);
    if (!(Math.min(...inside) <= lowest(section))) continue;
    if (withStorage && random() < 0.8) {
      const level = random() < 0.4 ? { flowsAbove: lowest(section) + between(2, 7) } : {};
      const left = { from: first, to: between(first + 0.5, banks[0]), ...level };
      const right = { from: between(banks[1], last - 0.5), to: last };
      section.storage = pick([[left], [right], [left, right]]);
      // A slot without width at the bed can leave a storage part as the lowest ground.
      const faults = new Faults();
      checkStorage(faults, 'storage', section.storage, { points, banks }, undefined);
      if (faults.list.length > 0) delete section.storage;
    }
    if (withEmbankments && random() < 0.8) {
      const at = (x: number) => ({ offset: x, crest: groundAt(points, x) + between(0, 1.5) });
      section.embankments = pick([
        { left: at(banks[0]) },
        { right: at(banks[1]) },
        { left: at(between(first, banks[0])), right: at(between(banks[1], last)) },
      ]);
    }
  }
  if (random() < 0.5) numerics.momentum = 'compound';
  if (random() < 0.5) {
    const [from, to] = [between(0, 0.4) * length, between(0.6, 1) * length];
    caseFile.localLosses = [{ from, to, contraction: between(0, 0.5), expansion: between(0, 1) }];
  }
  if (random() < 0.5) {
    caseFile.roughnessFactors = [
      {
        from: between(0, 0.4) * length,
        to: between(0.6, 1) * length,
        part: pick(['all', 'channel', 'overbank']),
        depths: [0, between(0.5, 2), between(3, 6)],
        factors: [between(0.7, 2), between(0.5, 1.5), between(0.5, 1.5)],
      },
    ];
  }
}

function groundAt(points: readonly (readonly [number, number])[], offset: number): number {
  const k = Math.max(
    1,
    points.findIndex(([x]) => x >= offset),
  );
  const [[x0, z0], [x1, z1]] = [points[k - 1], points[k]];
  const here = x1 > x0 ? z0 + ((offset - x0) / (x1 - x0)) * (z1 - z0) : Math.max(z0, z1);
  return points.filter(([x]) => x === offset).reduce((top, [, z]) => Math.max(top, z), here);
}

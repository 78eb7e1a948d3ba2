import type { SectionInput, SectionPoint } from '../../../shared/case/caseFile';
import { seededRandom } from './seededRandom';

export interface NaturalReachOptions {
  length: number;
  /** Distance between sections, m. */
  spacing: number;
  slope: number;
  /** How strongly neighbouring sections differ: 0 prismatic, 1 a river. */
  roughness?: number;
}

/** A river with banks and floodplains, each section drawn by chance about a mean shape: a channel some 30 m wide
 *  and 3.5 m deep, plains of some 80 m on both sides that rise away from it. The lowest point lies
 *  mid-channel in every section. */
export function naturalReach(seed: number, options: NaturalReachOptions): SectionInput[] {
  const { length, spacing, slope, roughness = 1 } = options;
  const random = seededRandom(seed);
  const about = (mean: number, spread: number) =>
    mean * (1 + roughness * spread * (2 * random() - 1));
  const count = Math.round(length / spacing);
  return Array.from({ length: count + 1 }, (_, i): SectionInput => {
    const chainage = (length * i) / count;
    const bed = slope * (length - chainage) + roughness * 0.25 * (2 * random() - 1);
    const width = about(30, 0.2);
    const depth = about(3.5, 0.12);
    const plains = [about(80, 0.3), about(80, 0.3)];
    const rise = [about(0.012, 0.3), about(0.012, 0.3)];
    const bank = bed + depth;
    const left = plains[0] + 4;
    const right = left + width;
    const inChannel = (fraction: number, height: number): SectionPoint => [
      left + fraction * width,
      bed + height,
    ];
    const points: SectionPoint[] = [
      [0, bank + plains[0] * rise[0] + 6],
      [4, bank + plains[0] * rise[0]],
      [4 + about(0.5, 0.2) * plains[0], bank + about(0.4, 0.4) * plains[0] * rise[0]],
      [left, bank],
      inChannel(about(0.15, 0.3), about(0.25, 0.3) * depth),
      inChannel(0.5, 0),
      inChannel(about(0.85, 0.05), about(0.25, 0.3) * depth),
      [right, bank],
      [right + about(0.5, 0.2) * plains[1], bank + about(0.4, 0.4) * plains[1] * rise[1]],
      [right + plains[1], bank + plains[1] * rise[1]],
      [right + plains[1] + 4, bank + plains[1] * rise[1] + 6],
    ];
    return {
      id: `N${i}`,
      chainage,
      points,
      roughness: [
        [0, about(0.07, 0.15)],
        [left, about(0.035, 0.1)],
        [right, about(0.06, 0.15)],
      ],
      banks: [left, right],
    };
  });
}

/** Sections without likeness to each other, some on high ground: the hardest place for still water to rest. */
export function wildReach(seed: number, count: number, spacing: number): SectionInput[] {
  const random = seededRandom(seed);
  return Array.from({ length: count }, (_, i): SectionInput => {
    const base = 6 * random();
    const pointCount = 4 + Math.floor(10 * random());
    let offset = 0;
    const points = Array.from({ length: pointCount }, (_point, k): SectionPoint => {
      const point: SectionPoint = [offset, base + 5 * random()];
      const isWall = k > 0 && random() < 0.1;
      offset += isWall ? 0 : 1 + 25 * random();
      return point;
    });
    points.push([offset + 5, base + 5 * random()]);
    const section: SectionInput = {
      id: `W${i}`,
      chainage: i * spacing,
      points,
      roughness: [[0, 0.02 + 0.06 * random()]],
    };
    if (random() < 0.5) section.banks = [points[1][0], points[pointCount - 1][0] + 1];
    return section;
  });
}

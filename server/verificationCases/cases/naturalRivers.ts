import type { SectionInput } from '../../../shared/case/caseFile';
import { naturalProfile } from '../../solvers/exact/naturalProfile';
import { hydraulicsAt, stripsBetween } from '../../solvers/exact/polygonHydraulics';
import { findRoot } from '../../solvers/exact/tools/findRoot';
import { caseOf, GRAVITY, steadyFlow, steadyStage } from '../channels';
import type { Bounds, PublishedCase } from '../publishedCase';
import { naturalReach } from '../reaches/naturalReach';

const LENGTH = 10_000;
const SLOPE = 0.0006;

interface NaturalFlow {
  id: string;
  title: string;
  flow: number;
  where: string;
  bounds: Bounds;
}

function normalStage(section: SectionInput, flow: number): number {
  const strips = stripsBetween(section, section, 0);
  const bed = Math.min(...section.points.map(([, z]) => z));
  const carried = (stage: number) => hydraulicsAt(strips, stage).conveyance * Math.sqrt(SLOPE);
  return findRoot((stage) => carried(stage) - flow, bed + 0.05, bed + 15);
}

function steadyRiver({ id, title, flow, where, bounds }: NaturalFlow): PublishedCase {
  return {
    id,
    group: 'steady',
    title,
    setup:
      `${flow} m³/s, ${where}, in ten kilometres of an invented river with banks and floodplains, a section every 250 m, no two ` +
      'alike. The surface is integrated upstream from the outlet over the exact polygons of the ground.',
    source:
      'The gradually varied flow equation: V. T. Chow (1959), Open-Channel Hydraulics, McGraw-Hill, chapter 9, by an adaptive ' +
      'Runge-Kutta integration that shares no line with the solver. An independent computation, not a published table.',
    shows: 'What a steady stage in a river of irregular sections is worth in centimetres.',
    doesNotShow: 'What is uncertain of a real river: its roughness, its survey, its flood.',
    boundReason:
      'A quarter above what was left when the bounds were set. The largest differences stand where the ground has an edge, at ' +
      'surveyed sections.',
    grids: [100, 200, 400],
    bounds: { ...bounds, volume: 1e-12 },
    problem: (cells) => {
      const sections = naturalReach(7, { length: LENGTH, spacing: 250, slope: SLOPE });
      const stageAtEnd = normalStage(sections[sections.length - 1], flow);
      const places = Array.from({ length: cells }, (_, i) => ((cells - i - 0.5) * LENGTH) / cells);
      const stages = naturalProfile(sections, GRAVITY, flow, stageAtEnd, places).reverse();
      return {
        caseFile: caseOf(title, {
          sections,
          upstream: { kind: 'inflow', ...steadyFlow(flow) },
          downstream: { kind: 'stage', ...steadyStage(stageAtEnd) },
          initial: { kind: 'steady' },
          numerics: { cellSize: LENGTH / cells, duration: 3600, outputInterval: 3600 },
        }),
        exact: (x) => ({
          stage: stages[Math.min(cells - 1, Math.floor((x / LENGTH) * cells))],
          flow,
        }),
      };
    },
  };
}

export const naturalRivers: readonly PublishedCase[] = [
  steadyRiver({
    id: 'river-low',
    title: 'Natural river, in the channel',
    flow: 60,
    where: 'well below the banks',
    bounds: { stageL1: 3.4e-4, stageMax: 3e-3, flowMax: 6e-7, stageOrder: 1.6 },
  }),
  steadyRiver({
    id: 'river-bankfull',
    title: 'Natural river, over the banks',
    flow: 250,
    where: 'just over the banks',
    bounds: { stageL1: 3.4e-4, stageMax: 1.8e-3, flowMax: 2.5e-6, stageOrder: 1.6 },
  }),
  steadyRiver({
    id: 'river-flood',
    title: 'Natural river, high flood',
    flow: 700,
    where: 'high over the floodplains',
    bounds: { stageL1: 2.4e-4, stageMax: 1.6e-3, flowMax: 7e-6, stageOrder: 1.6 },
  }),
];

import type { CaseFile, Downstream, Upstream } from '../case/caseFile';
import type { StructureInput } from '../case/structures';
import type { ParameterKey } from './parameters';

/** What is different from the case of the run: values of parameters, and cells and output times of the set's own. */
export interface Variation extends Partial<Record<ParameterKey, number>> {
  /** m */
  cellSize?: number;
  /** s */
  outputInterval?: number;
}

/** The case with the variation applied; what is not named stays as it is. Pure. */
export function varyCase(caseFile: CaseFile, variation: Variation): CaseFile {
  const { roughness = 1, peakFlow = 1, cellSize, outputInterval } = variation;
  const { sections, upstream, downstream, laterals, structures, numerics } = caseFile;
  return {
    ...caseFile,
    sections:
      roughness === 1
        ? sections
        : sections.map((section) => ({
            ...section,
            roughness: section.roughness.map(([from, n]) => [from, n * roughness]),
          })),
    upstream: peakFlow === 1 ? upstream : scaledUpstream(upstream, peakFlow),
    downstream: variedDownstream(downstream, variation),
    laterals:
      peakFlow === 1
        ? laterals
        : laterals.map((lateral) => ({ ...lateral, flows: scalePeak(lateral.flows, peakFlow) })),
    structures: structures.map((structure) => variedStructure(structure, variation)),
    numerics: {
      ...numerics,
      ...(cellSize !== undefined && { cellSize }),
      ...(outputInterval !== undefined && { outputInterval }),
    },
  };
}

/**
 * Multiplies the peak by `factor` and keeps the base flow, the first value: Q' = Qb + s (Q - Qb) with s such that the largest
 * value becomes factor × the largest, never below 0. A constant flow is multiplied, one that only takes water out stays.
 */
export function scalePeak(flows: number[], factor: number): number[] {
  const base = flows[0];
  const peak = flows.reduce((most, flow) => Math.max(most, flow), -Infinity);
  if (!(peak > 0)) return flows;
  if (peak === base) return flows.map((flow) => flow * factor);
  const scale = Math.max(0, (factor * peak - base) / (peak - base));
  return flows.map((flow) => {
    const scaled = base + scale * (flow - base);
    return flow >= 0 ? Math.max(0, scaled) : scaled;
  });
}

function scaledUpstream(upstream: Upstream, factor: number): Upstream {
  if (upstream.kind === 'inflow') return { ...upstream, flows: scalePeak(upstream.flows, factor) };
  if (upstream.kind === 'reservoir') {
    const { inflow } = upstream;
    return { ...upstream, inflow: { ...inflow, flows: scalePeak(inflow.flows, factor) } };
  }
  return upstream;
}

function variedDownstream(
  downstream: Downstream,
  { outletSlope = 1, outletStage = 0 }: Variation,
): Downstream {
  switch (downstream.kind) {
    case 'normalDepth':
      return { ...downstream, slope: downstream.slope * outletSlope };
    case 'stage':
    case 'rating':
      return { ...downstream, stages: downstream.stages.map((stage) => stage + outletStage) };
    default:
      return downstream;
  }
}

/** The middle of a breach stays where it is. */
function variedStructure(
  structure: StructureInput,
  { breachWidth = 1, breachTime = 1 }: Variation,
): StructureInput {
  if (structure.kind !== 'breach') return structure;
  return {
    ...structure,
    bottomWidth: structure.bottomWidth * breachWidth,
    formationTime: structure.formationTime * breachTime,
  };
}

import type { Fault } from '../errors';
import type { ReservoirInflow, ScenarioBody, Upstream } from './schemas';

/** The changes that are asked for most; each is one number. */
export const SCENARIO_CHANGES = ['inflow', 'roughness', 'outletSlope', 'cellSize'] as const;
export type ScenarioChangeKind = (typeof SCENARIO_CHANGES)[number];
export interface ScenarioChange {
  kind: ScenarioChangeKind;
  /** A factor for inflow and roughness, m/m for the slope, m for the cells. */
  value: number;
}

/** Where in the body the change is seen. */
export const CHANGED_AT: Record<ScenarioChangeKind, string> = {
  inflow: 'upstream',
  roughness: 'roughnessFactors',
  outletSlope: 'downstream.slope',
  cellSize: 'numerics.cellSize',
};

/** Why a change cannot be made of this scenario; null where it can. */
export function whyNotChanged(body: ScenarioBody, kind: ScenarioChangeKind): string | null {
  if (kind === 'inflow' && !hasInflow(body.upstream))
    return 'The upstream end has no inflow that could be multiplied.';
  if (kind === 'outletSlope' && body.downstream.kind !== 'normalDepth')
    return 'The outlet is not at normal depth, so it has no slope.';
  return null;
}

/**
 * The scenario with one change: the inflow with its base flow times a factor, Manning's n of the whole reach (m) times a
 * factor, another outlet slope, or another cell size. The faults say why not.
 */
export function changeScenario(
  body: ScenarioBody,
  { kind, value }: ScenarioChange,
  reach: { from: number; to: number },
): { body: ScenarioBody; faults: Fault[] } {
  const reason = whyNotChanged(body, kind);
  if (reason) return { body, faults: [{ path: 'change.kind', message: reason }] };
  switch (kind) {
    case 'inflow':
      return { body: { ...body, upstream: scaled(body.upstream, value) }, faults: [] };
    case 'roughness': {
      const factor = { ...reach, part: 'all' as const, depths: [0], factors: [value] };
      const roughnessFactors = [...(body.roughnessFactors ?? []), factor];
      return { body: { ...body, roughnessFactors }, faults: [] };
    }
    case 'outletSlope':
      return { body: { ...body, downstream: { kind: 'normalDepth', slope: value } }, faults: [] };
    case 'cellSize':
      return { body: { ...body, numerics: { ...body.numerics, cellSize: value } }, faults: [] };
  }
}

const hasInflow = ({ kind }: Upstream) =>
  kind === 'generated' || kind === 'table' || kind === 'reservoir';

function scaled(upstream: Upstream, factor: number): Upstream {
  if (upstream.kind === 'reservoir')
    return { ...upstream, inflow: scaledInflow(upstream.inflow, factor) };
  return upstream.kind === 'generated' || upstream.kind === 'table'
    ? scaledInflow(upstream, factor)
    : upstream;
}

function scaledInflow(inflow: ReservoirInflow, factor: number): ReservoirInflow {
  const times = (flow: number | null) => (flow === null ? null : tidy(flow * factor));
  if (inflow.kind === 'table')
    return { ...inflow, flows: inflow.flows.map((flow) => tidy(flow * factor)) };
  return { ...inflow, baseFlow: times(inflow.baseFlow), peakFlow: times(inflow.peakFlow) };
}

/** 490 × 1.1 is 539, not 539.0000000000001. */
const tidy = (value: number) => Number(value.toPrecision(12));

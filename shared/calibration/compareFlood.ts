import { fitGauge } from './gaugeFit';
import {
  GAUGE_FLOW_TOLERANCE,
  GAUGE_STAGE_TOLERANCE,
  MARK_CONFIDENCES,
  MARK_KINDS,
  MARK_TOLERANCE,
} from './marks';
import { misfit } from './misfit';
import { summarise } from './residuals';
import type {
  GaugeFit,
  Mark,
  MarkResidual,
  ResidualSummary,
  RunResiduals,
  TimeValues,
} from './types';

/** What a computation says of a place; null off the reach. SI. */
export interface ComputedFlood {
  peakAt: (chainage: number) => { stage: number; depth: number } | null;
  seriesAt: (chainage: number) => Promise<ComputedSeries | null>;
}

export interface ComputedSeries {
  times: ArrayLike<number>;
  stage: ArrayLike<number>;
  flow: ArrayLike<number>;
}

export interface ObservedGauge {
  id: number;
  name: string;
  /** m. */
  chainage: number;
  startsAt: string | null;
  stage: TimeValues | null;
  flow: TimeValues | null;
}

export interface ObservedFlood {
  marks: Mark[];
  gauges: ObservedGauge[];
}

type Compared = Omit<RunResiduals, 'runId' | 'flood' | 'reported'>;

/** Thinner water than this is none, m. */
const DRY = 1e-3;
/** Points of a gauge's record that are kept for the drawing. */
const DRAWN = 300;

/**
 * What was observed of a flood against what was computed of it. `startsAt` is the clock time of the run's t = 0; without it
 * a record that has only clock times cannot be laid beside the run.
 */
export async function compareFlood(
  { marks, gauges }: ObservedFlood,
  computed: ComputedFlood,
  startsAt: string | null,
): Promise<Compared> {
  const residuals = marks.map((mark) => markResidual(mark, computed));
  const fits: GaugeFit[] = [];
  for (const gauge of gauges)
    for (const quantity of ['stage', 'flow'] as const)
      if (gauge[quantity]) fits.push(await fitOf(gauge, quantity, computed, startsAt));
  const summaryOf = (chosen: MarkResidual[]): ResidualSummary | null => {
    const known = chosen.filter((row) => row.residual !== null);
    return summarise(
      known.map((row) => row.residual!),
      known.map((row) => row.tolerance),
    );
  };
  return {
    marks: residuals,
    all: summaryOf(residuals),
    byKind: MARK_KINDS.flatMap((kind) => {
      const summary = summaryOf(residuals.filter(({ mark }) => mark.kind === kind));
      return summary ? [{ kind, summary }] : [];
    }),
    byConfidence: MARK_CONFIDENCES.flatMap((confidence) => {
      const summary = summaryOf(residuals.filter(({ mark }) => mark.confidence === confidence));
      return summary ? [{ confidence, summary }] : [];
    }),
    gauges: fits,
    misfit: misfit(errorsOf(residuals, fits)),
  };
}

/** The terms of the misfit: each mark, and each gauge once a quantity. */
const errorsOf = (marks: MarkResidual[], gauges: GaugeFit[]) => [
  ...marks.flatMap(({ residual, tolerance }) =>
    residual === null ? [] : [{ error: residual, tolerance }],
  ),
  ...gauges.flatMap(({ figures, quantity, series }) => {
    if (!figures) return [];
    const tolerance =
      quantity === 'stage'
        ? GAUGE_STAGE_TOLERANCE
        : GAUGE_FLOW_TOLERANCE * Math.max(...series!.observed.map(Math.abs));
    return tolerance > 0 ? [{ error: figures.rms, tolerance }] : [];
  }),
];

function markResidual(mark: Mark, computed: ComputedFlood): MarkResidual {
  const peak = computed.peakAt(mark.chainage);
  const tolerance = MARK_TOLERANCE[mark.confidence];
  if (!peak) return { mark, computed: null, why: 'offReach', residual: null, tolerance };
  if (peak.depth <= DRY) return { mark, computed: null, why: 'dry', residual: null, tolerance };
  return { mark, computed: peak.stage, why: null, residual: peak.stage - mark.level, tolerance };
}

async function fitOf(
  gauge: ObservedGauge,
  quantity: 'stage' | 'flow',
  computed: ComputedFlood,
  startsAt: string | null,
): Promise<GaugeFit> {
  const { id: gaugeId, name, chainage } = gauge;
  const about = { gaugeId, name, chainage, quantity };
  const without = (why: GaugeFit['why']): GaugeFit => ({
    ...about,
    why,
    figures: null,
    series: null,
  });
  if (gauge.startsAt !== null && startsAt === null) return without('noClock');
  const shift =
    gauge.startsAt === null ? 0 : (Date.parse(gauge.startsAt) - Date.parse(startsAt!)) / 1000;
  const series = await computed.seriesAt(chainage);
  if (!series) return without('offReach');
  const record = gauge[quantity]!;
  const observed = { times: record.times.map((t) => t + shift), values: record.values };
  const fit = fitGauge(observed, { times: series.times, values: series[quantity] });
  if (!fit) return without('noOverlap');
  const step = Math.max(1, Math.ceil(fit.matched.times.length / DRAWN));
  const top = fit.matched.observed.indexOf(Math.max(...fit.matched.observed));
  const kept = (values: number[]) => values.filter((_, i) => i % step === 0 || i === top);
  return {
    ...about,
    why: null,
    figures: fit.figures,
    series: {
      times: kept(fit.matched.times),
      observed: kept(fit.matched.observed),
      computed: kept(fit.matched.computed),
    },
  };
}

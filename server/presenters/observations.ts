import type { Gauge, GaugeRow, Mark, Observations } from '../../shared/calibration/types';
import type { GaugeModel } from '../models/Gauge';
import type { MarkModel } from '../models/Mark';

export const presentMark = (mark: MarkModel): Mark => ({
  id: mark.id,
  chainage: mark.chainage,
  level: mark.level,
  kind: mark.kind,
  confidence: mark.confidence,
  flood: mark.flood,
  observedOn: mark.observedOn,
  note: mark.note,
});

export const presentGaugeRow = (gauge: GaugeModel): GaugeRow => ({
  id: gauge.id,
  name: gauge.name,
  chainage: gauge.chainage,
  flood: gauge.flood,
  startsAt: gauge.startsAt?.toISOString() ?? null,
  stageCount: gauge.stageCount,
  flowCount: gauge.flowCount,
  peakStage: gauge.peakStage,
  peakFlow: gauge.peakFlow,
});

export const presentGauge = (gauge: GaugeModel, record: Pick<Gauge, 'stage' | 'flow'>): Gauge => ({
  ...presentGaugeRow(gauge),
  ...record,
});

export const presentObservations = (marks: MarkModel[], gauges: GaugeModel[]): Observations => ({
  marks: marks.map(presentMark),
  gauges: gauges.map(presentGaugeRow),
  floods: [...new Set([...marks, ...gauges].map(({ flood }) => flood))],
});

import { useDeferredValue } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { valueAt } from '@/components/charts/geometry/interpolate';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { useTime } from '@/components/charts/usePlaceAndTime';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Run, RunStructure, RunStructureSeries } from '@/shared/runs/types';
import { REGIME_WORDS } from '@/shared/structures/structureWords';
import { formatWithUnit } from '@/shared/units/format';
import { Facts, type Fact } from '../Facts';
import { regimeAt } from './regimeAt';

interface Props {
  run: Run;
  structure: RunStructure;
  /** null while it is being read. */
  series: RunStructureSeries | null;
  store: PlaceAndTimeStore;
  /** Its name, where nothing above says it. */
  title: string | null;
  span: number;
}

/** Its peaks, and how it is at the chosen time. */
export function StructureNow({ structure, series, store, title, span }: Props) {
  const system = useUnitSystem();
  const t = useDeferredValue(useTime(store)) ?? 0;
  const { peak, regimes, breach, note } = structure;
  const level = (m: number) => formatWithUnit(m, 'elevation', system);
  const facts: Fact[] = [
    {
      name: 'Greatest flow',
      value: `${formatWithUnit(peak.flow, 'flow', system)} at ${shortTime(peak.flowTime, span)}`,
    },
    {
      name: 'Highest above',
      value: `${level(peak.stageUp)} at ${shortTime(peak.stageUpTime, span)}`,
    },
    { name: `At ${shortTime(t, span)}`, value: REGIME_WORDS[regimeAt(regimes, t).regime] },
  ];
  if (breach)
    facts.push({
      name: 'Breach',
      value:
        breach.begins === null
          ? 'does not begin within the run'
          : `begins at ${shortTime(breach.begins, span)}${growthAt(series, t, system)}`,
    });
  return (
    <>
      {title ? <Txt strong>{title}</Txt> : null}
      <Facts facts={facts} />
      {note ? <Txt tone="soft">{note}</Txt> : null}
    </>
  );
}

function growthAt(
  series: RunStructureSeries | null,
  t: number,
  system: ReturnType<typeof useUnitSystem>,
): string {
  if (!series?.breach) return '';
  const width = valueAt(series.times, series.breach.width, t);
  if (!(width > 0)) return '';
  const bottom = valueAt(series.times, series.breach.bottom, t);
  return `; now ${formatWithUnit(width, 'length', system)} wide at ${formatWithUnit(bottom, 'elevation', system)}`;
}

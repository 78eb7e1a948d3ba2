import { peakOf, type Series } from '@/components/charts/geometry/hydrographModel';

/** At most about `limit` rows of a series, evenly taken; the first, the last and the highest always among them. */
export function tableRows(series: Series, limit: number): { time: number; value: number }[] {
  const { times, values } = series;
  const step = Math.max(1, Math.ceil(times.length / limit));
  const peakTime = peakOf(series)?.time;
  const rows: { time: number; value: number }[] = [];
  for (let i = 0; i < times.length; i++)
    if (i % step === 0 || i === times.length - 1 || times[i] === peakTime)
      rows.push({ time: times[i], value: values[i] });
  return rows;
}

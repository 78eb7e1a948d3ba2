import type { ObservedFlood } from '../../../shared/calibration/compareFlood';
import { presentMark } from '../../presenters/observations';
import type { ObservationsService } from '../observations';

/** Everything that was observed of one flood in a study. */
export async function observedFlood(
  { marks, gauges }: ObservationsService,
  studyId: number,
  flood: string,
): Promise<ObservedFlood> {
  const [allMarks, allGauges] = await Promise.all([marks.list(studyId), gauges.list(studyId)]);
  const chosen = allGauges.filter((gauge) => gauge.flood === flood);
  return {
    marks: allMarks.filter((mark) => mark.flood === flood).map(presentMark),
    gauges: await Promise.all(
      chosen.map(async (gauge) => ({
        id: gauge.id,
        name: gauge.name,
        chainage: gauge.chainage,
        startsAt: gauge.startsAt?.toISOString() ?? null,
        ...(await gauges.recordOf(gauge)),
      })),
    ),
  };
}

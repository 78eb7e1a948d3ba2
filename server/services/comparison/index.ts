import type { CaseFile } from '../../../shared/case/caseFile';
import { caseDifferences } from '../../../shared/comparison/caseDifferences';
import type { ComparedPlace, RunComparison } from '../../../shared/comparison/types';
import { invalid } from '../../errors';
import type { RunModel } from '../../models/Run';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import { peaksAt } from '../../results/peaksAt';
import type { buildRuns } from '../runs';
import { assertRouted } from '../runs/readResults';

/** Differences listed; sections of two surveys can differ by the hundred. */
const LISTED = 400;

/** Runs side by side: what they say of the same places, and which inputs make the difference. */
export function buildComparison(
  { models }: Platform,
  runs: Pick<ReturnType<typeof buildRuns>, 'exports' | 'results'>,
) {
  /** In the order asked. Throws `invalid` where one is not of the study, `conflict` where one is not routed. */
  async function found(study: StudyModel, ids: number[]): Promise<RunModel[]> {
    const rows = await models.Run.findAll({ where: { id: ids, studyId: study.id } });
    const ordered = ids.map((id) => rows.find((run) => run.id === id));
    return ordered.map((run) => {
      if (!run)
        throw invalid([
          { path: 'runs', message: 'One of these runs is not of this study. Choose again.' },
        ]);
      assertRouted(run);
      return run;
    });
  }

  return async (study: StudyModel, ids: number[]): Promise<RunComparison> => {
    const compared = await found(study, ids);
    const cases: CaseFile[] = [];
    for (const run of compared)
      cases.push(JSON.parse((await runs.exports.caseFile(run)).toString('utf8')));
    const peaks = await Promise.all(
      compared.map(async (run) => {
        const blocks = runs.results.open(run);
        const [facts, places] = await Promise.all([blocks.facts(), blocks.places()]);
        return (chainage: number) => peaksAt(places, facts.inflowPeak, chainage);
      }),
    );
    const placeOf = (place: Omit<ComparedPlace, 'peaks'>): ComparedPlace => ({
      ...place,
      peaks: peaks.map((at) => at(place.chainage)),
    });
    const stations = await runs.results.stations(study.id);
    const places = [
      ...stations.map(({ name, chainage }) => placeOf({ name, kind: 'station', chainage })),
      ...cases[0].sections.map(({ id, chainage }) =>
        placeOf({ name: id, kind: 'section', chainage }),
      ),
    ].filter((place) => place.peaks.some((peak) => peak !== null));
    const differences = caseDifferences(cases, study.unitSystem);
    return {
      runs: compared.map(({ id, number, scenarioName, startsAt, duration, caseHash }) => ({
        id,
        number,
        scenarioName,
        startsAt: startsAt?.toISOString() ?? null,
        duration,
        caseHash,
      })),
      places,
      differences: differences.slice(0, LISTED),
      differencesNotListed: Math.max(0, differences.length - LISTED),
      sameReach: cases.every((one) => shapeOf(one) === shapeOf(cases[0])),
    };
  };
}

const shapeOf = ({ sections }: CaseFile) =>
  JSON.stringify(sections.map(({ chainage, points }) => [chainage, points]));

import type { CaseFile } from '../../../shared/case/caseFile';
import { withPoints } from '../../../shared/reaches/edit/withPoints';
import type { PlanCollection } from '../../../shared/reaches/plan/geoJson';
import { planOf } from '../../../shared/reaches/plan/planOf';
import type { Section } from '../../../shared/surveys/types';
import { unpackJson } from '../../database/packedJson';
import { invalid } from '../../errors';
import type { ReachModel } from '../../models/Reach';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { buildRuns } from '../runs';

/** Plans as GeoJSON. Each throws `invalid` where the study has not named its coordinate system or nothing has coordinates. */
export function buildPlans(
  { models }: Platform,
  runs: Pick<ReturnType<typeof buildRuns>, 'exports' | 'results'>,
) {
  const { Reach, Study } = models;

  async function ofReach(reach: ReachModel): Promise<PlanCollection> {
    const sections = await unpackJson<Section[]>(reach.sections);
    return planOf(placed(sections), await coordinateSystemOf(reach.studyId));
  }

  /** On the sections as they were routed, placed by the coordinates that the reach has for them. Throws `conflict` before there are results. */
  async function ofRun(run: RunModel): Promise<PlanCollection> {
    const { sections: peaks } = await runs.results.summary(run);
    const coordinateSystem = await coordinateSystemOf(run.studyId);
    const reach = await Reach.scope('withSections').findByPk(run.reachId, { rejectOnEmpty: true });
    const known = new Map((await unpackJson<Section[]>(reach.sections)).map((s) => [s.id, s]));
    const routed = JSON.parse((await runs.exports.caseFile(run)).toString('utf8')) as CaseFile;
    const sections = routed.sections.map(({ id, chainage, points, embankments }): Section => {
      const section = known.get(id);
      const bare = { id, chainage, points, roughness: [], banks: null, coordinates: null };
      return section ? { ...withPoints(section, points), chainage, embankments } : bare;
    });
    const peakStages = new Map(peaks.map(({ id, peakStage }) => [id, peakStage]));
    return planOf(placed(sections), coordinateSystem, { number: run.number, peakStages });
  }

  async function coordinateSystemOf(studyId: number): Promise<string> {
    const { coordinateSystem } = await Study.findByPk(studyId, { rejectOnEmpty: true });
    if (coordinateSystem === '')
      throw invalid([
        {
          path: 'coordinateSystem',
          message:
            'Name the coordinate system of the study first: without it nobody can place the coordinates.',
        },
      ]);
    return coordinateSystem;
  }

  return { ofReach, ofRun };
}

function placed(sections: Section[]): Section[] {
  if (sections.some(({ coordinates }) => coordinates)) return sections;
  throw invalid([
    {
      path: 'sections',
      message: 'No section has coordinates. Hand in a survey with easting and northing.',
    },
  ]);
}

export type PlansService = ReturnType<typeof buildPlans>;

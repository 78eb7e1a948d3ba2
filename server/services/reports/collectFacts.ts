import type { Section } from '../../../shared/surveys/types';
import { unpackJson } from '../../database/packedJson';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { ReportFacts } from '../../reports/types';
import type { ReviewsService } from '../review';
import type { buildConfidence } from '../confidence';
import { confidenceFacts } from './confidenceFacts';
import type { buildRuns } from '../runs';

export interface FactsNeeds {
  reviews: Pick<ReviewsService, 'read' | 'signedRecord'>;
  runs: ReturnType<typeof buildRuns>;
  confidence: ReturnType<typeof buildConfidence>;
  /** Against the observed flood that was chosen for the report. */
  observedOf: (run: RunModel) => Promise<ReportFacts['observed']>;
}

/** What a report says of a run: as it was fixed by the signature, or before it as it stands. */
export function buildCollectFacts(
  { env, models }: Platform,
  { confidence, observedOf, reviews, runs }: FactsNeeds,
) {
  const { Firm, Reach, SurveyRevision } = models;

  /** Needs a run read by `find.load`. */
  return async (run: RunModel): Promise<ReportFacts> => {
    const study = run.study!;
    // Rights are no part of a report; whoever asks, it says the same.
    const nobody = { id: run.requestedBy, firmId: study.firmId, roles: [] };
    const [review, record, firm, reach] = await Promise.all([
      reviews.read(run, nobody),
      reviews.signedRecord(run.id),
      Firm.findByPk(study.firmId, { rejectOnEmpty: true }),
      Reach.findByPk(run.reachId, { rejectOnEmpty: true }),
    ]);
    const survey = await SurveyRevision.scope('withSections').findByPk(reach.surveyRevisionId, {
      include: 'sender',
      rejectOnEmpty: true,
    });
    const { clientName, place, purpose, title, unitSystem, verticalDatum } = study;
    const { signOff } = review;
    return {
      firmName: record?.firmName ?? firm.name,
      study: record?.study ?? { title, clientName, place, verticalDatum, purpose, unitSystem },
      survey: {
        revision: survey.revision,
        fileName: survey.fileName,
        fileHash: survey.fileHash,
        note: survey.note,
        sectionCount: survey.sectionCount,
        pointCount: survey.pointCount,
        firstChainage: survey.firstChainage,
        lastChainage: survey.lastChainage,
        sentBy: survey.sender!.name,
        sentAt: survey.sentAt.toISOString(),
      },
      surveyed: await unpackJson<Section[]>(survey.sections),
      run: {
        number: run.number,
        scenarioName: run.scenarioName,
        requestedBy: run.requester!.name,
        requestedAt: run.requestedAt.toISOString(),
        finishedAt: run.finishedAt!.toISOString(),
        startsAt: run.startsAt?.toISOString() ?? null,
        caseHash: run.caseHash,
        solverVersion: run.solverVersion,
      },
      stations: record?.stations ?? (await runs.results.stations(run.studyId)),
      confidence: confidenceFacts(
        await confidence.read.ofCase(study.firmId, run.caseHash),
        record?.study.unitSystem ?? unitSystem,
        signOff?.at ?? null,
      ),
      observed: record ? (record.observed ?? null) : await observedOf(run),
      review:
        review.state === null
          ? null
          : {
              sentAt: review.sentAt,
              method: review.method,
              assumptions: review.assumptions,
              limits: review.limits,
              checklist: review.checklist,
              points: review.points,
            },
      signOff: signOff && {
        by: signOff.by.name,
        qualification: signOff.qualification,
        registrationNumber: signOff.registrationNumber,
        statement: signOff.statement,
        at: signOff.at,
        verificationCode: signOff.verificationCode,
        supersedesRunNumber: signOff.supersedesRunNumber,
      },
      withdrawal: signOff?.withdrawal ?? null,
      verificationAddress: `${env.publicUrl}/verify`,
    };
  };
}

import { Router, type Request, type Response } from 'express';
import {
  matchChoiceSchema,
  surveyDecisionSchema,
  surveyFormSchema,
} from '../../shared/surveys/schemas';
import type { MatchChoice } from '../../shared/surveys/types';
import type { Services } from '../composition';
import { AppError, invalid } from '../errors';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { sendWorkbook } from '../middleware/sendWorkbook';
import { fileOf, uploadFile } from '../middleware/uploadFile';
import { check, validate } from '../middleware/validate';
import type { StudyModel } from '../models/Study';
import type { SurveyRefusalModel } from '../models/SurveyRefusal';
import type { SurveyRevisionModel } from '../models/SurveyRevision';
import { presentRefusal, presentRevision, presentRevisionRow } from '../presenters/surveys';
import { faultsWorkbook } from '../workbooks/faultsWorkbook';

export function surveyRoutes({ authenticate, studies, surveys, uploads }: Services): Router {
  const router = Router();
  const study: Loader<StudyModel> = (req, actor) => studies.load(pathId(req, 'studyId'), actor);
  const revision: Loader<SurveyRevisionModel> = (req, actor) =>
    surveys.load(pathId(req, 'surveyId'), actor);
  const refusal: Loader<SurveyRefusalModel> = (req, actor) =>
    surveys.loadRefusal(pathId(req, 'refusalId'), actor);

  /** What was sent: a file in the form, or one that arrived before part by part. */
  const sent = async (req: Request, res: Response) => {
    const study = recordOf<StudyModel>(res);
    const { uploadId } = req.body as { uploadId?: number };
    const file = uploadId ? await uploads.fileOf(uploadId, study, actorOf(res)) : fileOf(req);
    return { study, file, choice: await choiceOf(req) };
  };

  router.get(
    '/studies/:studyId/surveys',
    authenticate,
    authorize('survey.list', study),
    async (_req, res) => {
      const { revisions, refusals } = await surveys.list(recordOf(res), actorOf(res));
      res.json({
        revisions: revisions.map(presentRevisionRow),
        refusals: refusals.map(presentRefusal),
      });
    },
  );

  router.post(
    '/studies/:studyId/surveys/read',
    authenticate,
    authorize('survey.send', study),
    uploadFile,
    validate(surveyFormSchema),
    async (req, res) => {
      res.json(await surveys.read(await sent(req, res)));
    },
  );

  router.post(
    '/studies/:studyId/surveys',
    authenticate,
    authorize('survey.send', study),
    uploadFile,
    validate(surveyFormSchema),
    async (req, res) => {
      const { note, uploadId } = req.body as { note: string; uploadId?: number };
      const actor = actorOf(res);
      try {
        const taken = await surveys.accept({ ...(await sent(req, res)), actor, note });
        if (uploadId) await uploads.remove(uploadId);
        res.status(201).json(presentRevisionRow(taken));
      } catch (error) {
        // Nothing is kept of a file that is refused.
        const refused = error instanceof AppError && error.code === 'surveyRefused';
        if (refused && uploadId) await uploads.remove(uploadId);
        throw error;
      }
    },
  );

  router.get(
    '/surveys/:surveyId',
    authenticate,
    authorize('survey.read', revision),
    async (_req, res) => {
      const record = recordOf<SurveyRevisionModel>(res);
      res.json(presentRevision(record, await surveys.sectionsOf(record)));
    },
  );

  router.post(
    '/surveys/:surveyId/decision',
    authenticate,
    authorize('survey.decide', revision),
    validate(surveyDecisionSchema),
    async (req, res) => {
      const record = recordOf<SurveyRevisionModel>(res);
      const actor = actorOf(res);
      await surveys.decide(record, actor, req.body);
      const again = (await surveys.load(record.id, actor))!.record;
      res.json(presentRevisionRow(again));
    },
  );

  router.get(
    '/refusals/:refusalId/faults.xlsx',
    authenticate,
    authorize('survey.read', refusal),
    (_req, res) => {
      const { fileName, faults } = recordOf<SurveyRefusalModel>(res);
      sendWorkbook(res, 'faults.xlsx', faultsWorkbook(fileName, faults));
    },
  );
  return router;
}

/** The person's own match of columns, sent as JSON in a field of the form. */
async function choiceOf(req: Request): Promise<MatchChoice | null> {
  const text: string | undefined = req.body.match;
  if (!text) return null;
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    throw invalid([{ path: 'match', message: 'The match of columns could not be read.' }]);
  }
  return check<MatchChoice>(matchChoiceSchema, value);
}

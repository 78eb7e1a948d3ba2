import { Router, type Request } from 'express';
import { matchChoiceSchema, surveyFormSchema } from '../../shared/surveys/schemas';
import type { MatchChoice } from '../../shared/surveys/types';
import type { Services } from '../composition';
import { invalid } from '../errors';
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

export function surveyRoutes({ authenticate, studies, surveys }: Services): Router {
  const router = Router();
  const study: Loader<StudyModel> = (req, actor) => studies.load(pathId(req, 'studyId'), actor);
  const revision: Loader<SurveyRevisionModel> = (req, actor) =>
    surveys.load(pathId(req, 'surveyId'), actor);
  const refusal: Loader<SurveyRefusalModel> = (req, actor) =>
    surveys.loadRefusal(pathId(req, 'refusalId'), actor);

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
      const sent = {
        study: recordOf<StudyModel>(res),
        file: fileOf(req),
        choice: await choiceOf(req),
      };
      res.json(await surveys.read(sent));
    },
  );

  router.post(
    '/studies/:studyId/surveys',
    authenticate,
    authorize('survey.send', study),
    uploadFile,
    validate(surveyFormSchema),
    async (req, res) => {
      const accepted = await surveys.accept({
        study: recordOf<StudyModel>(res),
        actor: actorOf(res),
        file: fileOf(req),
        choice: await choiceOf(req),
        note: req.body.note,
      });
      res.status(201).json(presentRevisionRow(accepted));
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

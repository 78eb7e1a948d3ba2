import { Router } from 'express';
import { memberSchema, studySchema } from '../../shared/studies/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { validate } from '../middleware/validate';
import type { StudyModel } from '../models/Study';
import type { Actor } from '../policies/subject';
import { allowedIn, presentMember, presentStudy, presentStudyRow } from '../presenters/studies';

export function studyRoutes({ authenticate, members, studies }: Services): Router {
  const router = Router();
  const load: Loader<StudyModel> = (req, actor) => studies.load(pathId(req, 'studyId'), actor);

  /** The counts tell of work that not everybody may see. */
  async function present(actor: Actor, study: StudyModel) {
    const loaded = await studies.load(study.id, actor);
    const allowed = allowedIn(actor, loaded!.subject);
    const counts = allowed.includes('reach.read') ? await studies.counts(study) : null;
    return presentStudy(loaded!.record, allowed, counts);
  }

  router.get('/studies', authenticate, authorize('study.list'), async (_req, res) => {
    res.json((await studies.list(actorOf(res))).map(presentStudyRow));
  });

  router.post(
    '/studies',
    authenticate,
    validate(studySchema),
    authorize('study.create'),
    async (req, res) => {
      const actor = actorOf(res);
      res.status(201).json(await present(actor, await studies.create(actor, req.body)));
    },
  );

  router.get(
    '/studies/:studyId',
    authenticate,
    authorize('study.read', load),
    async (_req, res) => {
      res.json(await present(actorOf(res), recordOf<StudyModel>(res)));
    },
  );

  router.patch(
    '/studies/:studyId',
    authenticate,
    validate(studySchema),
    authorize('study.change', load),
    async (req, res) => {
      const study = await studies.change(recordOf<StudyModel>(res), req.body);
      res.json(await present(actorOf(res), study));
    },
  );

  router.get(
    '/studies/:studyId/members',
    authenticate,
    authorize('study.share', load),
    async (_req, res) => {
      res.json((await members.list(recordOf(res))).map(presentMember));
    },
  );

  router.put(
    '/studies/:studyId/members',
    authenticate,
    validate(memberSchema),
    authorize('study.share', load),
    async (req, res) => {
      res.json((await members.put(recordOf(res), req.body)).map(presentMember));
    },
  );

  router.delete(
    '/studies/:studyId/members/:userId',
    authenticate,
    authorize('study.share', load),
    async (req, res) => {
      await members.remove(recordOf(res), pathId(req, 'userId'));
      res.status(204).end();
    },
  );
  return router;
}

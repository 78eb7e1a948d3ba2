import { Router } from 'express';
import {
  duplicateScenarioSchema,
  newScenarioSchema,
  scenarioChangeSchema,
} from '../../shared/scenarios/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { validate } from '../middleware/validate';
import type { ScenarioModel } from '../models/Scenario';
import type { StudyModel } from '../models/Study';
import { presentScenario, presentScenarioRow } from '../presenters/scenarios';

export function scenarioRoutes({ authenticate, scenarios, studies }: Services): Router {
  const router = Router();
  const study: Loader<StudyModel> = (req, actor) => studies.load(pathId(req, 'studyId'), actor);
  const scenario: Loader<ScenarioModel> = (req, actor) =>
    scenarios.load(pathId(req, 'scenarioId'), actor);

  async function present(record: ScenarioModel) {
    const [counts, sections, system] = await Promise.all([
      scenarios.runCounts([record.id]),
      scenarios.sectionsOf(record),
      scenarios.unitSystemOf(record),
    ]);
    return presentScenario(record, counts.get(record.id) ?? 0, sections, system);
  }

  router.get(
    '/studies/:studyId/scenarios',
    authenticate,
    authorize('scenario.read', study),
    async (_req, res) => {
      const list = await scenarios.list(recordOf(res));
      const counts = await scenarios.runCounts(list.map(({ id }) => id));
      res.json(list.map((record) => presentScenarioRow(record, counts.get(record.id) ?? 0)));
    },
  );

  router.post(
    '/studies/:studyId/scenarios',
    authenticate,
    validate(newScenarioSchema),
    authorize('scenario.change', study),
    async (req, res) => {
      const made = await scenarios.create(recordOf(res), actorOf(res), req.body);
      res.status(201).json(await present(made));
    },
  );

  router.get(
    '/scenarios/:scenarioId',
    authenticate,
    authorize('scenario.read', scenario),
    async (_req, res) => {
      res.json(await present(recordOf(res)));
    },
  );

  router.put(
    '/scenarios/:scenarioId',
    authenticate,
    validate(scenarioChangeSchema),
    authorize('scenario.change', scenario),
    async (req, res) => {
      res.json(await present(await scenarios.save(recordOf(res), actorOf(res), req.body)));
    },
  );

  router.post(
    '/scenarios/:scenarioId/duplicate',
    authenticate,
    validate(duplicateScenarioSchema),
    authorize('scenario.change', scenario),
    async (req, res) => {
      const { name, change } = req.body;
      const made = await scenarios.duplicateChanged(recordOf(res), actorOf(res), name, change);
      res.status(201).json(await present(made));
    },
  );

  router.delete(
    '/scenarios/:scenarioId',
    authenticate,
    authorize('scenario.change', scenario),
    async (_req, res) => {
      await scenarios.remove(recordOf(res), actorOf(res));
      res.status(204).end();
    },
  );
  return router;
}

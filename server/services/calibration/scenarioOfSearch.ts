import { roughnessFactors } from '../../../shared/calibration/search/withFactors';
import type { SearchResult, SearchSettings } from '../../../shared/calibration/search/types';
import { buildCase } from '../../../shared/scenarios/buildCase';
import { checkScenario } from '../../../shared/scenarios/checkScenario';
import { notFound } from '../../errors';
import type { ScenarioModel } from '../../models/Scenario';
import type { TaskSetModel } from '../../models/TaskSet';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import { freezeCase } from '../runs/freezeCase';
import type { ScenariosService } from '../scenarios/scenarios';
import type { buildTasks } from '../tasks';

interface Needs {
  scenarios: ScenariosService;
  tasks: Pick<ReturnType<typeof buildTasks>, 'find'>;
}

/** A search proposes; a person makes a scenario of it. */
export function buildScenarioOfSearch({ models }: Platform, { scenarios, tasks }: Needs) {
  const { Scenario, Study } = models;

  /** The scenario that was searched, and whether it is still what was routed. */
  async function searched(set: TaskSetModel, actor: Actor) {
    const loaded = set.scenarioId === null ? null : await scenarios.load(set.scenarioId, actor);
    if (set.kind !== 'calibration' || !loaded) throw notFound();
    return loaded.record;
  }

  /** True where the scenario has changed since the run that was searched, so that a copy of it is another flood. */
  async function hasChanged(scenario: ScenarioModel, caseHash: string | null): Promise<boolean> {
    const [sections, study] = await Promise.all([
      scenarios.sectionsOf(scenario),
      Study.findByPk(scenario.studyId, { rejectOnEmpty: true }),
    ]);
    if (checkScenario(scenario.body, sections).faults.length > 0) return true;
    const now = buildCase(scenario.body, sections, `${study.title}: ${scenario.name}`);
    return (await freezeCase(now)).caseHash !== caseHash;
  }

  /** A copy of the scenario with the best multipliers. Throws `conflict` before the search has finished. */
  async function make(set: TaskSetModel, actor: Actor, name: string) {
    const scenario = await searched(set, actor);
    const { best } = await tasks.find.result<SearchResult>(set);
    const { stretches } = set.settings as SearchSettings;
    const changed = await hasChanged(scenario, set.caseHash);
    const found = roughnessFactors(
      stretches,
      best.factors.map((factor) => Number(factor.toFixed(3))),
    );
    const copy = await scenarios.duplicate(scenario, actor, name, (body) => ({
      ...body,
      roughnessFactors: [...(body.roughnessFactors ?? []), ...found],
    }));
    return { scenario: await Scenario.findByPk(copy.id, { rejectOnEmpty: true }), changed };
  }

  return { make };
}

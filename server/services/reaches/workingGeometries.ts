import { checkGeometry } from '../../../shared/reaches/edit/checkGeometry';
import { describeChange } from '../../../shared/reaches/edit/describeChange';
import { applyChange } from '../../../shared/reaches/edit/geometryChange';
import { LIMITS } from '../../../shared/limits';
import type { GeometryChangeBody } from '../../../shared/reaches/schemas';
import type { Section } from '../../../shared/surveys/types';
import { conflict, invalid } from '../../errors';
import type { ReachModel } from '../../models/Reach';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import { touchStudy } from '../studies/touchStudy';
import { buildReachVersions } from './reachVersions';

const INCLUDE = ['survey', 'updater'];

/** Faults sent back of one change; more would only be counted. */
const FAULTS = 100;

/** Working geometries: named copies of a reach in which everything may be changed, while the survey stays as it was. */
export function buildWorkingGeometries(platform: Platform) {
  const { audit, models, sequelize } = platform;
  const { Reach, ReachChange, Run, Scenario } = models;
  const versions = buildReachVersions(platform);

  /** Copies a reach of the study under a name. Throws `invalid` where there is no such reach or the name is taken. */
  async function copy(
    study: StudyModel,
    actor: Actor,
    { name, copyOf }: { name: string; copyOf: number },
  ): Promise<ReachModel> {
    const made = await sequelize.transaction(async (transaction) => {
      const source = await Reach.scope('withSections').findOne({
        where: { id: copyOf, studyId: study.id },
        transaction,
      });
      if (!source)
        throw invalid([{ path: 'copyOf', message: 'It is not of this study. Choose another.' }]);
      await refuseTakenName(study.id, name);
      const { surveyRevisionId, sections, sectionCount, firstChainage, lastChainage } = source;
      const reach = await Reach.create(
        {
          studyId: study.id,
          surveyRevisionId,
          copiedFrom: source.id,
          name,
          sections,
          sectionCount,
          firstChainage,
          lastChainage,
          updatedBy: actor.id,
        },
        { transaction },
      );
      const words = `Copied from ${source.name}, version ${source.version}`;
      await versions.remember(reach, actor, { words }, transaction);
      await touchStudy(platform, study.id, transaction);
      const record = { kind: 'reach', id: reach.id };
      await audit.note(
        { action: 'reach.copied', words: `Working geometry ${name}: ${words}`, record, actor },
        transaction,
      );
      return reach;
    });
    return again(made.id);
  }

  /**
   * Stores what was changed of the sections, all or nothing. Throws `conflict` where it is the reach of a survey or has
   * changed since, and `invalid` with every fault at `sections[XS-05].points[3][0]`.
   */
  async function save(
    reach: ReachModel,
    actor: Actor,
    { version, steps, ...change }: GeometryChangeBody,
  ): Promise<ReachModel> {
    refuseSurveyed(reach, 'Its sections stay as they were surveyed');
    await versions.next(reach, actor, version, (before) => {
      const sections = applyChange(before, change);
      refuseFaults(sections);
      return { sections, told: { words: describeChange(before, sections), steps } };
    });
    return again(reach.id);
  }

  async function rename(reach: ReachModel, actor: Actor, name: string): Promise<ReachModel> {
    refuseSurveyed(reach, 'It is called after its revision');
    if (name === reach.name) return again(reach.id);
    await refuseTakenName(reach.studyId, name);
    await sequelize.transaction(async (transaction) => {
      const words = `Renamed from ${reach.name} to ${name}`;
      await reach.update({ name, updatedBy: actor.id }, { transaction });
      await versions.remember(reach, actor, { words }, transaction);
      const record = { kind: 'reach', id: reach.id };
      await audit.note({ action: 'reach.renamed', words, record, actor }, transaction);
    });
    return again(reach.id);
  }

  /** Throws `conflict` where scenarios or runs stand on it. Copies of it then hang on what it was copied from. */
  async function remove(reach: ReachModel, actor: Actor): Promise<void> {
    refuseSurveyed(reach, 'It stands for its revision');
    await sequelize.transaction(async (transaction) => {
      await Reach.findByPk(reach.id, { transaction, lock: transaction.LOCK.UPDATE });
      const where = { reachId: reach.id };
      const scenarios = await Scenario.count({ where, transaction });
      const runs = await Run.count({ where, transaction });
      if (scenarios + runs > 0)
        throw conflict(
          `${reach.name} has ${scenarios > 0 ? counted(scenarios, 'scenario') : counted(runs, 'run')} on it. Choose another geometry there first.`,
        );
      await Reach.update(
        { copiedFrom: reach.copiedFrom },
        { where: { copiedFrom: reach.id }, silent: true, transaction },
      );
      await reach.destroy({ transaction });
      await touchStudy(platform, reach.studyId, transaction);
      const record = { kind: 'reach', id: reach.id };
      const words = `Working geometry removed: ${reach.name}`;
      await audit.note({ action: 'reach.removed', words, record, actor }, transaction);
    });
  }

  /** Newest first. */
  const history = (reach: ReachModel) =>
    ReachChange.findAll({
      where: { reachId: reach.id },
      include: 'changer',
      order: [['id', 'DESC']],
      limit: 200,
    });

  const again = (id: number): Promise<ReachModel> =>
    Reach.scope('withSections').findByPk(id, { include: INCLUDE, rejectOnEmpty: true });

  async function refuseTakenName(studyId: number, name: string): Promise<void> {
    if ((await Reach.count({ where: { studyId, name } })) > 0)
      throw invalid([
        { path: 'name', message: 'A geometry of this study has that name. Choose another.' },
      ]);
  }

  return { copy, save, rename, remove, history };
}

function refuseSurveyed({ copiedFrom, name }: ReachModel, why: string): void {
  if (copiedFrom === null)
    throw conflict(`${name} is the reach of a survey. ${why}; make a working geometry of it.`);
}

function refuseFaults(sections: Section[]): void {
  const faults = checkGeometry(sections).map(({ sectionId, path, message }) => ({
    path: `sections[${sectionId}]${path && `.${path}`}`,
    message: sectionId ? `${sectionId}: ${message}` : message,
  }));
  if (sections.length > LIMITS.upload.sections)
    faults.push({
      path: 'sections',
      message: `A reach holds at most ${LIMITS.upload.sections} sections.`,
    });
  if (faults.length > 0) throw invalid(faults.slice(0, FAULTS));
}

const counted = (count: number, what: string) => (count === 1 ? `a ${what}` : `${count} ${what}s`);

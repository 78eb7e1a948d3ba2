import type { QueueRow, Recipient } from '../../../shared/review/types';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';

/** What waits for a senior engineer, and to whom a modeller can send. */
export function buildQueue({ models }: Platform) {
  /** Runs of the firm in check, oldest first; those that one asked for oneself are left out: others sign them. */
  async function list(actor: Actor): Promise<QueueRow[]> {
    const reviews = await models.Review.findAll({
      where: { state: 'inCheck' },
      include: [
        {
          association: 'run',
          required: true,
          include: [
            { association: 'study', where: { firmId: actor.firmId }, required: true },
            { association: 'signOff', attributes: ['id'] },
          ],
        },
        'sender',
        { association: 'points', attributes: ['state'] },
      ],
      order: [
        ['sentAt', 'ASC'],
        ['id', 'ASC'],
      ],
    });
    return reviews
      .filter(({ run }) => !run!.signOff && run!.requestedBy !== actor.id)
      .map(({ points, run, sender, sentAt, sentTo }) => ({
        runId: run!.id,
        runNumber: run!.number,
        studyId: run!.studyId,
        studyTitle: run!.study!.title,
        scenarioName: run!.scenarioName,
        sentBy: sender!.name,
        sentAt: sentAt!.toISOString(),
        openPoints: points!.filter(({ state }) => state !== 'closed').length,
        mine: sentTo === actor.id,
      }));
  }

  async function recipients(actor: Actor): Promise<Recipient[]> {
    const people = await models.User.findAll({
      where: { firmId: actor.firmId, active: true },
      order: [['name', 'ASC']],
    });
    return people
      .filter(({ id, roles }) => roles.includes('seniorEngineer') && id !== actor.id)
      .map(({ id, name }) => ({ id, name }));
  }

  return { list, recipients };
}

import type { Background } from '../../background';
import type { Mailer, Message } from '../../mail/Mailer';
import type { RunModel } from '../../models/Run';
import type { UserModel } from '../../models/User';
import type { Platform } from '../../platform';

type Write = (to: UserModel, link: string) => Message;

/** Mails about checks; they go out after the change is kept, and one that fails does not undo it. */
export function buildTellOthers(
  { env, models }: Platform,
  { background, mailer }: { background: Background; mailer: Mailer },
) {
  const send = (
    what: string,
    people: () => Promise<UserModel[]>,
    write: (to: UserModel) => Message,
  ) =>
    background.run(what, async () => {
      for (const person of await people()) background.run(what, () => mailer.send(write(person)));
    });

  const active = (where: object) => models.User.findAll({ where: { ...where, active: true } });
  const pageOf = (run: RunModel) => `${env.publicUrl}/studies/${run.studyId}/runs/${run.id}/check`;

  return {
    /** Senior engineers of the firm that may sign the run, or the one who was asked. */
    seniors: (run: RunModel, sentTo: number | null, write: Write) =>
      send(
        'telling of a run to check',
        async () =>
          (
            await active({ firmId: run.study!.firmId, ...(sentTo !== null && { id: sentTo }) })
          ).filter(({ id, roles }) => roles.includes('seniorEngineer') && id !== run.requestedBy),
        (to) => write(to, pageOf(run)),
      ),

    /** Who asked for the run and who sent it. */
    modellers: (run: RunModel, sentBy: number | null, write: Write) =>
      send(
        'telling the modeller of a check',
        () => active({ id: [...new Set([run.requestedBy, sentBy ?? run.requestedBy])] }),
        (to) => write(to, pageOf(run)),
      ),

    /** The clients of the study. */
    clients: (run: RunModel, write: Write) =>
      send(
        'telling the client',
        async () => {
          const members = await models.StudyMember.findAll({
            where: { studyId: run.studyId, as: 'client' },
            include: 'user',
          });
          return members.map(({ user }) => user!).filter(({ active: isActive }) => isActive);
        },
        (to) => write(to, `${env.publicUrl}/studies/${run.studyId}`),
      ),
  };
}

export type TellOthers = ReturnType<typeof buildTellOthers>;

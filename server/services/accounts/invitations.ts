import type { InvitationBody } from '../../../shared/accounts/schemas';
import type { InvitationPreview } from '../../../shared/accounts/types';
import { linkSeconds, type OneTimeLinks } from '../../auth/oneTimeLinks';
import { AppError, conflict, forbidden, gone, invalid, notFound } from '../../errors';
import type { Mailer } from '../../mail/Mailer';
import { invitationMessage } from '../../mail/messages/invitation';
import type { InvitationModel } from '../../models/Invitation';
import type { Platform } from '../../platform';
import { may } from '../../policies/decide';
import type { Actor, Loaded } from '../../policies/subject';

/** Roles that see no more than the studies shared with them. */
const isGuest = (role: string): boolean => role === 'surveyor' || role === 'client';

/** Offers of accounts, by a link in mail. */
export function buildInvitations(
  { models, sequelize, log, now }: Platform,
  links: OneTimeLinks,
  mailer: Mailer,
) {
  const { Invitation, Study, User } = models;

  /** For `authorize`. */
  async function load(id: number): Promise<Loaded<InvitationModel> | null> {
    const invitation = await Invitation.findByPk(id, { include: 'invitedBy' });
    if (!invitation || invitation.withdrawnAt) return null;
    const { firmId, invitedById: ownerId } = invitation;
    return { record: invitation, subject: { firmId, ownerId } };
  }

  /** Newest first: all of the firm for administrators, one's own for others. */
  const list = (actor: Actor): Promise<InvitationModel[]> =>
    Invitation.findAll({
      where: {
        firmId: actor.firmId,
        withdrawnAt: null,
        ...(!actor.roles.includes('administrator') && { invitedById: actor.id }),
      },
      include: 'invitedBy',
      order: [['id', 'DESC']],
    });

  /** Throws `forbidden`, `invalid`, `notFound` (study), `conflict` (has an account), `unavailable` (mail). */
  async function create(actor: Actor, body: InvitationBody): Promise<InvitationModel> {
    const { email, roles, studyId } = await checked(actor, body);
    const invitation = await Invitation.create({
      firmId: actor.firmId,
      email,
      roles,
      studyId,
      invitedById: actor.id,
      expiresAt: expiry(),
    });
    await send(invitation);
    return invitation.reload({ include: 'invitedBy' });
  }

  async function checked(actor: Actor, { email, roles, studyId }: InvitationBody) {
    const guestsOnly = roles.every(isGuest);
    if (!actor.roles.includes('administrator')) {
      if (!guestsOnly)
        throw forbidden('Only an administrator of your firm may invite people with this role.');
      if (studyId === null)
        throw invalid([{ path: 'studyId', message: 'Choose the study to share.' }]);
    }
    if (studyId !== null) {
      const study = await Study.findByPk(studyId);
      if (!study || !may(actor, 'study.share', study)) throw notFound('The study');
      if (!roles.some(isGuest))
        throw invalid([
          { path: 'studyId', message: 'Only surveyors and clients are invited to one study.' },
        ]);
    }
    const account = await User.findOne({ where: { email, firmId: actor.firmId } });
    if (account)
      throw conflict(
        account.active
          ? 'This person has an account in your firm already. Share the study with them instead.'
          : 'This person has an account in your firm that is not active. An administrator can make it active again.',
      );
    return { email, roles: [...new Set(roles)], studyId };
  }

  /** A new link, for another week; the earlier one ends. Throws `conflict` where it was accepted. */
  async function resend(invitation: InvitationModel): Promise<void> {
    refuseAccepted(invitation);
    await invitation.update({ expiresAt: expiry() });
    await send(invitation);
  }

  /** Throws `conflict` where it was accepted. */
  async function withdraw(invitation: InvitationModel): Promise<void> {
    refuseAccepted(invitation);
    await sequelize.transaction(async (transaction) => {
      await invitation.update({ withdrawnAt: now() }, { transaction });
      await links.end('invitation', { invitationId: invitation.id }, transaction);
    });
  }

  function refuseAccepted({ acceptedAt }: InvitationModel): void {
    if (acceptedAt) throw conflict('This invitation was accepted already.');
  }

  const expiry = () => new Date(now().getTime() + linkSeconds('invitation') * 1000);

  async function send(invitation: InvitationModel): Promise<void> {
    const link = await links.issue('invitation', { invitationId: invitation.id });
    const { firm, invitedBy } = await invitation.reload({ include: ['firm', 'invitedBy'] });
    const study = invitation.studyId ? await Study.findByPk(invitation.studyId) : null;
    const message = invitationMessage({
      to: invitation.email,
      firmName: firm!.name,
      invitedBy: invitedBy!.name,
      roles: invitation.roles,
      studyTitle: study?.title ?? null,
      link,
      days: linkSeconds('invitation') / 86_400,
    });
    await mailer.send(message).catch((cause: unknown) => {
      log.error({ err: cause }, 'an invitation could not be mailed');
      throw new AppError(
        'unavailable',
        'The invitation is kept, but the mail server did not take the message. Send it again from the list later.',
        { cause },
      );
    });
  }

  /** Whom a link invites, and to what. Throws `gone`. */
  async function look(token: string): Promise<InvitationPreview> {
    const { invitationId } = await links.look('invitation', token);
    const invitation = await Invitation.findByPk(invitationId!, { include: 'firm' });
    if (!invitation || invitation.withdrawnAt || invitation.acceptedAt)
      throw gone('This invitation is no longer open. Ask for a new one.');
    const { email, firm, roles } = invitation;
    return { email, firmName: firm!.name, roles };
  }

  return { load, list, create, resend, withdraw, look };
}

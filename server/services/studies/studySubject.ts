import type { Models } from '../../models';
import type { StudyModel } from '../../models/Study';
import type { Actor, Subject } from '../../policies/subject';

/** What the policies must know of a study and the person who asks for it, or for anything in it. */
export async function studySubject(
  { StudyMember }: Models,
  study: StudyModel,
  actor: Actor,
): Promise<Subject> {
  const { firmId } = study;
  if (firmId !== actor.firmId) return { firmId };
  const member = await StudyMember.findOne({ where: { studyId: study.id, userId: actor.id } });
  return { firmId, memberAs: member?.as ?? null };
}

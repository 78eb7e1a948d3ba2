import type { SurveyDecision } from '../../../shared/surveys/types';
import type { Background } from '../../background';
import type { Mailer } from '../../mail/Mailer';
import {
  handedInMessage,
  surveyAcceptedMessage,
  surveyReturnedMessage,
} from '../../mail/messages/survey';
import type { StudyModel } from '../../models/Study';
import type { SurveyRevisionModel } from '../../models/SurveyRevision';
import type { Platform } from '../../platform';

/** Mails about surveys; they go out after the change is kept, and one that fails does not undo it. */
export function buildTellOfSurveys(
  { env, models }: Platform,
  { background, mailer }: { background: Background; mailer: Mailer },
) {
  const pageOf = (study: StudyModel, revision: SurveyRevisionModel) =>
    `${env.publicUrl}/studies/${study.id}/survey?revision=${revision.id}`;
  const nameOf = async (id: number) => (await models.User.findByPk(id))?.name ?? 'Somebody';

  return {
    /** To whoever made the study, where somebody else has handed in. */
    handedIn: (study: StudyModel, revision: SurveyRevisionModel) =>
      background.run('telling of a survey', async () => {
        const to = await models.User.findByPk(study.createdBy);
        if (!to?.active || to.id === revision.sentBy) return;
        await mailer.send(
          handedInMessage({
            to: to.email,
            study: study.title,
            revision,
            by: await nameOf(revision.sentBy),
            link: pageOf(study, revision),
          }),
        );
      }),

    /** To the surveyor. */
    decided: (
      study: StudyModel,
      revision: SurveyRevisionModel,
      { id }: { id: number },
      decision: SurveyDecision['decision'],
      remarks: string,
    ) =>
      background.run('telling a surveyor', async () => {
        const to = await models.User.findByPk(revision.sentBy);
        if (!to?.active || to.id === id) return;
        const write = decision === 'accepted' ? surveyAcceptedMessage : surveyReturnedMessage;
        const by = await nameOf(id);
        const link = pageOf(study, revision);
        await mailer.send(write({ to: to.email, study: study.title, revision, by, link, remarks }));
      }),
  };
}

export type TellOfSurveys = ReturnType<typeof buildTellOfSurveys>;

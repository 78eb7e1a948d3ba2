import type { Role } from '../../shared/accounts/roles';
import { asClient, asSurveyor, both, inFirm, issued, notOwn, own, type Condition } from './subject';

/** Who may do it, by role and condition. Of several roles of a person one that allows is enough. */
export interface Policy {
  grants: Partial<Record<Role, Condition>>;
  /**
   * What a refusal tells: `forbidden` for what everybody knows is there, the name of another action where those who
   * may do that one may know (403), and `notFound` for what must look as if it did not exist (404).
   */
  refusal: 'forbidden' | 'notFound' | { seenBy: string };
}

const anybody: Policy['grants'] = {
  administrator: inFirm,
  modeller: inFirm,
  seniorEngineer: inFirm,
  surveyor: inFirm,
  client: inFirm,
};
const engineers: Policy['grants'] = { modeller: inFirm, seniorEngineer: inFirm };

const table = <T extends Record<string, Policy>>(rows: T) => rows;

/**
 * The one table of rights: every route declares one of these actions, or that it is public. Records of another firm are
 * refused before a row is looked at (`decide.ts`), so no row can open them.
 */
export const POLICIES = table({
  // One's own account
  'me.read': { grants: anybody, refusal: 'forbidden' },
  'me.change': { grants: anybody, refusal: 'forbidden' },

  // People of the firm
  'user.list': { grants: { administrator: inFirm, ...engineers }, refusal: 'forbidden' },
  'user.change': { grants: { administrator: inFirm }, refusal: { seenBy: 'user.list' } },
  'invitation.list': { grants: { administrator: inFirm, ...engineers }, refusal: 'forbidden' },
  'invitation.create': { grants: { administrator: inFirm, ...engineers }, refusal: 'forbidden' },
  'invitation.change': {
    grants: { administrator: inFirm, modeller: own, seniorEngineer: own },
    refusal: 'notFound',
  },

  // Studies
  'study.list': { grants: anybody, refusal: 'forbidden' },
  'study.create': { grants: engineers, refusal: 'forbidden' },
  'study.read': {
    grants: { ...engineers, surveyor: asSurveyor, client: asClient },
    refusal: 'notFound',
  },
  'study.change': { grants: engineers, refusal: { seenBy: 'study.read' } },
  'study.share': { grants: engineers, refusal: { seenBy: 'study.read' } },
  'station.read': { grants: engineers, refusal: 'notFound' },
  'station.change': { grants: engineers, refusal: 'notFound' },

  // What was observed of real floods
  'observation.read': { grants: engineers, refusal: 'notFound' },
  'observation.change': { grants: engineers, refusal: 'notFound' },
  'calibration.read': { grants: engineers, refusal: 'notFound' },
  'calibration.change': { grants: engineers, refusal: 'notFound' },

  // Surveys: surveyors see what they sent themselves
  'survey.list': { grants: { ...engineers, surveyor: asSurveyor }, refusal: 'notFound' },
  'survey.send': {
    grants: { ...engineers, surveyor: asSurveyor },
    refusal: { seenBy: 'study.read' },
  },
  'survey.read': { grants: { ...engineers, surveyor: both(asSurveyor, own) }, refusal: 'notFound' },
  'survey.decide': { grants: engineers, refusal: { seenBy: 'survey.read' } },
  'upload.change': {
    grants: { modeller: own, seniorEngineer: own, surveyor: both(asSurveyor, own) },
    refusal: 'notFound',
  },
  'template.read': { grants: { ...engineers, surveyor: inFirm }, refusal: 'forbidden' },

  // Reaches and scenarios
  'reach.read': { grants: engineers, refusal: 'notFound' },
  'reach.change': { grants: engineers, refusal: 'notFound' },
  'scenario.read': { grants: engineers, refusal: 'notFound' },
  'scenario.change': { grants: engineers, refusal: 'notFound' },
  'table.read': { grants: engineers, refusal: 'forbidden' },

  // Runs: clients see what was issued of them by other addresses
  'run.read': { grants: engineers, refusal: 'notFound' },
  'run.request': { grants: engineers, refusal: 'notFound' },
  'run.change': { grants: engineers, refusal: 'notFound' },

  // Work beside the runs: convergence, sensitivity, ensembles, calibration, verification
  'taskSet.read': { grants: engineers, refusal: 'notFound' },
  'taskSet.request': { grants: engineers, refusal: 'notFound' },
  'taskSet.change': { grants: engineers, refusal: 'notFound' },

  // The check: whoever asked for a run does not sign it
  'review.read': { grants: engineers, refusal: 'notFound' },
  'review.send': { grants: { modeller: inFirm }, refusal: { seenBy: 'review.read' } },
  'review.answer': { grants: { modeller: inFirm }, refusal: { seenBy: 'review.read' } },
  'review.probe': { grants: engineers, refusal: 'notFound' },
  'review.raise': { grants: { seniorEngineer: inFirm }, refusal: { seenBy: 'review.read' } },
  'review.close': { grants: { seniorEngineer: inFirm }, refusal: { seenBy: 'review.read' } },
  'review.return': { grants: { seniorEngineer: inFirm }, refusal: { seenBy: 'review.read' } },
  'review.sign': { grants: { seniorEngineer: notOwn }, refusal: { seenBy: 'review.read' } },
  'review.issue': { grants: engineers, refusal: 'notFound' },
  'review.withdraw': { grants: { seniorEngineer: inFirm }, refusal: { seenBy: 'review.read' } },
  'review.queue': { grants: { seniorEngineer: inFirm }, refusal: 'forbidden' },
  'review.recipients': { grants: { modeller: inFirm }, refusal: 'forbidden' },

  // What was issued: to the clients of the study, and to the engineers as they see it
  'issued.list': { grants: { ...engineers, client: asClient }, refusal: 'notFound' },
  'issued.report': {
    grants: { modeller: issued, seniorEngineer: issued, client: both(asClient, issued) },
    refusal: 'notFound',
  },
  'issued.confirm': { grants: { client: both(asClient, issued) }, refusal: 'notFound' },

  // Published cases: what the solver is worth
  'verificationCase.read': { grants: engineers, refusal: 'forbidden' },
  'verificationCase.run': { grants: engineers, refusal: 'forbidden' },

  // The audit trail of the firm
  'audit.read': { grants: { administrator: inFirm }, refusal: 'forbidden' },
});

export type Action = keyof typeof POLICIES;

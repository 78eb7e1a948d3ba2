import type { Action } from '../../../server/policies/policies';

/** People of the firm that owns the record, and of another. */
export const PERSONAS = [
  'administrator',
  'modeller',
  'seniorEngineer',
  'sender', // a surveyor of the study, who sent the survey
  'surveyor', // another surveyor of the study
  'surveyorElsewhere', // a surveyor of the firm who is not in the study
  'client', // a client with whom the study is shared
  'clientElsewhere',
] as const;
export type Persona = (typeof PERSONAS)[number];

type Answer = 'yes' | 403 | 404;

/** One row of answers in the order of `PERSONAS`: y(es), 3 for 403, 4 for 404. */
const row = (letters: string): Record<Persona, Answer> => {
  const answers = { y: 'yes', 3: 403, 4: 404 } as const;
  const given = letters.replaceAll(' ', '').split('') as ('y' | '3' | '4')[];
  return Object.fromEntries(PERSONAS.map((persona, i) => [persona, answers[given[i]!]])) as Record<
    Persona,
    Answer
  >;
};

/** Role by action in the firm of the record, as the product's description grants them. In another firm all is 404. */
export const EXPECTED_RIGHTS: Record<Action, Record<Persona, Answer>> = {
  //                        admin mod sen sender surv elsewh client elsewh
  'me.read': row('          y     y   y   y      y    y      y      y'),
  'me.change': row('        y     y   y   y      y    y      y      y'),
  'user.list': row('        y     y   y   3      3    3      3      3'),
  'user.change': row('      y     3   3   4      4    4      4      4'),
  'invitation.list': row('  y     y   y   3      3    3      3      3'),
  'invitation.create': row('y     y   y   3      3    3      3      3'),
  // The record's invitation was made by the modeller.
  'invitation.change': row('y     y   4   4      4    4      4      4'),
  'study.list': row('       y     y   y   y      y    y      y      y'),
  'study.create': row('     3     y   y   3      3    3      3      3'),
  'study.read': row('       4     y   y   y      y    4      y      4'),
  'study.change': row('     4     y   y   3      3    4      3      4'),
  'study.share': row('      4     y   y   3      3    4      3      4'),
  'station.read': row('     4     y   y   4      4    4      4      4'),
  'station.change': row('   4     y   y   4      4    4      4      4'),
  'observation.read': row(' 4     y   y   4      4    4      4      4'),
  'observation.change': row('4    y   y   4      4    4      4      4'),
  'calibration.read': row(' 4     y   y   4      4    4      4      4'),
  'calibration.change': row('4    y   y   4      4    4      4      4'),
  'survey.list': row('      4     y   y   y      y    4      4      4'),
  'survey.send': row('      4     y   y   y      y    4      3      4'),
  'survey.read': row('      4     y   y   y      4    4      4      4'),
  'survey.decide': row('    4     y   y   3      4    4      4      4'),
  // The record's upload is the sender's.
  'upload.change': row('    4     4   4   y      4    4      4      4'),
  'template.read': row('    3     y   y   y      y    y      3      3'),
  'reach.read': row('       4     y   y   4      4    4      4      4'),
  'reach.change': row('     4     y   y   4      4    4      4      4'),
  'scenario.read': row('    4     y   y   4      4    4      4      4'),
  'scenario.change': row('  4     y   y   4      4    4      4      4'),
  'table.read': row('       3     y   y   3      3    3      3      3'),
  'run.read': row('         4     y   y   4      4    4      4      4'),
  'run.request': row('      4     y   y   4      4    4      4      4'),
  'run.change': row('       4     y   y   4      4    4      4      4'),
  'taskSet.read': row('     4     y   y   4      4    4      4      4'),
  'taskSet.request': row('  4     y   y   4      4    4      4      4'),
  'taskSet.change': row('   4     y   y   4      4    4      4      4'),
  // The record's run was asked for by the modeller, and is issued.
  'review.read': row('      4     y   y   4      4    4      4      4'),
  'review.send': row('      4     y   3   4      4    4      4      4'),
  'review.answer': row('    4     y   3   4      4    4      4      4'),
  'review.probe': row('     4     y   y   4      4    4      4      4'),
  'review.raise': row('     4     3   y   4      4    4      4      4'),
  'review.close': row('     4     3   y   4      4    4      4      4'),
  'review.return': row('    4     3   y   4      4    4      4      4'),
  'review.sign': row('      4     3   y   4      4    4      4      4'),
  'review.issue': row('     4     y   y   4      4    4      4      4'),
  'review.withdraw': row('  4     3   y   4      4    4      4      4'),
  'review.queue': row('     3     3   y   3      3    3      3      3'),
  'review.recipients': row('3     y   3   3      3    3      3      3'),
  'issued.list': row('      4     y   y   4      4    4      y      4'),
  'issued.report': row('    4     y   y   4      4    4      y      4'),
  'issued.confirm': row('   4     4   4   4      4    4      y      4'),
  'verificationCase.read': row('3 y   y   3      3    3      3      3'),
  'verificationCase.run': row(' 3 y   y   3      3    3      3      3'),
  'audit.read': row('       y     3   3   3      3    3      3      3'),
};

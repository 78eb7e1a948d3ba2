import type { TaskSetModel } from '../../models/TaskSet';

/** What of a set's run is read with it. */
export const RUN_OF_SET = {
  association: 'run',
  attributes: ['id', 'number'],
  include: [{ association: 'signOff', attributes: ['id'] }],
};

/** Why nothing of a set is computed again once its run is signed; null before. Needs `RUN_OF_SET`. */
export const signedSet = ({ run }: TaskSetModel): string | null =>
  run?.signOff
    ? `Run ${run.number} is signed: what was asked of it is not computed again. Ask for a new set instead.`
    : null;

/** What the audit trail says of a route where its service has not said it better: the action, and the words for it. */
export interface RouteWords {
  action: string;
  /** Stands before the name of the record. */
  words: string;
}

const say = (action: string, words: string): RouteWords => ({ action, words });

/** Every route that changes something or gives a file away. */
export const ROUTE_WORDS: Record<string, RouteWords> = {
  'POST /auth/sign-in': say('session.started', 'Signing in'),
  'POST /auth/sign-out-everywhere': say('session.endedEverywhere', 'Signed out on every device'),
  'POST /auth/password': say('password.changed', 'Password changed'),
  'POST /auth/password-reset/confirm': say('password.reset', 'New password chosen by a link'),
  'PATCH /me': say('profile.changed', 'Own profile changed'),
  'PATCH /users/:userId': say('user.changed', 'Roles or activity changed'),
  'POST /invitations': say('invitation.made', 'Invitation sent'),
  'DELETE /invitations/:invitationId': say('invitation.withdrawn', 'Invitation withdrawn'),
  'POST /invitations/:invitationId/resend': say('invitation.resent', 'Invitation sent again'),
  'POST /invitations/accept': say('invitation.accepted', 'Invitation accepted'),

  'POST /studies': say('study.made', 'Study made'),
  'PATCH /studies/:studyId': say('study.changed', 'Study changed'),
  'PUT /studies/:studyId/members': say('study.shared', 'Study shared'),
  'DELETE /studies/:studyId/members/:userId': say('study.unshared', 'Sharing of the study ended'),
  'POST /studies/:studyId/stations': say('station.made', 'Station added to'),
  'PATCH /stations/:stationId': say('station.changed', 'Station changed'),
  'DELETE /stations/:stationId': say('station.removed', 'Station removed'),

  'POST /studies/:studyId/marks': say('mark.made', 'Marks added to'),
  'PATCH /marks/:markId': say('mark.changed', 'Mark changed'),
  'DELETE /marks/:markId': say('mark.removed', 'Mark removed'),
  'POST /studies/:studyId/gauges': say('gauge.made', 'Gauge record added to'),
  'PUT /gauges/:gaugeId': say('gauge.changed', 'Gauge record changed'),
  'DELETE /gauges/:gaugeId': say('gauge.removed', 'Gauge record removed'),
  'POST /runs/:runId/calibrations': say('taskSet.requested', 'Search for roughness asked for of'),
  'POST /task-sets/:taskSetId/scenario': say('scenario.made', 'Scenario made of the search'),
  'GET /runs/:runId/residuals.csv': say('run.residualsTaken', 'Residuals downloaded as CSV'),
  'PUT /runs/:runId/observed': say('run.observed', 'Observed flood of the report chosen'),

  'POST /studies/:studyId/surveys': say('survey.sent', 'Survey handed in for'),
  'POST /surveys/:surveyId/decision': say('survey.decided', 'Survey decided on'),
  'GET /refusals/:refusalId/faults.xlsx': say(
    'survey.faultsTaken',
    'Faults of a survey downloaded',
  ),
  'PATCH /reaches/:reachId/sections': say('reach.changed', 'Banks or roughness changed'),
  'POST /studies/:studyId/reaches': say('reach.copied', 'Working geometry made in'),
  'PUT /reaches/:reachId/geometry': say('reach.changed', 'Sections changed'),
  'PATCH /reaches/:reachId': say('reach.renamed', 'Working geometry renamed'),
  'DELETE /reaches/:reachId': say('reach.removed', 'Working geometry removed'),
  'GET /reaches/:reachId/plan.geojson': say('reach.planTaken', 'Plan downloaded as GeoJSON'),
  'GET /runs/:runId/plan.geojson': say('run.planTaken', 'Plan of a run downloaded as GeoJSON'),
  'POST /studies/:studyId/scenarios': say('scenario.made', 'Scenario made in'),
  'PUT /scenarios/:scenarioId': say('scenario.changed', 'Scenario changed'),
  'POST /scenarios/:scenarioId/duplicate': say('scenario.duplicated', 'Scenario duplicated'),
  'DELETE /scenarios/:scenarioId': say('scenario.removed', 'Scenario removed'),
  'POST /scenarios/:scenarioId/runs': say('run.requested', 'Run asked for of'),

  'POST /runs/:runId/cancel': say('run.cancelled', 'Run cancelled'),
  'POST /runs/:runId/retry': say('run.retried', 'Run put into the queue again'),
  'GET /runs/:runId/case.json': say('run.caseTaken', 'Case file downloaded'),
  'GET /runs/:runId/results.csv': say('run.resultsTaken', 'Results downloaded as CSV'),
  'GET /runs/:runId/levels.csv': say('run.levelsTaken', 'Levels at stations downloaded as CSV'),
  'GET /runs/:runId/structures.csv': say(
    'run.structuresTaken',
    'Results at structures downloaded as CSV',
  ),
  'GET /runs/:runId/results.xlsx': say('run.resultsTaken', 'Results downloaded as XLSX'),
  'GET /runs/:runId/report.pdf': say('report.taken', 'Report downloaded'),

  'POST /runs/:runId/confidence/convergence': say('taskSet.requested', 'Convergence asked for of'),
  'POST /runs/:runId/confidence/sensitivity': say('taskSet.requested', 'Sensitivity asked for of'),
  'POST /runs/:runId/confidence/ensemble': say('taskSet.requested', 'Ensemble asked for of'),
  'GET /task-sets/:taskSetId/result.csv': say('taskSet.resultTaken', 'Result of a set downloaded'),
  'GET /task-sets/:taskSetId/members/:taskId/case.json': say(
    'taskSet.caseTaken',
    'Case file of a member downloaded',
  ),
  'POST /task-sets/:taskSetId/cancel': say('taskSet.cancelled', 'Set of computations cancelled'),
  'POST /task-sets/:taskSetId/retry': say(
    'taskSet.retried',
    'Failed members put into the queue again',
  ),

  'POST /runs/:runId/review': say('review.sent', 'Sent for checking'),
  'PUT /runs/:runId/review/answers': say('review.answered', 'Checklist answered'),
  'POST /runs/:runId/review/points': say('point.raised', 'Point raised'),
  'POST /points/:pointId/answer': say('point.answered', 'Point answered'),
  'POST /points/:pointId/close': say('point.closed', 'Point closed'),
  'POST /points/:pointId/reopen': say('point.reopened', 'Point reopened'),
  'POST /runs/:runId/review/return': say('review.returned', 'Returned'),
  'POST /runs/:runId/review/sign': say('run.signed', 'Signed'),
  'POST /runs/:runId/review/issue': say('run.issued', 'Issued'),
  'POST /runs/:runId/review/withdraw': say('run.withdrawn', 'Withdrawn'),
  'POST /runs/:runId/review/outlet-probe': say('review.probed', 'Second run for the outlet'),

  'POST /verification-cases/runs': say('taskSet.requested', 'Published cases asked for'),
  'GET /verification-cases/annex.pdf': say('proof.taken', 'Annex of published cases downloaded'),
  'GET /verification-cases/values.csv': say('proof.taken', 'Values of a published case downloaded'),

  'GET /issued/:runId/report.pdf': say('report.taken', 'Issued report downloaded'),
  'POST /issued/:runId/read': say('issued.read', 'Confirmed as read'),
  'GET /audit.csv': say('audit.taken', 'Audit trail downloaded'),
};

/** Nothing changes by these that anybody would ask for later, or nobody is known. */
export const NOT_TOLD = new Set([
  'POST /auth/refresh',
  'POST /auth/sign-out',
  // Told where there is an account; the answer is the same.
  'POST /auth/password-reset/request',
  'POST /invitations/look',
  'POST /studies/:studyId/surveys/read',
  // The hand-in that they end in is told.
  'POST /studies/:studyId/uploads',
  'PATCH /uploads/:uploadId',
  'DELETE /uploads/:uploadId',
  'POST /tables/read',
  'POST /studies/:studyId/marks/read',
  'GET /templates/survey.xlsx',
  'GET /templates/survey-example.xlsx',
  'GET /templates/survey-sections-example.xlsx',
]);

import type { Sequelize } from 'sequelize';
import { defineFirm } from './Firm';
import { defineInvitation } from './Invitation';
import { defineOneTimeToken } from './OneTimeToken';
import { defineRefreshToken } from './RefreshToken';
import { defineSignInAttempt } from './SignInAttempt';
import { defineStudy } from './Study';
import { defineStudyMember } from './StudyMember';
import { defineStation } from './Station';
import { defineSurveyDecision } from './SurveyDecision';
import { defineSurveyRevision } from './SurveyRevision';
import { defineSurveyRefusal } from './SurveyRefusal';
import { defineReach } from './Reach';
import { defineReachChange } from './ReachChange';
import { defineScenario } from './Scenario';
import { defineRun } from './Run';
import { defineRunBlock } from './RunBlock';
import { defineAuditRow } from './AuditRow';
import { defineClientRead } from './ClientRead';
import { defineIssue } from './Issue';
import { defineReport } from './Report';
import { defineReview } from './Review';
import { defineReviewPoint } from './ReviewPoint';
import { defineReviewPointEntry } from './ReviewPointEntry';
import { defineMark } from './Mark';
import { defineGauge } from './Gauge';
import { defineReportedFlood } from './ReportedFlood';
import { defineSignOff } from './SignOff';
import { defineWithdrawal } from './Withdrawal';
import { defineTask } from './Task';
import { defineTaskSet } from './TaskSet';
import { defineUpload } from './Upload';
import { defineUploadPart } from './UploadPart';
import { defineUser } from './User';

/** Every table, bound to one connection pool. A new model is one line here, and its ties to others below. */
export function defineModels(sequelize: Sequelize) {
  const models = {
    Firm: defineFirm(sequelize),
    Invitation: defineInvitation(sequelize),
    OneTimeToken: defineOneTimeToken(sequelize),
    RefreshToken: defineRefreshToken(sequelize),
    SignInAttempt: defineSignInAttempt(sequelize),
    Study: defineStudy(sequelize),
    StudyMember: defineStudyMember(sequelize),
    Station: defineStation(sequelize),
    SurveyDecision: defineSurveyDecision(sequelize),
    SurveyRevision: defineSurveyRevision(sequelize),
    SurveyRefusal: defineSurveyRefusal(sequelize),
    Reach: defineReach(sequelize),
    ReachChange: defineReachChange(sequelize),
    Scenario: defineScenario(sequelize),
    Run: defineRun(sequelize),
    RunBlock: defineRunBlock(sequelize),
    AuditRow: defineAuditRow(sequelize),
    ClientRead: defineClientRead(sequelize),
    Issue: defineIssue(sequelize),
    Report: defineReport(sequelize),
    Review: defineReview(sequelize),
    ReviewPoint: defineReviewPoint(sequelize),
    ReviewPointEntry: defineReviewPointEntry(sequelize),
    SignOff: defineSignOff(sequelize),
    Mark: defineMark(sequelize),
    Gauge: defineGauge(sequelize),
    ReportedFlood: defineReportedFlood(sequelize),
    Withdrawal: defineWithdrawal(sequelize),
    Task: defineTask(sequelize),
    TaskSet: defineTaskSet(sequelize),
    Upload: defineUpload(sequelize),
    UploadPart: defineUploadPart(sequelize),
    User: defineUser(sequelize),
  };
  models.User.belongsTo(models.Firm, { as: 'firm', foreignKey: 'firmId' });
  models.Invitation.belongsTo(models.Firm, { as: 'firm', foreignKey: 'firmId' });
  models.Invitation.belongsTo(models.User, { as: 'invitedBy', foreignKey: 'invitedById' });
  models.Study.belongsTo(models.User, { as: 'creator', foreignKey: 'createdBy' });
  models.StudyMember.belongsTo(models.User, { as: 'user', foreignKey: 'userId' });
  models.SurveyRevision.belongsTo(models.User, { as: 'sender', foreignKey: 'sentBy' });
  models.SurveyRevision.hasMany(models.SurveyDecision, {
    as: 'decisions',
    foreignKey: 'surveyRevisionId',
  });
  models.SurveyDecision.belongsTo(models.User, { as: 'decider', foreignKey: 'decidedBy' });
  models.SurveyRefusal.belongsTo(models.User, { as: 'sender', foreignKey: 'sentBy' });
  models.Reach.belongsTo(models.SurveyRevision, { as: 'survey', foreignKey: 'surveyRevisionId' });
  models.Reach.belongsTo(models.User, { as: 'updater', foreignKey: 'updatedBy' });
  models.ReachChange.belongsTo(models.User, { as: 'changer', foreignKey: 'changedBy' });
  models.Scenario.belongsTo(models.User, { as: 'updater', foreignKey: 'updatedBy' });
  models.Run.belongsTo(models.Study, { as: 'study', foreignKey: 'studyId' });
  models.Run.belongsTo(models.User, { as: 'requester', foreignKey: 'requestedBy' });
  models.Run.hasOne(models.Review, { as: 'review', foreignKey: 'runId' });
  models.Run.hasOne(models.SignOff, { as: 'signOff', foreignKey: 'runId' });
  models.Run.hasOne(models.Issue, { as: 'issue', foreignKey: 'runId' });
  models.Run.hasOne(models.Withdrawal, { as: 'withdrawal', foreignKey: 'runId' });
  models.Review.belongsTo(models.Run, { as: 'run', foreignKey: 'runId' });
  models.Run.hasOne(models.Review, { as: 'triedFor', foreignKey: 'outletProbeRunId' });
  models.Review.belongsTo(models.Run, { as: 'outletProbe', foreignKey: 'outletProbeRunId' });
  models.Review.belongsTo(models.User, { as: 'sender', foreignKey: 'sentBy' });
  models.Review.belongsTo(models.User, { as: 'recipient', foreignKey: 'sentTo' });
  models.Review.hasMany(models.ReviewPoint, { as: 'points', foreignKey: 'reviewId' });
  models.ReviewPoint.belongsTo(models.User, { as: 'raiser', foreignKey: 'raisedBy' });
  models.ReviewPoint.hasMany(models.ReviewPointEntry, { as: 'entries', foreignKey: 'pointId' });
  models.ReviewPointEntry.belongsTo(models.User, { as: 'writer', foreignKey: 'writtenBy' });
  models.SignOff.belongsTo(models.Run, { as: 'run', foreignKey: 'runId' });
  models.Withdrawal.belongsTo(models.User, { as: 'withdrawer', foreignKey: 'withdrawnBy' });
  models.ClientRead.belongsTo(models.User, { as: 'reader', foreignKey: 'userId' });
  models.TaskSet.belongsTo(models.Run, { as: 'run', foreignKey: 'runId' });
  models.TaskSet.belongsTo(models.Study, { as: 'study', foreignKey: 'studyId' });
  models.TaskSet.belongsTo(models.User, { as: 'requester', foreignKey: 'requestedBy' });
  return models;
}

export type Models = ReturnType<typeof defineModels>;

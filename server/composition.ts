import { buildPassport } from './auth/passport';
import { buildSessions } from './auth/sessions';
import { buildBackground } from './background';
import { migrate } from './database/migrate';
import type { Env } from './env';
import { buildMailer } from './mail/buildMailer';
import { authenticateWith } from './middleware/authenticate';
import { buildRateLimits } from './middleware/rateLimits';
import { buildPlatform, type Overrides } from './platform';
import { buildAccounts } from './services/accounts';
import { buildReadAudit } from './services/audit/readAudit';
import { buildCalibration } from './services/calibration';
import { buildComparison } from './services/comparison';
import { buildObservations } from './services/observations';
import { buildConfidence } from './services/confidence';
import { buildIssued } from './services/issued/readIssued';
import { buildVerify } from './services/issued/verify';
import { buildReports } from './services/reports';
import { buildReviews } from './services/review';
import { buildRuns } from './services/runs';
import { buildPlans } from './services/reaches/plans';
import { buildReaches } from './services/reaches/reaches';
import { buildScenarios } from './services/scenarios/scenarios';
import { buildMembers } from './services/studies/members';
import { buildStations } from './services/studies/stations';
import { buildStudies } from './services/studies/studies';
import { buildSurveys } from './services/surveys/surveys';
import { buildUploads } from './services/uploads/uploads';
import { buildVerificationCases } from './services/verificationCases';
import { buildTasks } from './services/tasks';

/** The only constructor of dependencies: connects, brings the schema up to date, and builds every service once. */
export async function compose(env: Env, overrides: Overrides = {}) {
  const { platform, close } = buildPlatform(env, overrides);
  try {
    await migrate(platform.sequelize);
    const mailer = buildMailer(env, platform.now);
    const background = buildBackground(platform.log);
    platform.onClose(() => background.idle().finally(mailer.close));
    const sessions = buildSessions(platform);
    const runs = buildRuns(platform);
    const observations = buildObservations(platform);
    const tasks = buildTasks(platform, runs.busy);
    const scenarios = buildScenarios(platform);
    const confidence = buildConfidence(platform, { runs, tasks });
    const calibration = buildCalibration(platform, { observations, runs, scenarios, tasks });
    const observedOf = calibration.residuals.ofReport;
    const reviews = buildReviews(platform, {
      background,
      mailer,
      confidence,
      observedOf,
      runs,
      standingChanged: ({ id }) =>
        background.run('drawing a report to keep', async () =>
          reports.pdf(await runs.find.again(id), { paper: 'A4', annex: false }),
        ),
    });
    const verificationCases = buildVerificationCases(platform, tasks);
    const reports = buildReports(platform, {
      annexOf: verificationCases.annexOf,
      confidence,
      observedOf,
      reviews,
      runs,
    });
    return {
      ...platform,
      close,
      authenticate: authenticateWith(buildPassport(platform)),
      background,
      limits: buildRateLimits(),
      mailer,
      sessions,
      accounts: buildAccounts(platform, { background, mailer, sessions }),
      studies: buildStudies(platform),
      members: buildMembers(platform),
      stations: buildStations(platform),
      surveys: buildSurveys(platform, { background, mailer }),
      uploads: buildUploads(platform),
      reaches: buildReaches(platform),
      plans: buildPlans(platform, runs),
      scenarios,
      observations,
      comparison: buildComparison(platform, runs),
      calibration,
      runs,
      tasks,
      confidence,
      reviews,
      reports,
      issued: buildIssued(platform, { reviews, runs }),
      verify: buildVerify(platform, reviews),
      verificationCases,
      auditTrail: buildReadAudit(platform),
    };
  } catch (error) {
    await close();
    throw error;
  }
}

export type Services = Awaited<ReturnType<typeof compose>>;

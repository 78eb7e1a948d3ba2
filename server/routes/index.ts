import type { Router } from 'express';
import type { Services } from '../composition';
import { auditRoutes } from './audit';
import { calibrationRoutes } from './calibration';
import { comparisonRoutes } from './comparison';
import { observationRoutes } from './observations';
import { authRoutes } from './auth';
import { confidenceRoutes } from './confidence';
import { healthRoutes } from './health';
import { invitationRoutes } from './invitations';
import { issuedRoutes } from './issued';
import { meRoutes } from './me';
import { runRoutes } from './runs';
import { planRoutes } from './plans';
import { reachRoutes } from './reaches';
import { reportRoutes } from './reports';
import { reviewRoutes } from './reviews';
import { scenarioRoutes } from './scenarios';
import { stationRoutes } from './stations';
import { studyRoutes } from './studies';
import { surveyRoutes } from './surveys';
import { tableRoutes } from './tables';
import { taskSetRoutes } from './taskSets';
import { templateRoutes } from './templates';
import { uploadRoutes } from './uploads';
import { userRoutes } from './users';
import { verificationRoutes } from './verification';
import { verificationCaseRoutes } from './verificationCases';

/** Every module of routes; each writes its full addresses below /api. A new one is one line. */
export const ROUTES: ((services: Services) => Router)[] = [
  healthRoutes,
  authRoutes,
  meRoutes,
  userRoutes,
  invitationRoutes,
  runRoutes,
  reachRoutes,
  planRoutes,
  scenarioRoutes,
  stationRoutes,
  observationRoutes,
  calibrationRoutes,
  comparisonRoutes,
  studyRoutes,
  surveyRoutes,
  uploadRoutes,
  tableRoutes,
  taskSetRoutes,
  confidenceRoutes,
  templateRoutes,
  reviewRoutes,
  reportRoutes,
  issuedRoutes,
  verificationRoutes,
  verificationCaseRoutes,
  auditRoutes,
];

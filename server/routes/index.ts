import type { Router } from 'express';
import type { Services } from '../composition';
import { authRoutes } from './auth';
import { healthRoutes } from './health';
import { invitationRoutes } from './invitations';
import { meRoutes } from './me';
import { userRoutes } from './users';

/** Every module of routes; each writes its full addresses below /api. A new one is one line. */
export const ROUTES: ((services: Services) => Router)[] = [
  healthRoutes,
  authRoutes,
  meRoutes,
  userRoutes,
  invitationRoutes,
];

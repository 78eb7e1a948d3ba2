import type { Router } from 'express';
import type { Services } from '../composition';
import { healthRoutes } from './health';

/** Every module of routes; each writes its full addresses below /api. A new one is one line. */
export const ROUTES: ((services: Services) => Router)[] = [healthRoutes];

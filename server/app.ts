import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { Router, type Express } from 'express';
import type { Services } from './composition';
import { followRequests } from './audit/followRequests';
import { notFound } from './errors';
import { errorHandler } from './middleware/errorHandler';
import { noStore } from './middleware/noStore';
import { requestId } from './middleware/requestId';
import { sameOrigin } from './middleware/sameOrigin';
import { ROUTES } from './routes';
import { securityHeaders } from './web/securityHeaders';
import { serveWeb } from './web/serveWeb';

/** Builds Express without listening: the API below /api, the client everywhere else. */
export function buildApp(services: Services): Express {
  const { env, log } = services;
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', env.trustProxy);
  app.use(requestId, securityHeaders(env.publicUrl), compression());

  const api = Router();
  // All sections of a large survey changed at once.
  api.use('/reaches', express.json({ limit: '16mb' }));
  api.use(noStore, sameOrigin(env.publicUrl), cookieParser(), express.json({ limit: '4mb' }));
  api.use(followRequests(services.audit, log));
  for (const routes of ROUTES) api.use(routes(services));
  api.use(() => {
    throw notFound('This address');
  });
  app.use('/api', api);

  if (env.webDir) app.use(serveWeb(env.webDir));
  app.use(() => {
    throw notFound('This address');
  });
  app.use(errorHandler(log));
  return app;
}

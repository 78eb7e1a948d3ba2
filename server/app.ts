import express, { Router, type Express } from 'express';
import { notFound } from './errors';
import type { Services } from './composition';
import { errorHandler } from './middleware/errorHandler';
import { noStore } from './middleware/noStore';
import { requestId } from './middleware/requestId';
import { ROUTES } from './routes';

/** Builds Express without listening. */
export function buildApp(services: Services): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', services.env.trustProxy);
  app.use(requestId);

  const api = Router();
  api.use(noStore, express.json({ limit: '4mb' }));
  for (const routes of ROUTES) api.use(routes(services));
  api.use(() => {
    throw notFound('This address');
  });
  app.use('/api', api);

  app.use(errorHandler(services.log));
  return app;
}

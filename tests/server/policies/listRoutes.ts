import type { Express, RequestHandler } from 'express';
import type { Action } from '../../../server/policies/policies';

/** As Express keeps a route; of `router` 2. */
interface Layer {
  handle: RequestHandler & { action?: Action | 'public'; stack?: Layer[] };
  route?: { path: string; stack: (Layer & { method: string })[] };
}

export interface DeclaredRoute {
  /** `GET /studies/:studyId`. */
  name: string;
  method: string;
  path: string;
  /** What it declares; one is right. */
  actions: (Action | 'public')[];
  layers: Layer[];
}

/** Every route of the API, found in Express itself. */
export function listRoutes(app: Express): DeclaredRoute[] {
  const visit = (layers: Layer[]): DeclaredRoute[] =>
    layers.flatMap(({ handle, route }) => {
      if (!route) return handle.stack ? visit(handle.stack) : [];
      const methods = [...new Set(route.stack.map(({ method }) => method.toUpperCase()))];
      return methods.map((method) => ({
        name: `${method} ${route.path}`,
        method,
        path: route.path,
        actions: route.stack.flatMap((layer) => layer.handle.action ?? []),
        layers: route.stack,
      }));
    });
  return visit((app as unknown as { router: { stack: Layer[] } }).router.stack);
}

import type { RequestHandler } from 'express';
import { forbidden } from '../errors';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses changes that another site's page asks for with this person's cookie. Browsers tell where a request comes from
 * (Fetch Metadata; older ones by Origin); programs tell neither, and carry no cookie that is not theirs.
 */
export const sameOrigin = (publicUrl: string): RequestHandler => {
  const ours = new URL(publicUrl).origin;
  return (req, _res, next) => {
    if (SAFE.has(req.method)) return next();
    const site = req.get('Sec-Fetch-Site');
    const origin = req.get('Origin');
    const same = site
      ? site === 'same-origin'
      : !origin || origin === ours || origin === `${req.protocol}://${req.get('Host')}`;
    if (!same) throw forbidden('This was asked for by another site, and was not done.');
    next();
  };
};

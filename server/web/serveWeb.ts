import path from 'node:path';
import express, { Router } from 'express';

const YEAR_SECONDS = 365 * 86_400;

/**
 * The exported client. Files that carry a hash in their name never change; the page itself is asked for anew each time,
 * and every address that is no file is the page, which finds its own way.
 */
export function serveWeb(dir: string): Router {
  const router = Router();
  router.use(
    express.static(dir, {
      index: false,
      dotfiles: 'ignore',
      setHeaders: (res, file) =>
        res.setHeader(
          'Cache-Control',
          isHashed(file) ? `public, max-age=${YEAR_SECONDS}, immutable` : 'no-cache',
        ),
    }),
  );
  router.get('/{*path}', (req, res, next) => {
    // A missing script or picture must not be answered with a page.
    if (path.extname(req.path) !== '') return next();
    res.sendFile('index.html', { root: dir, headers: { 'Cache-Control': 'no-cache' } });
  });
  return router;
}

/** `entry-0123abcd….js`, `SourceSans3.0123abcd….woff2`: as the bundler names what it writes. */
export const isHashed = (file: string): boolean => /[-.][0-9a-f]{32}\.[a-z0-9]+$/.test(file);

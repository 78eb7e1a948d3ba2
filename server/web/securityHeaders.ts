import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** Nothing is fetched from anywhere else, and no other site may frame the product. React Native writes styles into the page. */
export const securityHeaders = (publicUrl: string): RequestHandler => {
  const overHttps = publicUrl.startsWith('https:');
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        workerSrc: ["'self'", 'blob:'],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(overHttps && { upgradeInsecureRequests: [] }),
      },
    },
    strictTransportSecurity: overHttps ? { maxAge: 180 * 86_400 } : false,
    // Links in mail carry tokens in their address.
    referrerPolicy: { policy: 'no-referrer' },
  });
};

import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** Scripts only from here; styles also inline, because antd writes its own into the page. */
export function securityHeaders(publicUrl: string): RequestHandler {
  const https = publicUrl.startsWith('https:');
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'", 'data:'],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(https ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: https,
    // Links with a token in their path must not be told to anybody.
    referrerPolicy: { policy: 'no-referrer' },
  });
}

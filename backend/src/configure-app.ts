import type { NestExpressApplication } from '@nestjs/platform-express';
import session from 'express-session';
import { refuseForeignHost } from './common/demo-host';
import { errorMiddleware } from './common/error.filter';
import { bodyErrors, jsonBody } from './common/json-body';
import { requestContextMiddleware } from './common/request-context';
import { securityHeaders } from './common/security-headers';
import { SESSION_COOKIE } from './common/session-cookie';
import { staticFrontend } from './common/static-frontend';
import { Runtime } from './config/runtime';
import { SessionStore } from './database/session-store';

const HOUR_MS = 3_600_000;

/** Everything between the socket and the controllers; the same for the server, the tests and the API document. */
export function configureApp(app: NestExpressApplication): void {
  const runtime = app.get(Runtime);
  const { config } = runtime;
  app.disable('x-powered-by');
  app.set('trust proxy', config.trustProxyHops);
  app.set('etag', false);
  app.setGlobalPrefix('api');
  app.use(requestContextMiddleware, securityHeaders(config.publicUrl));
  if (runtime.demo) app.use(refuseForeignHost);
  app.use(...staticFrontend(config.frontendDir), errorMiddleware);
  const https = config.publicUrl.startsWith('https:');
  app.use(
    '/api',
    session({
      name: SESSION_COOKIE,
      secret: runtime.sessionSecret,
      store: app.get(SessionStore).store,
      resave: false,
      saveUninitialized: false,
      unset: 'destroy',
      proxy: https,
      cookie: { httpOnly: true, sameSite: 'lax', secure: https, maxAge: config.sessionIdleHours * HOUR_MS, path: '/' },
    }),
    jsonBody,
    bodyErrors,
  );
}

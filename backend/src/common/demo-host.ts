import type { NextFunction, Request, Response } from 'express';
import { isLoopback } from '../config/environment';
import { ForbiddenError } from './errors';

/** In a demo anybody may sign in as anybody, so a name that was made to point here (DNS rebinding) is not served. */
export function refuseForeignHost(request: Request, _response: Response, next: NextFunction): void {
  if (isLoopback(request.hostname ?? '')) next();
  else next(new ForbiddenError('The demo answers only under 127.0.0.1 or localhost.', 'demo_host_refused'));
}

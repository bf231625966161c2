import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { Runtime } from '../config/runtime';
import { ForbiddenError } from './errors';

const READING_METHODS = new Set(['GET', 'HEAD', 'OPTIONS']);
export const CSRF_HEADER_VALUE = 'bandledger';

/**
 * Refuses writing requests that another site's page could have made: a foreign page cannot set the header without a
 * preflight, which is never granted, and browsers say where a request comes from.
 */
@Injectable()
export class CsrfGuard implements CanActivate {
  constructor(private readonly runtime: Runtime) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    if (READING_METHODS.has(request.method)) return true;
    if (request.get('x-requested-with') !== CSRF_HEADER_VALUE) {
      throw new ForbiddenError(`The header X-Requested-With: ${CSRF_HEADER_VALUE} is missing.`, 'csrf_header_missing');
    }
    if (!this.isSameOrigin(request)) {
      throw new ForbiddenError('This request came from another site.', 'foreign_origin');
    }
    return true;
  }

  private isSameOrigin(request: Request): boolean {
    const fetchSite = request.get('sec-fetch-site');
    if (fetchSite !== undefined) return fetchSite === 'same-origin';
    const origin = request.get('origin');
    // No browser leaves out both on a writing request; a script that set the header itself does.
    return origin === undefined || origin === this.runtime.config.publicUrl;
  }
}

import { AsyncLocalStorage } from 'node:async_hooks';
import { randomUUID } from 'node:crypto';
import type { NextFunction, Request, Response } from 'express';

interface RequestContext {
  readonly requestId: string;
}

const storage = new AsyncLocalStorage<RequestContext>();

/** The id of the request being served, or null outside of one (seeding, start-up). */
export function currentRequestId(): string | null {
  return storage.getStore()?.requestId ?? null;
}

/** Gives every request an id of our own (a client's could forge log lines) and says it in the answer. */
export function requestContextMiddleware(_request: Request, response: Response, next: NextFunction): void {
  const requestId = randomUUID();
  response.setHeader('X-Request-Id', requestId);
  storage.run({ requestId }, next);
}

import type { Request } from 'express';
import type { Account } from '../users/account';

/** A session is written back at most this often while it is being used. */
const RENEW_AFTER_MS = 5 * 60_000;
const HOUR_MS = 3_600_000;

function regenerate(request: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    request.session.regenerate((error: unknown) => (error ? reject(error as Error) : resolve()));
  });
}

/** Signs a person in: always under a new session id, so that one planted beforehand is worth nothing. */
export async function startSession(request: Request, user: Account, nowMs: number): Promise<void> {
  await regenerate(request);
  request.session.user = { id: user.id, epoch: user.sessionEpoch };
  request.session.renewedAtMs = nowMs;
}

export function endSession(request: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    request.session.destroy((error: unknown) => (error ? reject(error as Error) : resolve()));
  });
}

/** The store sweeps out what has run out only now and then. */
export function hasExpired(request: Request, nowMs: number, idleHours: number): boolean {
  return nowMs - (request.session.renewedAtMs ?? 0) > idleHours * HOUR_MS;
}

/** Moves the end of an active session onwards; the change makes the store write it and the cookie be sent again. */
export function renewSession(request: Request, nowMs: number): void {
  const renewedAtMs = request.session.renewedAtMs ?? 0;
  if (nowMs - renewedAtMs >= RENEW_AFTER_MS) request.session.renewedAtMs = nowMs;
}

import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import type { ErrorRequestHandler, Response } from 'express';
import { ForeignKeyConstraintError, UniqueConstraintError } from 'sequelize';
import { AppError, ConflictError, NotFoundError, UnauthenticatedError, UnreadableError } from './errors';
import { currentRequestId } from './request-context';

const INTERNAL = new AppError(500, 'internal', 'Something went wrong on the server. It has been logged.');

function fromUniqueConstraint(error: UniqueConstraintError): ConflictError {
  const fieldErrors = error.errors.map(({ path }) => ({
    path: (path ?? '').replace(/_([a-z])/g, (_match, letter: string) => letter.toUpperCase()),
    code: 'already_exists',
    message: 'This is taken already.',
  }));
  return new ConflictError('already_exists', 'Something with this name or code exists already.', { fieldErrors });
}

/** Nest's own exceptions: unknown routes, and what a library raised before our code ran. */
function fromHttpException(error: HttpException): AppError {
  const status = error.getStatus();
  if (status === 404) return new NotFoundError();
  if (status === 401) return new UnauthenticatedError();
  if (status === 400) return new UnreadableError('The request could not be read.');
  return status < 500 ? new AppError(status, 'refused', 'The request was refused.') : INTERNAL;
}

/** Errors of Express and its middleware (a malformed address, for instance) say by `status` that the client is at fault. */
function isClientError(error: unknown): boolean {
  const status = error instanceof Error && 'status' in error ? Number(error.status) : 500;
  return status >= 400 && status < 500;
}

/** What the client is told about anything that was thrown. */
export function toAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  // Sequelize takes every SQLITE_CONSTRAINT for a broken UNIQUE; a CHECK or NOT NULL is our own mistake.
  if (error instanceof UniqueConstraintError && /UNIQUE/.test(error.parent.message)) return fromUniqueConstraint(error);
  if (error instanceof ForeignKeyConstraintError) {
    return new ConflictError('in_use', 'Something else still depends on this, or what it refers to is gone.');
  }
  if (error instanceof HttpException) return fromHttpException(error);
  return isClientError(error) ? new UnreadableError('The request could not be read.') : INTERNAL;
}

const logger = new Logger('Error');

/** The one place where an error becomes an answer: `{ code, message, fieldErrors?, requestId }`. */
export function sendError(error: unknown, response: Response): void {
  const answer = toAppError(error);
  const requestId = currentRequestId() ?? String(response.getHeader('X-Request-Id') ?? '');
  if (answer.status >= 500) {
    logger.error(`request ${requestId}: ${error instanceof Error ? error.stack : String(error)}`);
  }
  if (response.headersSent) {
    response.end();
    return;
  }
  if (answer.details.retryAfterSeconds !== undefined) {
    response.setHeader('Retry-After', String(answer.details.retryAfterSeconds));
  }
  response.setHeader('Cache-Control', 'no-store');
  response.status(answer.status).json({ code: answer.code, message: answer.message, ...answer.details, requestId });
}

/** For what happens inside Nest: guards, pipes, controllers, routes that do not exist. */
@Catch()
export class ErrorFilter implements ExceptionFilter {
  catch(error: unknown, host: ArgumentsHost): void {
    sendError(error, host.switchToHttp().getResponse<Response>());
  }
}

/** For what happens before Nest; Express by itself would answer with a page that shows the stack. */
export const errorMiddleware: ErrorRequestHandler = (error: unknown, _request, response, _next) => {
  sendError(error, response);
};

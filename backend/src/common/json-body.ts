import { type ErrorRequestHandler, json, type RequestHandler } from 'express';
import { AppError, UnreadableError } from './errors';

export const BODY_LIMIT_BYTES = 1_000_000;

export const jsonBody: RequestHandler = json({ limit: BODY_LIMIT_BYTES, strict: true });

/** What the body parser found, in our own words. */
export const bodyErrors: ErrorRequestHandler = (
  error: { type?: string; status?: number },
  _request,
  _response,
  next,
) => {
  if (error.type === 'entity.too.large') {
    next(new AppError(413, 'body_too_large', `The body is larger than ${BODY_LIMIT_BYTES / 1_000_000} MB.`));
  } else if (error.type === 'entity.parse.failed') {
    next(new UnreadableError('The body is not readable JSON.', 'unreadable_json'));
  } else if (error.type !== undefined) {
    next(new UnreadableError('The body could not be read.'));
  } else {
    next(error);
  }
};

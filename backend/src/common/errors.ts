/** One broken field: `path` as in `stages.0.feedbackOhm`, `code` stable, `message` for people. */
export interface FieldError {
  readonly path: string;
  readonly code: string;
  readonly message: string;
}

/** What further facts an error may carry to the client beside its code and message. */
export interface ErrorDetails {
  readonly fieldErrors?: readonly FieldError[];
  /** 409 `stale_version`: the row as it is now, presented. */
  readonly current?: unknown;
  /** 409 `in_use`: the places that hold on to the row. */
  readonly where?: unknown;
  readonly hiddenCount?: number;
  readonly retryAfterSeconds?: number;
}

/** Every error that is meant for the client; anything else becomes 500 `internal` without a word of its content. */
export class AppError extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
    readonly details: ErrorDetails = {},
  ) {
    super(message);
  }
}

/** 400: the request could not be read at all. */
export class UnreadableError extends AppError {
  constructor(message: string, code = 'unreadable') {
    super(400, code, message);
  }
}

/** 401: nobody is signed in. */
export class UnauthenticatedError extends AppError {
  constructor(message = 'Please sign in.', code = 'not_signed_in') {
    super(401, code, message);
  }
}

/** 403: visible, but this person may not do this. */
export class ForbiddenError extends AppError {
  constructor(message = 'You are not allowed to do this.', code = 'forbidden') {
    super(403, code, message);
  }
}

/** 404: absent, or hidden from this person; the two look the same. */
export class NotFoundError extends AppError {
  constructor(message = 'There is nothing here.', code = 'not_found') {
    super(404, code, message);
  }
}

/** 409: at odds with what is stored. */
export class ConflictError extends AppError {
  constructor(code: string, message: string, details: ErrorDetails = {}) {
    super(409, code, message, details);
  }
}

/** 409 `stale_version`: somebody saved in between; carries the row as it is now. */
export class StaleVersionError extends ConflictError {
  constructor(current: unknown) {
    super('stale_version', 'This was changed by somebody else in the meantime.', { current });
  }
}

/** 422: readable, but at least one field cannot be accepted. */
export class InvalidError extends AppError {
  constructor(fieldErrors: readonly FieldError[], message = 'Some fields cannot be accepted.') {
    super(422, 'invalid', message, { fieldErrors });
  }
}

/** 429: too often; says when to try again. */
export class TooManyRequestsError extends AppError {
  constructor(code: string, message: string, retryAfterSeconds: number) {
    super(429, code, message, { retryAfterSeconds });
  }
}

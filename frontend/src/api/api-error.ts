import { AxiosError, isCancel } from 'axios';

/** One field of a refused request; `path` as in the request body, e.g. `stages.2.feedbackOhm`. */
export interface FieldError {
  readonly path: string;
  readonly code: string;
  readonly message: string;
}

interface ErrorBody {
  readonly code?: string;
  readonly message?: string;
  readonly fieldErrors?: readonly FieldError[];
  readonly requestId?: string;
  readonly current?: unknown;
  readonly where?: unknown;
  readonly hiddenCount?: unknown;
}

/** Every failed request becomes one of these; `status` 0 = no answer came. */
export class ApiError extends Error {
  override readonly name = 'ApiError';

  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
    readonly fieldErrors: readonly FieldError[] = [],
    readonly requestId: string | null = null,
    /** 409 stale_version: the row as it is now. 409 in_use: where, and how many places are hidden from the person. */
    readonly details: { readonly current?: unknown; readonly where?: unknown; readonly hiddenCount?: unknown } = {},
  ) {
    super(message);
  }

  get isStale(): boolean {
    return this.status === 409 && this.code === 'stale_version';
  }
}

const NO_ANSWER = 'The server does not answer. What you typed is kept; try again in a moment.';

function messageFor(status: number): string {
  if (status === 413) return 'This is larger than the server takes (1 MB).';
  if (status === 429) return 'Too many requests in a short time. Wait a moment and try again.';
  if (status >= 500) return 'The server failed on this request. What you typed is kept; try again.';
  return `The server refused this request (${status}).`;
}

function isErrorBody(data: unknown): data is ErrorBody {
  return typeof data === 'object' && data !== null;
}

export function toApiError(error: unknown): unknown {
  if (isCancel(error) || error instanceof ApiError) return error;
  if (!(error instanceof AxiosError)) return error;
  if (!error.response) return new ApiError(0, 'no_answer', NO_ANSWER);
  const { status, data } = error.response as { status: number; data: unknown };
  const body = isErrorBody(data) ? data : {};
  return new ApiError(
    status,
    body.code ?? `http_${status}`,
    body.message ?? messageFor(status),
    body.fieldErrors ?? [],
    body.requestId ?? null,
    { current: body.current, where: body.where, hiddenCount: body.hiddenCount },
  );
}

export function isApiError(error: unknown, status?: number): error is ApiError {
  return error instanceof ApiError && (status === undefined || error.status === status);
}

/** Field messages by path, the first of each path. */
export function fieldMessages(error: unknown): Readonly<Record<string, string>> {
  if (!(error instanceof ApiError)) return {};
  const messages: Record<string, string> = {};
  for (const field of error.fieldErrors) messages[field.path] ??= field.message;
  return messages;
}

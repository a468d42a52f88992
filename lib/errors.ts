export const ERROR_STATUS = {
  'not-signed-in': 401,
  forbidden: 403,
  'not-found': 404,
  conflict: 409,
  invalid: 422,
  'too-many': 429,
  'too-large': 413,
} as const;

export type ErrorCode = keyof typeof ERROR_STATUS;

/** Messages by field path, e.g. `shares.2.printed`; the empty path is the whole form. */
export type FieldErrors = Record<string, string>;

/** A refusal that the person who asked may read. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly fields: FieldErrors;

  constructor(code: ErrorCode, message: string, options: { cause?: unknown; fields?: FieldErrors } = {}) {
    super(message, { cause: options.cause });
    this.name = 'AppError';
    this.code = code;
    this.fields = options.fields ?? {};
  }
}

const UNKNOWN =
  'Something went wrong on our side. Nothing was saved. Try again; if it stays, tell whoever runs the desk.';

/** RFC 9457 problem details of an error, for route handlers. Unknown errors keep their message to the log. */
export function toProblem(error: unknown): { status: number; body: Record<string, unknown> } {
  if (!(error instanceof AppError)) {
    return {
      status: 500,
      body: { type: 'about:blank', title: 'Internal error', status: 500, detail: UNKNOWN },
    };
  }
  const status = ERROR_STATUS[error.code];
  return {
    status,
    body: {
      type: 'about:blank',
      title: error.code,
      status,
      detail: error.message,
      ...(Object.keys(error.fields).length > 0 ? { errors: error.fields } : {}),
    },
  };
}

export type ActionFailure = { ok: false; code: ErrorCode | 'unknown'; message: string; fields: FieldErrors };
export type ActionResult<T> = { ok: true; value: T } | ActionFailure;

/** What a server action answers with instead of throwing. */
export function toActionFailure(error: unknown): ActionFailure {
  if (!(error instanceof AppError)) return { ok: false, code: 'unknown', message: UNKNOWN, fields: {} };
  return { ok: false, code: error.code, message: error.message, fields: error.fields };
}

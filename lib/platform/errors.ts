/** Why a request could not be carried out, each with the HTTP status it becomes. */
export const errorStatus = {
  invalid: 422,
  'signed-out': 401,
  forbidden: 403,
  'not-found': 404,
  conflict: 409,
  locked: 423,
  'too-large': 413,
  'too-many': 429,
  unsupported: 415,
} as const;
export type ErrorCode = keyof typeof errorStatus;

/**
 * An expected failure: `message` is a whole sentence for the person who asked (what is wrong, where, what to do);
 * `fields` holds sentences by input path. Everything that is not an AppError is a bug: logged, and hidden.
 */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly fields: Record<string, string>;
  readonly retryAfterSeconds: number | undefined;

  constructor(
    code: ErrorCode,
    message: string,
    more: { fields?: Record<string, string>; retryAfterSeconds?: number } = {},
  ) {
    super(message);
    this.name = 'AppError';
    this.code = code;
    this.fields = more.fields ?? {};
    this.retryAfterSeconds = more.retryAfterSeconds;
  }
}

/** The one answer for things that do not exist and for things of another league, so that neither can be told apart. */
export const notFound = (what: string) => new AppError('not-found', `There is no such ${what} here.`);

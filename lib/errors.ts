/** The closed list of what can go wrong, each with its HTTP status. */
export const ERROR_STATUS = {
  badInput: 422,
  signedOut: 401,
  forbidden: 403,
  notFound: 404,
  conflict: 409,
  preconditionFailed: 412,
  tooLarge: 413,
  unsupportedType: 415,
  preconditionRequired: 428,
  engineRefused: 422,
  tooMany: 429,
  internal: 500,
  unavailable: 503,
} as const;

export type ErrorCode = keyof typeof ERROR_STATUS;

/** `userMessage` may be shown; `message` is for the log only. */
export class AppError extends Error {
  override readonly name = 'AppError';

  constructor(
    readonly code: ErrorCode,
    readonly userMessage: string,
    options: { message?: string; cause?: unknown } = {},
  ) {
    super(options.message ?? userMessage, { cause: options.cause });
  }

  get status(): number {
    return ERROR_STATUS[this.code];
  }
}

export const notFound = (what: string): AppError =>
  new AppError('notFound', `There is no such ${what} here.`);

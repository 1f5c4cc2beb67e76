import pino from 'pino';

/** What went wrong and where, never with what data: a database's error can quote a whole row in its `detail`. */
function plainError(error: unknown): Record<string, unknown> {
  if (!(error instanceof Error)) return { type: typeof error };
  const { name, message, stack } = error;
  return { type: name, message, stack, ...('code' in error ? { code: error.code } : {}) };
}

/** Structured logs on standard error; no secrets, no personal data: log ids, not names or addresses. */
export const logger = pino(
  {
    level: process.env.LOG_LEVEL ?? 'info',
    base: { program: 'marlwick' },
    serializers: { err: plainError },
    redact: ['password', '*.password', 'passwordHash', '*.passwordHash', 'email', '*.email'],
  },
  pino.destination(2),
);

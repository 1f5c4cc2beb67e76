import pino from 'pino';

/** Structured logs on standard error; no secrets, no personal data: log ids, not names or addresses. */
export const logger = pino(
  {
    level: process.env.LOG_LEVEL ?? 'info',
    base: { program: 'marlwick' },
    redact: ['password', '*.password', 'passwordHash', '*.passwordHash', 'email', '*.email'],
  },
  pino.destination(2),
);

import * as z from 'zod';
import { AppError, ERROR_STATUS, type ErrorCode } from '@/lib/errors';
import { logger } from '@/lib/logger';

/** The one form of every error. */
export const errorAnswer = z
  .object({
    error: z.object({
      code: z.enum(Object.keys(ERROR_STATUS) as [ErrorCode, ...ErrorCode[]]),
      message: z.string().meta({ description: 'A sentence for people.' }),
    }),
  })
  .meta({ id: 'Error' });

const HEADERS = { 'cache-control': 'no-store' } as const;

/** `{"error":{"code","message"}}` with its status; what is not ours to explain says nothing internal. */
export function errorToJson(error: unknown): Response {
  if (error instanceof AppError) {
    return Response.json(
      { error: { code: error.code, message: error.userMessage } },
      {
        status: error.status,
        headers: {
          ...HEADERS,
          ...(error.code === 'signedOut' ? { 'www-authenticate': 'Bearer' } : {}),
        },
      },
    );
  }
  logger.error({ err: error }, 'a request failed');
  return Response.json(
    { error: { code: 'internal', message: 'Something went wrong on our side.' } },
    { status: 500, headers: HEADERS },
  );
}

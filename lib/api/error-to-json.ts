import { AppError } from '@/lib/errors';
import { logger } from '@/lib/logger';

/** `{"error":{"code","message"}}` with its status; what is not ours to explain says nothing internal. */
export function errorToJson(error: unknown): Response {
  if (error instanceof AppError) {
    return Response.json(
      { error: { code: error.code, message: error.userMessage } },
      { status: error.status },
    );
  }
  logger.error({ err: error }, 'a request failed');
  return Response.json(
    { error: { code: 'internal', message: 'Something went wrong on our side.' } },
    { status: 500 },
  );
}

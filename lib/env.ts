import * as z from 'zod';

const environment = z.object({
  DATABASE_URL: z.url(),
  NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
  NEXTAUTH_SECRET: z
    .string()
    .min(32, 'NEXTAUTH_SECRET must have at least 32 characters')
    .optional(),
  LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
});

export type Environment = z.infer<typeof environment>;

let read: Environment | undefined;

/** The process's settings, checked once. Throws one sentence per missing or wrong variable. */
export function env(): Environment {
  if (read !== undefined) return read;
  const parsed = environment.safeParse(process.env);
  if (!parsed.success) {
    throw new Error(
      `Settings are missing or wrong: ${parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('; ')}`,
    );
  }
  read = parsed.data;
  return read;
}

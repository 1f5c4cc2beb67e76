import * as z from 'zod';

/** Values from `.env.example` and the like: good to show where a secret goes, never to run on. */
const PLACEHOLDER = /change[-_ ]?me|replace[-_ ]?me|example|secret-?here|^(.)\1+$/i;

const secret = (name: string) =>
  z
    .string()
    .min(32, `${name} must have at least 32 characters`)
    .refine(
      (text) => !PLACEHOLDER.test(text),
      `${name} is still a placeholder: make one of your own`,
    );

const environment = z
  .object({
    DATABASE_URL: z.url(),
    NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
    NEXTAUTH_SECRET: secret('NEXTAUTH_SECRET').optional(),
    /** The address people reach Marlwick at; links in e-mails are built from it. */
    NEXTAUTH_URL: z.url().default('http://127.0.0.1:3100'),
    LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
    SMTP_URL: z.url().optional(),
    MAIL_FROM: z.string().default('Marlwick <marlwick@localhost>'),
    /** Where the local SMTP fake keeps what it was sent; set only by our scripts, and never beside a real server. */
    MARLWICK_OUTBOX: z.string().optional(),
    OIDC_ISSUER: z.url().optional(),
    OIDC_CLIENT_ID: z.string().optional(),
    OIDC_CLIENT_SECRET: z.string().optional(),
    OIDC_NAME: z.string().default('your organisation’s account'),
  })
  .superRefine((settings, context) => {
    const issue = (path: string, message: string) =>
      context.addIssue({ code: 'custom', path: [path], message });
    if (settings.OIDC_ISSUER !== undefined) {
      for (const name of ['OIDC_CLIENT_ID', 'OIDC_CLIENT_SECRET'] as const) {
        if (settings[name] === undefined) issue(name, 'is needed beside OIDC_ISSUER');
      }
    }
    const address = new URL(settings.NEXTAUTH_URL);
    const isLoopback = ['127.0.0.1', 'localhost', '[::1]'].includes(address.hostname);
    if (settings.MARLWICK_OUTBOX !== undefined && !isLoopback) {
      issue(
        'MARLWICK_OUTBOX',
        'shows every letter to anyone: set SMTP_URL where others reach Marlwick',
      );
    }
    if (settings.NODE_ENV !== 'production') return;
    if (address.protocol !== 'https:' && !isLoopback) {
      issue('NEXTAUTH_URL', 'must begin with https:// where others reach Marlwick');
    }
    if (settings.NEXTAUTH_SECRET === undefined) issue('NEXTAUTH_SECRET', 'is needed in production');
    const password = new URL(settings.DATABASE_URL).password;
    if (/^(postgres|password|marlwick|change[-_]?me|admin|secret)?$/i.test(password)) {
      issue(
        'DATABASE_URL',
        'has no password or a default one: give the role a password of its own',
      );
    }
  });

export type Environment = z.infer<typeof environment>;

let read: Environment | undefined;

/** The process's settings, checked once. Throws one sentence per missing or wrong variable. */
export function env(): Environment {
  read ??= readEnvironment(process.env);
  return read;
}

/** The settings in `variables`; values are never repeated in what is thrown. */
export function readEnvironment(
  variables: Readonly<Record<string, string | undefined>>,
): Environment {
  // An empty variable is an absent one: that is how a compose file or a unit file leaves it out.
  const given = Object.fromEntries(Object.entries(variables).filter(([, value]) => value !== ''));
  const parsed = environment.safeParse(given);
  if (parsed.success) return parsed.data;
  const sentences = parsed.error.issues.map(({ path, message }) => `${path.join('.')}: ${message}`);
  throw new Error(`Settings are missing or wrong: ${sentences.join('; ')}`);
}

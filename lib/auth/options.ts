import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { decode } from 'next-auth/jwt';
import { cookies, headers } from 'next/headers';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { logger } from '@/lib/logger';
import { paths } from '@/lib/paths';
import { checkSignIn } from './check-sign-in';
import { openIdProvider } from './open-id';
import { beginSession, endSession, LONGEST_SESSION_MS } from './sessions';

declare module 'next-auth' {
  interface Session {
    /** What opens the session in the database; it stays on the server and in the encrypted cookie. */
    secret: string;
  }
}
declare module 'next-auth/jwt' {
  interface JWT {
    secret?: string;
  }
}

let made: NextAuthOptions | undefined;

/** Made at the first request: a build has no settings. */
export const authOptions = (): NextAuthOptions => (made ??= makeOptions(openIdProvider()));

const makeOptions = (openId: ReturnType<typeof openIdProvider>): NextAuthOptions => ({
  session: { strategy: 'jwt', maxAge: LONGEST_SESSION_MS / 1000 },
  pages: { signIn: paths.signIn, error: paths.signIn },
  cookies: { sessionToken: sessionCookie() },
  logger: {
    error: (code, metadata) =>
      logger.error({ event: 'next-auth', code, why: wordsOf(metadata) }, 'sign-in machinery'),
    warn: (code) => logger.warn({ event: 'next-auth', code }, 'sign-in machinery'),
    debug: () => undefined,
  },
  providers: [
    CredentialsProvider({
      credentials: { email: {}, password: {}, code: {} },
      // A sentence thrown here reaches the form; a wrong pair is null and tells nothing.
      authorize: async (credentials) => {
        try {
          return await checkSignIn(credentials);
        } catch (error) {
          if (error instanceof AppError) throw new Error(error.userMessage, { cause: error });
          throw error;
        }
      },
    }),
    ...(openId === null ? [] : [openId.provider]),
  ],
  callbacks: {
    // Someone from the provider must be known here: Marlwick never makes an account by itself.
    signIn: async ({ user, account, profile }) => {
      if (openId === null || account?.provider !== openId.provider.id) return true;
      const person = await openId.personOf(profile);
      if (person === null) return paths.signInRefused;
      Object.assign(user, person);
      return true;
    },
    jwt: async ({ token, user }) => {
      // Present only while signing in: each sign-in is a session of its own.
      if (user === undefined) return token;
      await endFormerSession();
      const browser = (await headers()).get('user-agent') ?? '';
      return { secret: await beginSession(user.id, browser) };
    },
    // Who this is, and in which role, is read from the database at each request.
    session: ({ session, token }) => ({ ...session, secret: token.secret ?? '' }),
  },
  events: {
    signOut: async ({ token }) => {
      if (token.secret !== undefined) await endSession(token.secret);
    },
  },
});

/** Bound to this very host under https; on plain loopback a browser would not take such a name. */
function sessionCookie(): NonNullable<NextAuthOptions['cookies']>['sessionToken'] {
  const secure = env().NEXTAUTH_URL.startsWith('https:');
  return {
    name: `${secure ? '__Host-' : ''}marlwick-session`,
    options: { httpOnly: true, sameSite: 'lax', path: '/', secure },
  };
}

/** Signing in again in the same browser leaves no session behind (OWASP ASVS V7.2.4). */
async function endFormerSession(): Promise<void> {
  const token = (await cookies()).get(sessionCookie()?.name ?? '')?.value;
  const { NEXTAUTH_SECRET } = env();
  if (token === undefined || NEXTAUTH_SECRET === undefined) return;
  const former = await decode({ token, secret: NEXTAUTH_SECRET }).catch(() => null);
  if (former?.secret !== undefined) await endSession(former.secret);
}

const wordsOf = (metadata: unknown): string =>
  metadata instanceof Error ? metadata.name : 'see the code';

import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { AppError } from '@/lib/errors';
import { logger } from '@/lib/logger';
import { paths } from '@/lib/paths';
import { checkSignIn } from './check-sign-in';
import { openIdProvider } from './open-id';

declare module 'next-auth' {
  interface Session {
    personId: string;
    /** The number the person's sessions are made under; another in the database ends this one. */
    epoch: number;
  }
  interface User {
    epoch: number;
  }
}
declare module 'next-auth/jwt' {
  interface JWT {
    epoch?: number;
  }
}

const ONE_SHIFT_S = 12 * 60 * 60;

let made: NextAuthOptions | undefined;

/** Made at the first request: a build has no settings. */
export const authOptions = (): NextAuthOptions => (made ??= makeOptions(openIdProvider()));

const makeOptions = (openId: ReturnType<typeof openIdProvider>): NextAuthOptions => ({
  session: { strategy: 'jwt', maxAge: ONE_SHIFT_S },
  pages: { signIn: paths.signIn, error: paths.signIn },
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
      if (account?.provider !== openId?.provider.id || openId === null) return true;
      const person = await openId.personOf(profile);
      if (person === null) return paths.signInRefused;
      Object.assign(user, person);
      return true;
    },
    jwt: ({ token, user }) =>
      // Only present while signing in.
      user === undefined ? token : { ...token, sub: user.id, epoch: user.epoch },
    // The token names the person only; role and organisation are read from the database at each request.
    session: ({ session, token }) => ({
      ...session,
      personId: token.sub ?? '',
      epoch: token.epoch ?? -1,
    }),
  },
  events: {
    signIn: ({ user, account }) =>
      logger.info({ event: 'signed-in', personId: user.id, by: account?.provider }, 'signed in'),
    signOut: ({ token }) => logger.info({ event: 'signed-out', personId: token.sub }, 'signed out'),
  },
});

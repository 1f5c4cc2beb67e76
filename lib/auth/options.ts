import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { AppError } from '@/lib/errors';
import { paths } from '@/lib/paths';
import { checkSignIn } from './check-sign-in';

declare module 'next-auth' {
  interface Session {
    personId: string;
  }
}

const ONE_SHIFT_S = 12 * 60 * 60;

export const authOptions: NextAuthOptions = {
  session: { strategy: 'jwt', maxAge: ONE_SHIFT_S },
  pages: { signIn: paths.signIn },
  providers: [
    CredentialsProvider({
      credentials: { email: {}, password: {} },
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
  ],
  callbacks: {
    // The token names the person only; role and organisation are read from the database at each request.
    session: ({ session, token }) => ({ ...session, personId: token.sub ?? '' }),
  },
};

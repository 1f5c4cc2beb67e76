import NextAuth from 'next-auth';
import { authOptions } from '@/lib/auth/options';

type Handler = (request: Request, context: unknown) => Promise<Response>;

const handler: Handler = (request, context) =>
  (NextAuth(authOptions()) as Handler)(request, context);

export { handler as GET, handler as POST };

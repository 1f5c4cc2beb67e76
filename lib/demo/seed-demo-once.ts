import { insertDemoOnce } from '@/db/seeds/insert-demo-once';
import { hashPassword } from '@/lib/auth/passwords';
import { buildDemo } from './build-demo';
import { DEMO_ORGANISATION, DEMO_SIGN_INS } from './people';
import type { DemoSignIn } from './schema';

/**
 * Fills the demo organisation with two years up to `now`, unless it is there already; all of it is kept, or none.
 * Returns who may sign in, either way.
 */
export async function seedDemoOnce(
  ownerUrl: string,
  { now = new Date() }: { now?: Date } = {},
): Promise<DemoSignIn[]> {
  await insertDemoOnce(ownerUrl, DEMO_ORGANISATION.id, async () => {
    const passwordHashes = await Promise.all(
      DEMO_SIGN_INS.map(
        async ({ email, password }) => [email, await hashPassword(password)] as const,
      ),
    );
    return { data: buildDemo({ now }), passwordHashByEmail: new Map(passwordHashes) };
  });
  return [...DEMO_SIGN_INS];
}

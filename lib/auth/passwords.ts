import { hash, verify } from '@node-rs/argon2';

// OWASP Password Storage Cheat Sheet: argon2id with 19 MiB, two passes, one lane. The work runs on libuv's threads.
const ARGON2ID = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** An argon2id hash with its own salt, in the usual encoded form. */
export const hashPassword = (password: string): Promise<string> => hash(password, ARGON2ID);

/** True when the password made this hash; a hash that cannot be read matches nothing. */
export async function verifyPassword(encodedHash: string, password: string): Promise<boolean> {
  try {
    return await verify(encodedHash, password);
  } catch {
    return false;
  }
}

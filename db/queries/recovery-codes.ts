import type { Database } from '../client';
import type { RecoveryCodeRow } from '../tables/rows';

/** Replaces a person's recovery codes, the unused and the used. */
export async function replaceRecoveryCodes(
  db: Database,
  personId: string,
  codeHashes: readonly string[],
): Promise<void> {
  await db<RecoveryCodeRow>('recovery_codes').where({ person_id: personId }).delete();
  if (codeHashes.length === 0) return;
  await db<RecoveryCodeRow>('recovery_codes').insert(
    codeHashes.map((code_hash) => ({ person_id: personId, code_hash, used_at: null })),
  );
}

/** Uses a code up; false when there is none such, or it was used before. */
export async function spendRecoveryCode(
  db: Database,
  personId: string,
  codeHash: string,
  now: Date,
): Promise<boolean> {
  const used = await db<RecoveryCodeRow>('recovery_codes')
    .where({ person_id: personId, code_hash: codeHash, used_at: null })
    .update({ used_at: now });
  return used === 1;
}

export async function countUnusedCodes(db: Database, personId: string): Promise<number> {
  const [row] = await db<RecoveryCodeRow>('recovery_codes')
    .where({ person_id: personId, used_at: null })
    .count<{ count: number }[]>('* as count');
  return row?.count ?? 0;
}

import { createHash } from 'node:crypto';
import type { AuditEntry } from './schema';

/** What the first entry of a trail follows. */
export const FIRST_HASH = '0'.repeat(64);

type Hashed = Omit<AuditEntry, 'hash'> & { readonly organisationId: string };

/** SHA-256 over every field of an entry and the hash before it: no entry can be changed, dropped or moved unseen. */
export function hashOf(entry: Hashed): string {
  return createHash('sha256')
    .update(
      canonicalJson([
        entry.organisationId,
        entry.position,
        entry.at.toISOString(),
        entry.actorId,
        entry.actorName,
        entry.action,
        entry.subjectId,
        entry.detail,
        entry.previousHash,
      ]),
    )
    .digest('hex');
}

/** JSON with the keys of every object in order: jsonb does not keep the order they were written in. */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`;
  if (typeof value === 'object' && value !== null) {
    const fields = Object.entries(value)
      .filter(([, field]) => field !== undefined)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, field]) => `${JSON.stringify(key)}:${canonicalJson(field)}`);
    return `{${fields.join(',')}}`;
  }
  return JSON.stringify(value);
}

export type Verdict =
  | { readonly ok: true; readonly entries: number }
  | { readonly ok: false; readonly position: number; readonly why: string };

/** Walks a trail from its first entry; stops at the first that does not follow from the one before. */
export function verifyChain(organisationId: string, entries: readonly AuditEntry[]): Verdict {
  let previousHash = FIRST_HASH;
  for (const [index, entry] of entries.entries()) {
    const { position } = entry;
    if (position !== index + 1) {
      return { ok: false, position: index + 1, why: 'an entry is missing here' };
    }
    if (entry.previousHash !== previousHash) {
      return { ok: false, position, why: 'it does not follow from the entry before it' };
    }
    if (hashOf({ ...entry, organisationId }) !== entry.hash) {
      return { ok: false, position, why: 'its content was changed after it was written' };
    }
    previousHash = entry.hash;
  }
  return { ok: true, entries: entries.length };
}

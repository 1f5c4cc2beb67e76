import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson, FIRST_HASH, hashOf, verifyChain } from '@/lib/audit/chain';
import type { AuditEntry } from '@/lib/audit/schema';

const ORGANISATION = 'org_test';

/** An honest trail of `length` entries. */
function trail(length: number): AuditEntry[] {
  const entries: AuditEntry[] = [];
  for (let position = 1; position <= length; position++) {
    const entry = {
      position,
      at: new Date(Date.UTC(2026, 11, 1, 0, position)),
      actorId: 'per_a',
      actorName: 'A',
      action: 'plan.saved',
      subjectId: `pln_${position}`,
      detail: { doses: [{ reagent: 'calcium-hydroxide', doseMgL: position / 10 }], reason: '' },
      previousHash: entries.at(-1)?.hash ?? FIRST_HASH,
    };
    entries.push({ ...entry, hash: hashOf({ ...entry, organisationId: ORGANISATION }) });
  }
  return entries;
}

describe('the chain of an audit trail', () => {
  it('holds for an honest trail, and for an empty one', () => {
    expect(verifyChain(ORGANISATION, trail(20))).toEqual({ ok: true, entries: 20 });
    expect(verifyChain(ORGANISATION, [])).toEqual({ ok: true, entries: 0 });
  });

  const changes: readonly (readonly [string, (entry: AuditEntry) => AuditEntry])[] = [
    ['dose', (entry) => ({ ...entry, detail: { doses: [], reason: '' } })],
    ['actor', (entry) => ({ ...entry, actorId: 'per_b' })],
    ['name', (entry) => ({ ...entry, actorName: 'B' })],
    ['time', (entry) => ({ ...entry, at: new Date(0) })],
    ['subject', (entry) => ({ ...entry, subjectId: 'pln_x' })],
    ['action', (entry) => ({ ...entry, action: 'plan.dropped' })],
  ];

  it.each(changes)('finds an entry whose %s was changed, wherever it stands', (_what, change) => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 12 }), (position) => {
        const entries = trail(12).map((entry) =>
          entry.position === position ? change(entry) : entry,
        );
        expect(verifyChain(ORGANISATION, entries)).toMatchObject({ ok: false, position });
      }),
    );
  });

  it('finds an entry left out, two that changed places, and one rewritten with a fresh hash', () => {
    const entries = trail(5);
    expect(verifyChain(ORGANISATION, entries.toSpliced(2, 1))).toMatchObject({
      ok: false,
      position: 3,
    });
    expect(
      verifyChain(
        ORGANISATION,
        [1, 0, 2, 3, 4].flatMap((i) => entries[i] ?? []),
      ),
    ).toMatchObject({ ok: false });
    const [first, second, ...rest] = entries;
    if (first === undefined || second === undefined) throw new Error('The trail is too short.');
    const rewritten = { ...second, subjectId: 'pln_other' };
    const rehashed = { ...rewritten, hash: hashOf({ ...rewritten, organisationId: ORGANISATION }) };
    expect(verifyChain(ORGANISATION, [first, rehashed, ...rest])).toMatchObject({
      ok: false,
      position: 3,
    });
  });

  it('belongs to its organisation', () => {
    expect(verifyChain('org_other', trail(3))).toMatchObject({ ok: false, position: 1 });
  });

  it('does not depend on the order in which a database returns the keys of an object', () => {
    expect(canonicalJson({ b: 1, a: [{ d: 1, c: null }] })).toBe('{"a":[{"c":null,"d":1}],"b":1}');
  });
});

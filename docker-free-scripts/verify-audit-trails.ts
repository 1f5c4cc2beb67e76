/** Walks every organisation's audit trail, as the schema's owner, and names the first entry that was tampered with. */
import { database } from '@/db/client';
import { listAllOrganisations } from '@/db/queries/organisations';
import { listAuditTrail } from '@/db/queries/audit';
import { inContext } from '@/db/tenant';
import { verifyChain } from '@/lib/audit/chain';

let failed = false;
for (const { id, name } of await listAllOrganisations(database())) {
  const trail = await inContext({ organisationId: id }, (db) => listAuditTrail(db, id));
  const verdict = verifyChain(id, trail);
  failed ||= !verdict.ok;
  process.stdout.write(
    verdict.ok
      ? `${name}: ${verdict.entries} entries, unbroken\n`
      : `${name}: entry ${verdict.position} fails: ${verdict.why}\n`,
  );
}
await database().destroy();
process.exitCode = failed ? 1 : 0;

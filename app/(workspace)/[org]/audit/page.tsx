import type { Metadata } from 'next';
import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';
import { PageHeading } from '@/components/ui/page-heading';
import { AUDIT_PAGE_SIZE, readAudit } from '@/lib/audit/read-audit';
import { auditQueryIn } from '@/lib/audit/schema';
import { pageActor } from '@/lib/auth/actor';
import { paths } from '@/lib/paths';
import { AuditFilterForm } from './audit-filter';
import { AuditList } from './audit-list';

export const metadata: Metadata = { title: 'Audit' };

export default async function AuditPage({
  params,
  searchParams,
}: {
  params: Promise<{ org: string }>;
  searchParams: Promise<Readonly<Record<string, string | undefined>>>;
}) {
  const { org } = await params;
  const actor = await pageActor(org, 'audit.read');
  const asked = await searchParams;
  const filter = auditQueryIn(asked);
  const page = /^[1-9]\d{0,5}$/.test(asked['page'] ?? '') ? Number(asked['page']) : 1;
  const { entries, total, people } = await readAudit(actor, filter, page);
  const pages = Math.max(1, Math.ceil(total / AUDIT_PAGE_SIZE));
  const isFiltered = Object.values(filter).some((value) => value !== undefined);
  return (
    <main className="mx-auto max-w-page px-4 py-6 sm:px-8 sm:py-8">
      <PageHeading
        title="Audit"
        actions={
          <a href={paths.auditExport(org, filter)} className={buttonClass('plain')} download>
            Export as CSV
          </a>
        }
      >
        Every change of plans, targets, feed, people and tokens in {actor.organisation.name}, newest
        first; {total} {isFiltered ? 'pass this filter' : 'in all'}. Entries are written once and
        chained: none can be changed or left out unseen.
      </PageHeading>
      <AuditFilterForm action={paths.audit(org)} filter={filter} people={people} />
      {entries.length === 0 ? (
        <p className="border-y border-rule py-8 text-ink-soft">
          {isFiltered ? 'No change passes this filter.' : 'Nothing has been changed yet.'}
        </p>
      ) : (
        <AuditList entries={entries} />
      )}
      {pages === 1 ? null : (
        <nav aria-label="Pages" className="screen-only mt-4 flex items-center gap-4">
          {page > 1 ? (
            <Link href={paths.audit(org, { ...filter, page: page - 1 })}>← Newer</Link>
          ) : null}
          <span className="text-ink-soft">
            Page {page} of {pages}
          </span>
          {page < pages ? (
            <Link href={paths.audit(org, { ...filter, page: page + 1 })}>Older →</Link>
          ) : null}
        </nav>
      )}
    </main>
  );
}

import type { Metadata } from 'next';
import Link from 'next/link';
import { PageHeading } from '@/components/ui/page-heading';
import { AUDIT_PAGE_SIZE, readAudit } from '@/lib/audit/read-audit';
import { AUDIT_WORDS, type AuditAction } from '@/lib/audit/schema';
import { pageActor } from '@/lib/auth/actor';
import { paths } from '@/lib/paths';
import { AuditList } from './audit-list';

export const metadata: Metadata = { title: 'Audit' };

const isAction = (text: string | undefined): text is AuditAction =>
  text !== undefined && text in AUDIT_WORDS;

export default async function AuditPage({
  params,
  searchParams,
}: {
  params: Promise<{ org: string }>;
  searchParams: Promise<{ action?: string; page?: string }>;
}) {
  const { org } = await params;
  const actor = await pageActor(org, 'audit.read');
  const asked = await searchParams;
  const action = isAction(asked.action) ? asked.action : undefined;
  const page = /^[1-9]\d{0,5}$/.test(asked.page ?? '') ? Number(asked.page) : 1;
  const { entries, total } = await readAudit(actor, { action, page });
  const pages = Math.max(1, Math.ceil(total / AUDIT_PAGE_SIZE));
  return (
    <main className="mx-auto max-w-page px-4 py-6 sm:px-8 sm:py-8">
      <PageHeading title="Audit">
        Every change of a plan in {actor.organisation.name}, newest first; {total} in all. Entries
        are written once and chained: none can be changed or left out unseen.
      </PageHeading>
      {entries.length === 0 ? (
        <p className="border-y border-rule py-8 text-ink-soft">Nothing has been changed yet.</p>
      ) : (
        <AuditList entries={entries} />
      )}
      {pages === 1 ? null : (
        <nav aria-label="Pages" className="screen-only mt-4 flex items-center gap-4">
          {page > 1 ? (
            <Link href={paths.audit(org, { action, page: page - 1 })}>← Newer</Link>
          ) : null}
          <span className="text-ink-soft">
            Page {page} of {pages}
          </span>
          {page < pages ? (
            <Link href={paths.audit(org, { action, page: page + 1 })}>Older →</Link>
          ) : null}
        </nav>
      )}
    </main>
  );
}

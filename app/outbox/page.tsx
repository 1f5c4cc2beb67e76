import type { Metadata } from 'next';
import { PageHeading } from '@/components/ui/page-heading';
import { formatDayTime } from '@/lib/format';
import { readOutbox } from '@/lib/mail/read-outbox';
import { orNotFound } from '../or-not-found';

export const metadata: Metadata = { title: 'Outbox of the mail fake', robots: { index: false } };
export const dynamic = 'force-dynamic';

/** What the local SMTP fake was sent. There is no such page where a real server is set. */
export default async function OutboxPage() {
  const letters = await orNotFound(readOutbox());
  return (
    <main className="mx-auto max-w-page px-4 py-6 sm:px-8">
      <PageHeading title="Outbox">
        Letters that the local mail fake took. None of them left this machine.
      </PageHeading>
      {letters.length === 0 ? (
        <p className="border-y border-rule py-8 text-ink-soft">No letter yet.</p>
      ) : (
        <ol className="border-y border-rule-strong">
          {letters.map(({ name, to, subject, at, text }) => (
            <li key={name} className="border-b border-rule py-4 last:border-b-0">
              <h2 className="text-lg">{subject}</h2>
              <p className="text-sm text-ink-soft">
                to {to}
                {at === null ? '' : `, ${formatDayTime(at, 'UTC')} UTC`}
              </p>
              <div className="mt-2 max-w-prose break-words whitespace-pre-wrap">
                <WithLinks text={text} />
              </div>
            </li>
          ))}
        </ol>
      )}
    </main>
  );
}

/** Plain text with its addresses as links. */
function WithLinks({ text }: { text: string }) {
  return text.split(/(https?:\/\/\S+)/g).map((part, i) =>
    i % 2 === 1 ? (
      <a key={i} href={part}>
        {part}
      </a>
    ) : (
      part
    ),
  );
}

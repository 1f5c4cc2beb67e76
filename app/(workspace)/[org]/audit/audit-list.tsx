import { AUDIT_WORDS, type AuditEntry } from '@/lib/audit/schema';
import { formatDayTime } from '@/lib/format';

/** One line a change: when and who in the margin, what on the right, with everything that was written. */
export function AuditList({ entries }: { entries: readonly AuditEntry[] }) {
  return (
    <ol className="border-y border-rule-strong">
      {entries.map((entry) => (
        <li
          key={entry.position}
          className="grid grid-cols-[minmax(0,1fr)] gap-x-6 border-b border-rule py-3 last:border-b-0 sm:grid-cols-[13rem_minmax(0,1fr)]"
        >
          <p className="text-sm text-ink-soft">
            <span className="figure">{entry.position}</span>. {formatDayTime(entry.at, 'UTC')} UTC
            <br />
            {entry.actorName}
          </p>
          <div>
            <p>
              <strong>{wordsFor(entry.action)}</strong>{' '}
              <span className="figure text-sm break-all whitespace-normal text-ink-soft">
                {entry.subjectId}
              </span>
            </p>
            <details className="text-sm">
              <summary className="flex min-h-8 items-center text-verdigris">
                ▸ What was written
              </summary>
              <pre className="mt-1 overflow-x-auto font-figure text-[0.85rem]" tabIndex={0}>
                {JSON.stringify(entry.detail, null, 2)}
              </pre>
              <p className="figure break-all whitespace-normal text-ink-soft">{entry.hash}</p>
            </details>
          </div>
        </li>
      ))}
    </ol>
  );
}

const wordsFor = (action: string): string =>
  (AUDIT_WORDS as Readonly<Record<string, string>>)[action] ?? action;

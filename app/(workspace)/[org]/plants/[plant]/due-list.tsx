import Link from 'next/link';
import { formatDayTime } from '@/lib/format';
import { paths } from '@/lib/paths';
import type { Today } from '@/lib/today/schema';

const STATE_WORDS = {
  overdue: { word: 'overdue', colour: 'text-rust' },
  soon: { word: 'due soon', colour: 'text-ochre' },
  done: { word: 'done', colour: 'text-verdigris' },
} as const;

/** Which point is to be sampled next, and when. */
export function DueList({
  today,
  organisationSlug,
  plantSlug,
  timeZone,
  maySample,
}: {
  today: Today;
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
  maySample: boolean;
}) {
  const stations = today.steps.flatMap(({ station }) => (station === null ? [] : [station]));
  return (
    <section aria-labelledby="due">
      <h2 id="due" className="text-xl">
        Samples due
      </h2>
      <ul className="ruled mt-2">
        {stations.map(({ slug, name, due }) =>
          due === null ? null : (
            <li key={slug} className="flex flex-wrap items-baseline justify-between gap-x-3 py-2">
              {maySample ? (
                <Link href={paths.newSample(organisationSlug, plantSlug, slug)}>{name}</Link>
              ) : (
                <span>{name}</span>
              )}
              <span className="text-sm">
                <strong className={STATE_WORDS[due.state].colour}>
                  {STATE_WORDS[due.state].word}
                </strong>{' '}
                <span className="text-ink-soft">
                  {due.dueAt === null
                    ? 'never sampled'
                    : `next by ${formatDayTime(due.dueAt, timeZone)}`}
                </span>
              </span>
            </li>
          ),
        )}
      </ul>
    </section>
  );
}

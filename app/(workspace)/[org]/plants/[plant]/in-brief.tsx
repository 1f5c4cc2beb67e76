import type { Today } from '@/lib/today/schema';

/** The page in one line, before anything is scrolled: what misses, what is late, or that all is well. */
export function InBrief({ today }: { today: Today }) {
  const stations = today.steps.flatMap(({ station }) => (station === null ? [] : [station]));
  const misses = stations.flatMap(({ name, readings }) =>
    readings.flatMap(({ as, text, verdict }) =>
      verdict === 'below' || verdict === 'above'
        ? [`${as.label} ${verdict === 'above' ? 'high' : 'low'} at ${name.toLowerCase()}, ${text}`]
        : [],
    ),
  );
  const late = stations
    .filter(({ due }) => due?.state === 'overdue')
    .map(({ name }) => name.toLowerCase());
  if (misses.length === 0 && late.length === 0) {
    return (
      <p className="mb-6 border-y border-rule py-2">
        <strong className="text-verdigris">All in order.</strong> Every newest value lies within its
        target and no sample is late.
      </p>
    );
  }
  return (
    <div className="mb-6 border-y border-rule py-2">
      {misses.length === 0 ? null : (
        <p>
          <strong className="text-rust">Act now.</strong> {misses.join('; ')}.
        </p>
      )}
      {late.length === 0 ? null : (
        <p>
          <strong className="text-ochre">Watch.</strong> {late.length === 1 ? 'Sample' : 'Samples'}{' '}
          overdue: {late.join(', ')}.
        </p>
      )}
    </div>
  );
}

import Link from 'next/link';
import { Figure } from '@/components/ui/figure';
import { formatNumber } from '@/lib/format';
import { paths } from '@/lib/paths';
import { inUnit } from '@/lib/samples/describe';
import type { Reading, Today } from '@/lib/today/schema';

/** Every newest value that misses its target, with the target in words. */
export function OutOfTarget({
  today,
  organisationSlug,
  plantSlug,
}: {
  today: Today;
  organisationSlug: string;
  plantSlug: string;
}) {
  const misses = today.steps.flatMap(({ station }) =>
    (station?.readings ?? [])
      .filter(({ verdict }) => verdict === 'below' || verdict === 'above')
      .map((reading) => ({ station, reading })),
  );
  return (
    <section aria-labelledby="out-of-target">
      <h2 id="out-of-target" className="text-xl">
        Out of target
      </h2>
      {misses.length === 0 ? (
        <p className="mt-2 text-ink-soft">Nothing: every newest value lies within its target.</p>
      ) : (
        <ul className="ruled mt-2">
          {misses.map(({ station, reading }) => (
            <li key={`${station?.slug} ${reading.key}`} className="py-2">
              <p className="flex items-baseline justify-between gap-3">
                <Link
                  href={paths.trends(
                    organisationSlug,
                    plantSlug,
                    `point=${station?.slug}&quantity=${reading.key}`,
                  )}
                >
                  {reading.as.label}, {station?.name.toLowerCase()}
                </Link>
                <Figure unit={reading.as.unit} className="font-semibold text-rust">
                  {reading.text}
                </Figure>
              </p>
              <p className="text-sm text-ink-soft">{targetWords(reading)}</p>
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

function targetWords({ target, verdict, key, as }: Reading): string {
  if (target === null) return '';
  const write = (value: number) => formatNumber(inUnit(key, value, as.unit), as.decimals);
  if (verdict === 'below' && target.lowest !== null)
    return `Lowest allowed here: ${write(target.lowest)}`;
  if (verdict === 'above' && target.highest !== null)
    return `Highest allowed here: ${write(target.highest)}`;
  return '';
}

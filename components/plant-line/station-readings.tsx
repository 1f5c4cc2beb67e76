import Link from 'next/link';
import { formatAge, formatDayTime, formatTime } from '@/lib/format';
import { paths } from '@/lib/paths';
import type { Reading, Station } from '@/lib/today/schema';
import { Formula } from '@/components/ui/formula';

const READINGS_SHOWN = 6;

/** The line shows a few; a missed target is always among them, the rest is one tap away. */
function shownReadings(readings: readonly Reading[]): readonly Reading[] {
  const isMissed = ({ verdict }: Reading) => verdict === 'below' || verdict === 'above';
  const room = READINGS_SHOWN - readings.filter(isMissed).length;
  const kept = new Set(
    readings.filter((reading) => !isMissed(reading)).slice(0, Math.max(0, room)),
  );
  return readings.filter((reading) => isMissed(reading) || kept.has(reading));
}

const DUE_WORDS = { overdue: 'Sample overdue', soon: 'Sample due soon' } as const;

const VERDICT_WORDS = {
  below: { sign: '▼', word: 'low' },
  above: { sign: '▲', word: 'high' },
} as const;

/** What the last samples at one point said, against target, and how old that is. */
export function StationReadings({
  station,
  organisationSlug,
  plantSlug,
  timeZone,
  now,
  maySample,
}: {
  station: Station;
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
  now: Date;
  maySample: boolean;
}) {
  const { lastSample, due } = station;
  return (
    <section aria-label={station.name} className="max-w-2xl border-t border-rule pt-1">
      <p className="flex flex-wrap items-baseline gap-x-2 text-sm text-ink-soft">
        <span className="text-ink italic">{station.name}</span>
        {lastSample === null ? (
          <span>no sample yet</span>
        ) : (
          <Link
            href={paths.sample(organisationSlug, plantSlug, lastSample.id)}
            title={formatDayTime(lastSample.takenAt, timeZone)}
            className="inline-flex min-h-6 items-center"
          >
            {formatTime(lastSample.takenAt, timeZone)}, {formatAge(lastSample.takenAt, now)}
          </Link>
        )}
      </p>
      <dl className="gap-x-8 sm:max-xl:columns-2">
        {shownReadings(station.readings).map((reading) => (
          <ReadingLine key={reading.key} reading={reading} isOlder={isOlder(reading, station)} />
        ))}
      </dl>
      {due !== null && due.state !== 'done' ? (
        <p className="mt-1">
          {maySample ? (
            <Link
              href={paths.newSample(organisationSlug, plantSlug, station.slug)}
              className="inline-flex min-h-touch items-center text-sm font-semibold"
            >
              {DUE_WORDS[due.state]}: enter one
            </Link>
          ) : (
            <strong className="text-sm">{DUE_WORDS[due.state]}</strong>
          )}
        </p>
      ) : null}
    </section>
  );
}

const isOlder = (reading: Reading, station: Station): boolean =>
  station.lastSample !== null && reading.takenAt < station.lastSample.takenAt;

function ReadingLine({ reading, isOlder }: { reading: Reading; isOlder: boolean }) {
  const miss =
    reading.verdict === null || reading.verdict === 'within'
      ? null
      : VERDICT_WORDS[reading.verdict];
  return (
    <div className="grid break-inside-avoid grid-cols-[1fr_auto_3.1rem] items-baseline gap-x-1.5 border-t border-rule py-0.5 text-[0.95rem]">
      <dt title={reading.as.label} className={isOlder ? 'text-ink-soft' : ''}>
        <Formula>{reading.as.short}</Formula>
        {isOlder ? <span className="unit"> earlier</span> : null}
      </dt>
      <dd className={`text-right ${miss === null ? '' : 'font-semibold text-rust'}`}>
        {miss === null ? null : (
          <span className="mr-1 text-xs whitespace-nowrap">
            <span aria-hidden="true">{miss.sign}</span> {miss.word}
          </span>
        )}
        <span className="figure">{reading.text}</span>
      </dd>
      <dd className="unit">
        <Formula>{shortUnit(reading.as.unit)}</Formula>
      </dd>
    </div>
  );
}

/** In the narrow column the basis is left to the sample's own page. */
const shortUnit = (unit: string): string =>
  unit === 'pH' ? '' : (unit.split(/ as | Pt/)[0] ?? unit);

import Link from 'next/link';
import { paths } from '@/lib/paths';
import type { SamplingPoint } from '@/lib/plants/schema';

/** Which point's samples are shown. */
export function PointFilter({
  points,
  current,
  organisationSlug,
  plantSlug,
}: {
  points: readonly SamplingPoint[];
  current: string | undefined;
  organisationSlug: string;
  plantSlug: string;
}) {
  const choices = [{ slug: undefined, name: 'Every point' }, ...points];
  return (
    <nav aria-label="Sampling point" className="screen-only mb-4">
      <ul className="flex flex-wrap gap-x-1">
        {choices.map(({ slug, name }) => (
          <li key={name}>
            <Link
              href={paths.samples(organisationSlug, plantSlug, { point: slug })}
              aria-current={slug === current ? 'page' : undefined}
              className={`flex min-h-touch items-center px-3 no-underline ${
                slug === current
                  ? 'bg-verdigris-wash font-semibold text-ink'
                  : 'text-ink-soft hover:bg-chalk-shade hover:text-ink'
              }`}
            >
              {name}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

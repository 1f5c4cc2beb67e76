'use client';

import Link from 'next/link';
import { useParams } from 'next/navigation';
import { paths } from '@/lib/paths';
import { LinkPending } from './link-pending';

/** The works as index tabs cut into the top edge of the page. */
export function PlantTabs({
  organisationSlug,
  plants,
}: {
  organisationSlug: string;
  plants: readonly { slug: string; name: string }[];
}) {
  const current = useParams<{ plant?: string }>().plant;
  return (
    <nav aria-label="Works" className="screen-only mx-auto max-w-page px-4 sm:px-8">
      <ul className="flex flex-wrap gap-x-1">
        {plants.map(({ slug, name }) => {
          const isCurrent = slug === current;
          return (
            <li key={slug} className={isCurrent ? 'relative -mb-px' : ''}>
              <Link
                href={paths.today(organisationSlug, slug)}
                aria-current={isCurrent ? 'true' : undefined}
                className={`relative flex min-h-touch items-center border border-b-0 px-4 font-head no-underline max-sm:px-2.5 ${
                  isCurrent
                    ? 'border-rule-strong bg-chalk-sheet font-semibold text-ink'
                    : 'border-transparent text-ink-soft hover:bg-chalk-shade hover:text-ink'
                }`}
              >
                {name}
                <LinkPending />
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}

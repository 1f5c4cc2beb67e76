'use client';

import Link from 'next/link';
import { useParams, useSelectedLayoutSegment } from 'next/navigation';
import { paths } from '@/lib/paths';
import { LinkPending } from './link-pending';

const SECTIONS = [
  { segment: null, label: 'Today', href: paths.today },
  { segment: 'samples', label: 'Samples', href: (o: string, p: string) => paths.samples(o, p) },
  { segment: 'plans', label: 'Plans', href: paths.plans },
  { segment: 'targets', label: 'Targets', href: paths.targets },
  { segment: 'trends', label: 'Trends', href: (o: string, p: string) => paths.trends(o, p) },
] as const;

/** The sections of one works, as words along the head of the page. */
export function SectionLinks() {
  const { org = '', plant = '' } = useParams<{ org: string; plant: string }>();
  const current = useSelectedLayoutSegment();
  return (
    <nav aria-label="Sections" className="screen-only border-b border-rule">
      <ul className="mx-auto flex max-w-page flex-wrap gap-x-2 px-2 sm:px-6">
        {SECTIONS.map(({ segment, label, href }) => {
          const isCurrent = segment === current;
          return (
            <li key={label}>
              <Link
                href={href(org, plant)}
                aria-current={isCurrent ? 'page' : undefined}
                className={`relative flex min-h-touch items-center border-b-4 px-3 pt-1 no-underline max-[23rem]:px-2 ${
                  isCurrent
                    ? 'border-verdigris font-semibold text-ink'
                    : 'border-transparent text-ink-soft hover:border-rule-strong hover:text-ink'
                }`}
              >
                {label}
                <LinkPending />
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}

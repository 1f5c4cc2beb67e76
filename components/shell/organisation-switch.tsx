import Link from 'next/link';
import { paths } from '@/lib/paths';

/** For whoever belongs to several organisations: the present one, opening to the others. Works without scripts. */
export function OrganisationSwitch({
  current,
  others,
}: {
  current: string;
  others: readonly { readonly slug: string; readonly name: string }[];
}) {
  return (
    <details className="relative">
      <summary className="flex min-h-touch cursor-pointer items-center gap-1">
        {current} <span aria-hidden>▾</span>
        <span className="sr-only">, change the organisation</span>
      </summary>
      <ul className="absolute top-full left-0 z-20 min-w-64 border border-rule-strong bg-chalk-sheet">
        {others.map(({ slug, name }) => (
          <li key={slug} className="border-b border-rule last:border-b-0">
            <Link
              href={paths.organisation(slug)}
              className="flex min-h-touch items-center px-4 no-underline hover:bg-chalk-shade"
            >
              {name}
            </Link>
          </li>
        ))}
      </ul>
    </details>
  );
}

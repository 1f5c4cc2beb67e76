import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';
import { paths } from '@/lib/paths';

/** Newer and older, with where one stands between them. */
export function PageLinks({
  page,
  pages,
  point,
  organisationSlug,
  plantSlug,
}: {
  page: number;
  pages: number;
  point: string | undefined;
  organisationSlug: string;
  plantSlug: string;
}) {
  if (pages <= 1 && page === 1) return null;
  const to = (target: number) =>
    paths.samples(organisationSlug, plantSlug, { point, page: target });
  return (
    <nav aria-label="Pages" className="screen-only mt-4 flex flex-wrap items-center gap-4">
      {page > 1 ? (
        <Link href={to(page - 1)} className={buttonClass('plain')}>
          ← Newer
        </Link>
      ) : null}
      <span className="text-ink-soft">
        Page <span className="figure">{page}</span> of <span className="figure">{pages}</span>
      </span>
      {page < pages ? (
        <Link href={to(page + 1)} className={buttonClass('plain')}>
          Older →
        </Link>
      ) : null}
    </nav>
  );
}

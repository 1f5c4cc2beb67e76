import Link from 'next/link';

/** Where the sample was taken: one link a point, along the train. */
export function PointLinks({
  points,
}: {
  points: readonly { name: string; href: string; isCurrent: boolean }[];
}) {
  return (
    <nav aria-label="Sampling point" className="mb-6">
      <ul className="flex flex-wrap gap-y-2">
        {points.map(({ name, href, isCurrent }) => (
          <li key={href} className="-ml-px first:ml-0">
            <Link
              href={href}
              aria-current={isCurrent ? 'page' : undefined}
              className={`flex min-h-touch items-center border px-4 no-underline ${
                isCurrent
                  ? 'relative border-verdigris bg-verdigris-wash font-semibold text-ink'
                  : 'border-rule-strong text-ink-soft hover:bg-chalk-shade hover:text-ink'
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

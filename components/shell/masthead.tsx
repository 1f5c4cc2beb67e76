import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';
import type { Organisation } from '@/lib/organisations/schema';
import { paths } from '@/lib/paths';
import { OrganisationSwitch } from './organisation-switch';
import { SignOutButton } from './sign-out-button';
import { ThemeSwitch } from './theme-switch';
import { Wordmark } from './wordmark';

export interface MastheadLink {
  readonly label: string;
  readonly href: string;
}

/** The top of every signed-in page: whose log this is and who is writing in it. */
export function Masthead({
  organisation,
  others,
  personName,
  role,
  links,
}: {
  organisation: Organisation;
  /** The person's other organisations. */
  others: readonly Pick<Organisation, 'slug' | 'name'>[];
  personName: string;
  role: string;
  /** What this role may open besides the plants. */
  links: readonly MastheadLink[];
}) {
  return (
    <header className="mx-auto flex max-w-page flex-wrap items-center justify-between gap-x-6 gap-y-1 px-4 pt-3 pb-2 sm:px-8">
      <div className="flex flex-wrap items-center gap-x-5 gap-y-1">
        <Link href={paths.organisation(organisation.slug)} className="no-underline">
          <Wordmark />
        </Link>
        <div className="flex flex-wrap items-center text-ink-soft max-sm:text-sm">
          {others.length === 0 ? (
            organisation.name
          ) : (
            <OrganisationSwitch current={organisation.name} others={others} />
          )}
          {organisation.isDemo ? (
            <span className="ml-3 border border-ochre px-1.5 py-0.5 text-sm whitespace-nowrap text-ochre">
              demo, invented data
            </span>
          ) : null}
        </div>
      </div>
      <div className="screen-only flex flex-wrap items-center max-sm:-ml-4">
        <Link
          href={paths.account}
          className="mr-2 flex min-h-touch items-center px-2 text-sm text-ink-soft max-sm:px-4"
        >
          {personName}, {role}
        </Link>
        {links.map(({ label, href }) => (
          <Link key={href} href={href} className={`${buttonClass('quiet')} max-sm:px-2`}>
            {label}
          </Link>
        ))}
        <ThemeSwitch />
        <SignOutButton />
      </div>
    </header>
  );
}

import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';
import type { Organisation } from '@/lib/organisations/schema';
import { paths } from '@/lib/paths';
import { SignOutButton } from './sign-out-button';
import { ThemeSwitch } from './theme-switch';
import { Wordmark } from './wordmark';

/** The top of every signed-in page: whose log this is and who is writing in it. */
export function Masthead({
  organisation,
  personName,
  role,
  mayReadAudit,
}: {
  organisation: Organisation;
  personName: string;
  role: string;
  mayReadAudit: boolean;
}) {
  return (
    <header className="mx-auto flex max-w-page flex-wrap items-center justify-between gap-x-6 gap-y-1 px-4 pt-3 pb-2 sm:px-8">
      <div className="flex flex-wrap items-center gap-x-5 gap-y-1">
        <Link href={paths.organisation(organisation.slug)} className="no-underline">
          <Wordmark />
        </Link>
        <p className="text-ink-soft max-sm:text-sm">
          {organisation.name}
          {organisation.isDemo ? (
            <span className="ml-3 border border-ochre px-1.5 py-0.5 text-sm whitespace-nowrap text-ochre">
              demo, invented data
            </span>
          ) : null}
        </p>
      </div>
      <div className="screen-only flex items-center max-sm:-ml-4">
        <p className="mr-2 hidden text-sm text-ink-soft sm:block">
          {personName}, {role}
        </p>
        {mayReadAudit ? (
          <Link href={paths.audit(organisation.slug)} className={buttonClass('quiet')}>
            Audit
          </Link>
        ) : null}
        <ThemeSwitch />
        <SignOutButton />
      </div>
    </header>
  );
}

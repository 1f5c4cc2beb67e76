import type { Metadata } from 'next';
import Link from 'next/link';
import { SignOutButton } from '@/components/shell/sign-out-button';
import { Wordmark } from '@/components/shell/wordmark';
import { PageHeading } from '@/components/ui/page-heading';
import { pagePerson } from '@/lib/auth/actor';
import { readSessions } from '@/lib/auth/sessions';
import { formatDayTime } from '@/lib/format';
import { paths } from '@/lib/paths';
import { readAccount } from '@/lib/people/read-account';
import { EndSessionsForm } from './end-sessions-form';
import { PasswordForm } from './password-form';
import { SecondFactor } from './second-factor';
import { SessionList } from './session-list';

export const metadata: Metadata = { title: 'Your account' };

export default async function AccountPage() {
  const person = await pagePerson();
  const { memberships, unusedCodes } = await readAccount(person);
  const sessions = await readSessions(person.id);
  const isOn = person.totpConfirmedAt !== null;
  return (
    <>
      <header className="mx-auto flex max-w-page items-center justify-between px-4 pt-3 pb-2 sm:px-8">
        <Link href={paths.home} className="no-underline">
          <Wordmark />
        </Link>
        <SignOutButton />
      </header>
      <div className="min-h-[80vh] border-t border-rule-strong bg-chalk-sheet">
        <main className="mx-auto max-w-page px-4 py-6 sm:px-8 sm:py-8">
          <PageHeading title="Your account">
            {person.name}, {person.email}
          </PageHeading>
          <div className="grid grid-cols-[minmax(0,1fr)] gap-x-12 gap-y-10 lg:grid-cols-2">
            <section aria-labelledby="organisations">
              <h2 id="organisations" className="text-xl">
                Where you belong
              </h2>
              <ul className="mt-2 border-y border-rule-strong">
                {memberships.map(({ organisation, role }) => (
                  <li key={organisation.id} className="border-b border-rule last:border-b-0">
                    <Link
                      href={paths.organisation(organisation.slug)}
                      className="flex min-h-touch items-center justify-between gap-4"
                    >
                      <span>{organisation.name}</span>
                      <span className="text-sm text-ink-soft">{role}</span>
                    </Link>
                  </li>
                ))}
                {memberships.length === 0 ? (
                  <li className="py-4 text-ink-soft">
                    No organisation counts you among its people.
                  </li>
                ) : null}
              </ul>
            </section>
            <section aria-labelledby="second-factor">
              <h2 id="second-factor" className="text-xl">
                Second factor
              </h2>
              <SecondFactor isOn={isOn} unusedCodes={unusedCodes} />
            </section>
            <section aria-labelledby="password">
              <h2 id="password" className="text-xl">
                Password
              </h2>
              <PasswordForm hasSecondFactor={isOn} />
            </section>
            <section aria-labelledby="sessions">
              <h2 id="sessions" className="text-xl">
                Sessions
              </h2>
              <SessionList
                sessions={sessions.map(({ sessionHash, browser, lastSeenAt }) => ({
                  sessionHash,
                  browser: shortBrowser(browser),
                  lastSeen: `${formatDayTime(lastSeenAt, 'UTC')} UTC`,
                  isThis: sessionHash === person.sessionHash,
                }))}
              />
              <EndSessionsForm hasSecondFactor={isOn} />
            </section>
          </div>
        </main>
      </div>
    </>
  );
}

/** `Chrome on Linux` out of what a browser calls itself, which is long and mostly history. */
function shortBrowser(name: string): string {
  const browser = ['Edg', 'Firefox', 'Chrome', 'Safari'].find((each) => name.includes(each));
  const system = ['Windows', 'Android', 'iPhone', 'iPad', 'Mac OS', 'Linux'].find((each) =>
    name.includes(each),
  );
  if (browser === undefined) return name.slice(0, 40);
  return `${browser === 'Edg' ? 'Edge' : browser}${system === undefined ? '' : ` on ${system}`}`;
}

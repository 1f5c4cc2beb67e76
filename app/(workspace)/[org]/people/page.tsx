import type { Metadata } from 'next';
import { PageHeading } from '@/components/ui/page-heading';
import { pageActor } from '@/lib/auth/actor';
import { formatDay } from '@/lib/format';
import { readPeople } from '@/lib/people/members';
import { readPlants } from '@/lib/plants/read-plants';
import { InvitationList } from './invitation-list';
import { InviteForm } from './invite-form';
import { MemberRow } from './member-row';

export const metadata: Metadata = { title: 'People' };

export default async function PeoplePage({ params }: { params: Promise<{ org: string }> }) {
  const { org } = await params;
  const actor = await pageActor(org, 'member.read');
  const { members, invitations } = await readPeople(actor);
  const plants = (await readPlants(actor)).map(({ id, name }) => ({ id, name }));
  const mayOwn = actor.role === 'owner';
  return (
    <main className="mx-auto max-w-page px-4 py-6 sm:px-8 sm:py-8">
      <PageHeading title="People">
        Who may write in the log of {actor.organisation.name}. A change counts from their next
        click.
      </PageHeading>
      <div className="grid grid-cols-[minmax(0,1fr)] gap-x-12 gap-y-10 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <section aria-labelledby="members">
          <h2 id="members" className="text-xl">
            Members
          </h2>
          <ul className="mt-2 border-y border-rule-strong">
            {members.map((member) => (
              <MemberRow
                key={member.personId}
                organisationSlug={org}
                member={{ ...member, since: formatDay(member.since, 'UTC') }}
                plants={plants}
                isSelf={member.personId === actor.personId}
                mayOwn={mayOwn}
              />
            ))}
          </ul>
        </section>
        <section aria-labelledby="invite">
          <h2 id="invite" className="text-xl">
            Invite someone
          </h2>
          <InviteForm organisationSlug={org} plants={plants} mayOwn={mayOwn} />
          {invitations.length === 0 ? null : (
            <InvitationList
              organisationSlug={org}
              invitations={invitations.map(({ id, email, role, expiresAt, invitedByName }) => ({
                id,
                email,
                role,
                invitedByName,
                until: formatDay(expiresAt, 'UTC'),
              }))}
            />
          )}
        </section>
      </div>
    </main>
  );
}

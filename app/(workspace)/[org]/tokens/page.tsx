import type { Metadata } from 'next';
import Link from 'next/link';
import { PageHeading } from '@/components/ui/page-heading';
import { pageActor } from '@/lib/auth/actor';
import { systemClock } from '@/lib/clock';
import { formatDay, formatDayTime } from '@/lib/format';
import { paths } from '@/lib/paths';
import { readPlants } from '@/lib/plants/read-plants';
import { readTokens, type ListedToken } from '@/lib/tokens/manage-tokens';
import { TokenForm } from './token-form';
import { TokenList } from './token-list';

export const metadata: Metadata = { title: 'API tokens' };

export default async function TokensPage({ params }: { params: Promise<{ org: string }> }) {
  const { org } = await params;
  const actor = await pageActor(org, 'token.read');
  const tokens = await readTokens(actor);
  const plants = (await readPlants(actor)).map(({ id, name }) => ({ id, name }));
  const now = systemClock();
  return (
    <main className="mx-auto max-w-page px-4 py-6 sm:px-8 sm:py-8">
      <PageHeading title="API tokens">
        For programs that read or write this log. A token acts for whoever made it and can only do
        less. <Link href={paths.apiGuide}>How the API works</Link>
      </PageHeading>
      <div className="grid grid-cols-[minmax(0,1fr)] gap-x-12 gap-y-10 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <section aria-labelledby="tokens">
          <h2 id="tokens" className="text-xl">
            Tokens
          </h2>
          <TokenList
            organisationSlug={org}
            tokens={tokens.map((token) => ({
              id: token.id,
              name: token.name,
              prefix: token.prefix,
              scopes: token.scopes,
              madeByName: token.madeByName,
              state: stateOf(token, now),
              isInForce: token.revokedAt === null && token.expiresAt > now,
              lastUsed:
                token.lastUsedAt === null
                  ? 'never used'
                  : `last used ${formatDayTime(token.lastUsedAt, 'UTC')} UTC`,
              where:
                token.plantIds === null
                  ? 'all plants of its maker'
                  : plants
                      .filter(({ id }) => token.plantIds?.includes(id))
                      .map(({ name }) => name)
                      .join(', '),
            }))}
          />
        </section>
        <section aria-labelledby="make">
          <h2 id="make" className="text-xl">
            Make one
          </h2>
          <TokenForm organisationSlug={org} plants={plants} />
        </section>
      </div>
    </main>
  );
}

function stateOf({ revokedAt, expiresAt }: ListedToken, now: Date): string {
  if (revokedAt !== null) return `revoked ${formatDay(revokedAt, 'UTC')}`;
  return `${expiresAt > now ? 'until' : 'expired'} ${formatDay(expiresAt, 'UTC')}`;
}

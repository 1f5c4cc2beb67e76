/** First parts of addresses that belong to the product itself. */
const TAKEN = new Set([
  'account',
  'api',
  'api-guide',
  'confirm-address',
  'favicon.ico',
  'forgotten-password',
  'icon.svg',
  'invitation',
  'new-password',
  'outbox',
  'pricing',
  'robots.txt',
  'sign-in',
  'sign-up',
]);

const MOST_CHARACTERS = 50;
const TRIES = 50;

export const isFreeSlug = (slug: string): boolean => !TAKEN.has(slug) && slug.length >= 2;

/** A name as an address: `Bärental Water!` → `barental-water`, then `barental-water-2` and so on. */
export function* slugsFor(name: string): Generator<string> {
  const plain = name
    .normalize('NFKD')
    .replaceAll(/\p{M}/gu, '')
    .toLowerCase()
    .replaceAll(/[^a-z0-9]+/g, '-')
    .replaceAll(/^-+|-+$/g, '')
    .slice(0, MOST_CHARACTERS);
  const slug = plain.length >= 2 ? plain : 'waterworks';
  yield slug;
  for (let n = 2; n <= TRIES; n++) yield `${slug}-${n}`;
}

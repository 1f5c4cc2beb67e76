import { randomUUID } from 'node:crypto';
import type { Permission } from '@/lib/auth/permissions';
import type { Holding, PlantHolding } from './world';

/**
 * Every page, route handler and action of the product, by its file, with what it asks for. A file that is not here, or
 * is here and gone, fails the test: nothing gets a door by oversight.
 */

/** Anyone; whoever is signed in, for their own account; or a permission at the one door. */
type Door = 'public' | 'person' | Permission;

interface At {
  readonly holding: Holding;
  readonly plant: PlantHolding;
}

export interface PageRow {
  readonly file: string;
  readonly door: Door;
  readonly path: (at: At) => string;
  readonly isOfPlant?: boolean;
  /** What a page answers when its door opens. */
  readonly opens?: number;
}

const page = (folder: string, door: Door, path: (at: At) => string, opens = 200): PageRow => ({
  file: `app/${folder}page.tsx`,
  door,
  path,
  opens,
  isOfPlant: folder.includes('[plant]'),
});

const ORG = '(workspace)/[org]/';
const PLANT = `${ORG}plants/[plant]/`;
const plantPath = ({ holding, plant }: At, rest = '') =>
  `/${holding.org}/plants/${plant.slug}${rest}`;

export const PAGES: readonly PageRow[] = [
  page('(auth)/confirm-address/', 'public', () => '/confirm-address'),
  page('(auth)/forgotten-password/', 'public', () => '/forgotten-password'),
  page('(auth)/invitation/', 'public', () => '/invitation'),
  page('(auth)/new-password/', 'public', () => '/new-password'),
  page('(auth)/sign-in/', 'public', () => '/sign-in', 307),
  page('(auth)/sign-up/', 'public', () => '/sign-up'),
  page('(public)/api-guide/', 'public', () => '/api-guide'),
  page('(public)/', 'person', () => '/', 307),
  page('outbox/', 'public', () => '/outbox'),
  page('(person)/account/', 'person', () => '/account'),
  page(ORG, 'plant.read', ({ holding }) => `/${holding.org}`, 307),
  page(`${ORG}audit/`, 'audit.read', ({ holding }) => `/${holding.org}/audit`),
  page(`${ORG}people/`, 'member.read', ({ holding }) => `/${holding.org}/people`),
  page(`${ORG}tokens/`, 'token.read', ({ holding }) => `/${holding.org}/tokens`),
  page(PLANT, 'plant.read', (at) => plantPath(at)),
  page(`${PLANT}samples/`, 'sample.read', (at) => plantPath(at, '/samples')),
  page(`${PLANT}samples/[sample]/`, 'sample.read', (at) =>
    plantPath(at, `/samples/${at.plant.sampleId}`),
  ),
  page(`${PLANT}samples/new/`, 'sample.write', (at) => plantPath(at, '/samples/new')),
  page(`${PLANT}plans/`, 'plan.read', (at) => plantPath(at, '/plans')),
  page(`${PLANT}plans/[plan]/`, 'plan.read', (at) => plantPath(at, `/plans/${at.plant.planId}`)),
  page(`${PLANT}plans/new/`, 'plan.write', (at) =>
    plantPath(at, `/plans/new?sample=${at.plant.sampleId}`),
  ),
  page(`${PLANT}targets/`, 'plant.read', (at) => plantPath(at, '/targets')),
  page(`${PLANT}trends/`, 'trend.read', (at) => plantPath(at, '/trends')),
];

export interface RouteRow {
  readonly file: string;
  readonly method: 'GET' | 'POST' | 'PUT';
  readonly door: 'public' | Permission;
  readonly path: (at: At) => string;
  readonly isOfPlant?: boolean;
  readonly opens?: number;
  readonly body?: (at: At) => unknown;
  /** The version of the target at hand is read before. */
  readonly needsMatch?: boolean;
}

const api = (
  method: RouteRow['method'],
  folder: string,
  door: RouteRow['door'],
  rest: Partial<RouteRow> & { readonly query?: string } = {},
): RouteRow => ({
  file: `app/api/v1/[org]/${folder}route.ts`,
  method,
  door,
  path: ({ holding, plant }) =>
    `/api/v1/${holding.org}/${folder}`
      .replace('[plant]', plant.slug)
      .replace('[sample]', plant.sampleId)
      .replace('[plan]', plant.planId)
      .replace('[target]', plant.targetId)
      .replace(/\/$/, '') + (rest.query ?? ''),
  isOfPlant: folder.includes('[plant]'),
  opens: method === 'POST' ? 201 : 200,
  ...rest,
});

export const sampleBody = () => ({
  pointSlug: 'raw',
  takenAtLocal: '2026-11-02T06:00',
  comment: '',
  results: [{ quantity: 'pH', text: '7.3', unit: 'pH', qualifier: '' }],
});
export const planBody = ({ plant }: At) => ({
  sampleId: plant.sampleId,
  reagent: 'sodium-hydroxide',
  doseMgL: 1,
  target: { quantity: 'pH', value: 8 },
  reason: 'matrix',
});
export const boundsBody = () => ({
  lowest: 6,
  highest: 9,
  preferred: 7,
  basis: '',
  reason: 'matrix',
});

export const ROUTES: readonly RouteRow[] = [
  api('GET', 'plants/', 'plant.read'),
  api('GET', 'plants/[plant]/', 'plant.read'),
  api('GET', 'plants/[plant]/points/', 'plant.read'),
  api('GET', 'plants/[plant]/targets/', 'plant.read'),
  api('GET', 'plants/[plant]/targets/[target]/', 'plant.read'),
  api('PUT', 'plants/[plant]/targets/[target]/', 'target.write', {
    body: boundsBody,
    needsMatch: true,
  }),
  api('GET', 'plants/[plant]/samples/', 'sample.read'),
  api('POST', 'plants/[plant]/samples/', 'sample.write', { body: sampleBody }),
  api('GET', 'plants/[plant]/samples/[sample]/', 'sample.read'),
  api('GET', 'plants/[plant]/plans/', 'plan.read'),
  api('POST', 'plants/[plant]/plans/', 'plan.write', { body: planBody }),
  api('GET', 'plants/[plant]/plans/[plan]/', 'plan.read'),
  api('GET', 'plants/[plant]/feed-log/', 'feed.read'),
  api('POST', 'plants/[plant]/feed-log/', 'feed.write', {
    body: ({ plant }) => ({
      dosingPointId: plant.dosingPointId,
      from: '2026-11-01T00:00:00Z',
      to: '2026-11-01T12:00:00Z',
      productKg: 3,
    }),
  }),
  api('GET', 'plants/[plant]/series/', 'trend.read', {
    query: '?point=raw&quantity=pH&from=2026-11-01&to=2026-11-30',
  }),
  api('GET', 'audit/', 'audit.read'),
  api('GET', 'audit.csv/', 'audit.read'),
];

/** Route handlers that stand outside the door, each with its reason. */
export const OPEN_ROUTES: Readonly<Record<string, string>> = {
  'app/api/auth/[...nextauth]/route.ts': 'signing in and out; next-auth guards it by its own token',
  'app/api/health/route.ts': 'says only whether the process and its database answer',
  'app/api/v1/openapi.json/route.ts': 'describes the API, holds no data',
};

export interface ActionRow {
  readonly file: string;
  readonly name: string;
  readonly door: Door;
  /** Input that passes the schema and names a plant: what is refused after the door then is the plant. */
  readonly plantInput?: (at: At) => unknown;
}

const action = (
  folder: string,
  name: string,
  door: Door,
  plantInput?: ActionRow['plantInput'],
): ActionRow => ({
  file: `app/${folder}actions.ts`,
  name,
  door,
  ...(plantInput === undefined ? {} : { plantInput }),
});

export const ACTIONS: readonly ActionRow[] = [
  action('(auth)/', 'signUpAction', 'public'),
  action('(auth)/', 'askNewPasswordAction', 'public'),
  action('(auth)/', 'confirmAddressAction', 'public'),
  action('(auth)/', 'setNewPasswordAction', 'public'),
  action('(auth)/', 'readInvitationAction', 'public'),
  action('(auth)/', 'acceptInvitationAction', 'public'),
  action('(person)/account/', 'changePasswordAction', 'person'),
  action('(person)/account/', 'endAllSessionsAction', 'person'),
  action('(person)/account/', 'endSessionAction', 'person'),
  action('(person)/account/', 'beginSecondFactorAction', 'person'),
  action('(person)/account/', 'confirmSecondFactorAction', 'person'),
  action('(person)/account/', 'endSecondFactorAction', 'person'),
  action(`${ORG}people/`, 'inviteAction', 'member.write'),
  action(`${ORG}people/`, 'revokeInvitationAction', 'member.write'),
  action(`${ORG}people/`, 'changeMemberAction', 'member.write'),
  action(`${ORG}people/`, 'removeMemberAction', 'member.write'),
  action(`${ORG}people/`, 'signOutMemberAction', 'member.write'),
  action(`${ORG}tokens/`, 'makeTokenAction', 'token.write'),
  action(`${ORG}tokens/`, 'revokeTokenAction', 'token.write'),
  action(`${PLANT}samples/new/`, 'saveSampleAction', 'sample.write', ({ plant }) => ({
    ...sampleBody(),
    plantSlug: plant.slug,
    clientKey: randomUUID(),
  })),
  action(`${PLANT}plans/new/`, 'savePlanAction', 'plan.write', (at) => ({
    ...planBody(at),
    plantSlug: at.plant.slug,
    clientKey: randomUUID(),
  })),
  action(`${PLANT}targets/`, 'changeTargetAction', 'target.write', ({ plant }) => ({
    plantSlug: plant.slug,
    targetId: plant.targetId,
    version: 999_999,
    bounds: boundsBody(),
  })),
];

import knex, { type Knex } from 'knex';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { database as pool } from '@/db/client';
import { ownerKnexConfig } from '@/db/knex-config';
import { checkSignIn } from '@/lib/auth/check-sign-in';
import { enter, type Actor } from '@/lib/auth/door';
import { endAllSessions, endSession, readSessions, withSession } from '@/lib/auth/sessions';
import { findSignedIn } from '@/lib/auth/signed-in';
import { acceptInvitation, readInvitation } from '@/lib/people/accept-invitation';
import { askNewPassword } from '@/lib/people/ask-new-password';
import { changePassword } from '@/lib/people/change-password';
import { confirmAddress } from '@/lib/people/confirm-address';
import { invite, revokeInvitation } from '@/lib/people/invite';
import { changeMember, readPeople, removeMember } from '@/lib/people/members';
import { setNewPassword } from '@/lib/people/set-new-password';
import { signUp } from '@/lib/people/sign-up';
import { readPlants } from '@/lib/plants/read-plants';
import { letterTo, lettersIn, openTestMail, secretIn } from '../support/kept-letters';
import { sessionOf } from '../support/session-of';
import { insertSmallWorks, SMALL_WORKS } from '../support/small-works';
import { createTestDatabase, type TestDatabase } from '../support/test-database';

let database: TestDatabase;
let admin: Knex;
let mail: Awaited<ReturnType<typeof openTestMail>>;

const PASSWORD = 'three quiet herons wade';
const HOUR_MS = 3_600_000;
const later = (ms: number) => () => new Date(Date.now() + ms);
let serial = 0;
/** An address nobody has used yet. */
const fresh = () => `someone${++serial}@new.example`;

beforeAll(async () => {
  database = await createTestDatabase();
  process.env.DATABASE_URL = database.url;
  process.env.NEXTAUTH_SECRET = 'a-secret-for-tests-only-0123456789abcdef';
  mail = await openTestMail();
  admin = knex(ownerKnexConfig(database.adminUrl));
  await insertSmallWorks(admin);
  await insertSmallWorks(admin, '-2');
});
beforeEach(() => admin('rate_limits').delete());
afterAll(async () => {
  await pool().destroy();
  await admin.destroy();
  await database.drop();
  await mail.close();
});

const newcomer = (email: string, organisationName = 'Brook Water') =>
  signUp({ email, name: 'New Comer', password: PASSWORD, organisationName });
const signInWith = (email: string, password = PASSWORD) => checkSignIn({ email, password });

/** Signs up, confirms, and enters as the owner of a new organisation. */
async function owner(
  organisationName: string,
): Promise<{ actor: Actor; email: string; slug: string }> {
  const email = fresh();
  await newcomer(email, organisationName);
  await confirmAddress(secretIn(await letterTo(mail.folder, email, /Confirm/)));
  const person = await signInWith(email);
  const slug = organisationName.toLowerCase().replaceAll(' ', '-');
  return {
    email,
    slug,
    actor: await enter(await sessionOf(person?.id ?? ''), slug, 'member.write'),
  };
}

async function joined(actor: Actor, role: 'operator' | 'consultant' | 'manager' | 'owner') {
  const email = fresh();
  await invite(actor, { email, role, plantIds: null });
  const secret = secretIn(await letterTo(mail.folder, email, /invites/));
  await acceptInvitation(null, { secret, account: { name: `A ${role}`, password: PASSWORD } });
  const person = await signInWith(email);
  if (person === null) throw new Error('Not signed in.');
  return person;
}

describe('signing up', () => {
  it('opens an organisation with its owner, shut until the address is confirmed by its letter', async () => {
    const email = fresh();
    await newcomer(email, 'Bärental Water!');
    await expect(signInWith(email)).rejects.toMatchObject({ code: 'forbidden' });
    await confirmAddress(secretIn(await letterTo(mail.folder, email, /Confirm/)));
    const person = await signInWith(email);
    const actor = await enter(await sessionOf(person?.id ?? ''), 'barental-water', 'audit.read');
    expect(actor).toMatchObject({ role: 'owner', plantIds: null });
    const trail = await admin('audit_entries').where({ organisation_id: actor.organisation.id });
    expect(trail.map(({ action }: { action: string }) => action)).toEqual(['organisation.made']);
  });

  it('says the same of a known address, opens nothing, and tells its owner by letter', async () => {
    const { email } = await owner('Known Water');
    const people = await admin('people').count();
    const organisations = await admin('organisations').count();
    await expect(newcomer(email)).resolves.toBeUndefined();
    await letterTo(mail.folder, email, /already/);
    expect(await admin('people').count()).toEqual(people);
    expect(await admin('organisations').count()).toEqual(organisations);
  });

  it('gives a second organisation of one name an address of its own, and none that the product uses', async () => {
    await owner('Twin Water');
    await newcomer(fresh(), 'Twin Water');
    await newcomer(fresh(), 'Account');
    const slugs = (await admin('organisations').pluck('slug')) as string[];
    expect(slugs).toContain('twin-water-2');
    expect(slugs).toContain('account-2');
    expect(slugs).not.toContain('account');
  });

  it('confirms once, within two days', async () => {
    const email = fresh();
    await newcomer(email);
    const secret = secretIn(await letterTo(mail.folder, email, /Confirm/));
    await expect(confirmAddress(secret, later(49 * HOUR_MS))).rejects.toMatchObject({
      code: 'notFound',
    });
    await confirmAddress(secret);
    await expect(confirmAddress(secret)).rejects.toMatchObject({ code: 'notFound' });
  });

  it('is closed to an address after five tries in an hour', async () => {
    const email = fresh();
    for (let i = 0; i < 5; i++) await newcomer(email);
    await expect(newcomer(email)).rejects.toMatchObject({ code: 'tooMany' });
  });
});

describe('a forgotten password', () => {
  it('is replaced once by the letter’s link, ends every session and opens with the new one only', async () => {
    const { email, slug } = await owner('Forgetful Water');
    const before = await signInWith(email);
    const session = await sessionOf(before?.id ?? '');
    expect(await findSignedIn(session)).not.toBeNull();
    await askNewPassword(email);
    const secret = secretIn(await letterTo(mail.folder, email, /new password/i));
    await setNewPassword(secret, 'four slow barges pass');
    await expect(setNewPassword(secret, 'five slow barges pass')).rejects.toMatchObject({
      code: 'notFound',
    });
    expect(await signInWith(email)).toBeNull();
    const after = await signInWith(email, 'four slow barges pass');
    expect(await findSignedIn(session)).toBeNull();
    await expect(enter(session, slug, 'plant.read')).rejects.toMatchObject({ code: 'signedOut' });
    await expect(
      enter(await sessionOf(after?.id ?? ''), slug, 'plant.read'),
    ).resolves.toBeDefined();
  });

  it('answers an unknown address as a known one and writes to nobody', async () => {
    const letters = (await lettersIn(mail.folder)).length;
    await expect(askNewPassword('nobody@nowhere.example')).resolves.toBeUndefined();
    await new Promise((resolve) => setTimeout(resolve, 200));
    expect(await lettersIn(mail.folder)).toHaveLength(letters);
  });

  it('closes known and unknown addresses alike after the third letter in an hour', async () => {
    const { email } = await owner('Insistent Water');
    for (const address of [email, 'stranger@nowhere.example']) {
      for (let i = 0; i < 3; i++) await askNewPassword(address);
      await expect(askNewPassword(address)).rejects.toMatchObject({ code: 'tooMany' });
    }
  });

  it('works within the hour, and only by the newest letter', async () => {
    const { email } = await owner('Hasty Water');
    await askNewPassword(email);
    const first = secretIn(await letterTo(mail.folder, email, /new password/i));
    await askNewPassword(email);
    await expect(setNewPassword(first, 'six slow barges pass')).rejects.toMatchObject({
      code: 'notFound',
    });
    const newest = (await lettersIn(mail.folder)).filter(({ to }) => to === email).at(-1);
    if (newest === undefined) throw new Error('No letter.');
    await expect(
      setNewPassword(secretIn(newest), 'six slow barges pass', later(61 * 60_000)),
    ).rejects.toMatchObject({ code: 'notFound' });
  });

  it('keeps no secret, only its hash', async () => {
    const { email } = await owner('Discreet Water');
    await askNewPassword(email);
    const secret = secretIn(await letterTo(mail.folder, email, /new password/i));
    expect(secret).toHaveLength(43);
    expect(JSON.stringify(await admin('one_time_tokens'))).not.toContain(secret);
  });
});

describe('an account', () => {
  it('changes its password only for who knows the present one; every session ends', async () => {
    const { email } = await owner('Careful Water');
    const signedIn = await signInWith(email);
    const session = await sessionOf(signedIn?.id ?? '');
    const person = await findSignedIn(session);
    if (person === null) throw new Error('Not signed in.');
    await expect(
      changePassword(person, { password: 'not it at all', code: '' }, 'seven slow barges'),
    ).rejects.toMatchObject({
      code: 'badInput',
    });
    expect(await findSignedIn(session)).not.toBeNull();
    await changePassword(person, { password: PASSWORD, code: '' }, 'seven slow barges');
    expect(await findSignedIn(session)).toBeNull();
    expect(await signInWith(email, 'seven slow barges')).not.toBeNull();
  });

  it('signs out one browser and no other; each has a session of its own', async () => {
    const { actor } = await owner('Twofold Water');
    const first = await sessionOf(actor.personId);
    const second = await sessionOf(actor.personId);
    if (first?.kind !== 'session' || second?.kind !== 'session') throw new Error('No sessions.');
    await endSession(first.secret);
    expect(await findSignedIn(first)).toBeNull();
    expect(await findSignedIn(second)).not.toBeNull();
    expect((await readSessions(actor.personId)).length).toBeGreaterThan(0);
  });

  it('has sessions of twelve hours at most, and of four without a click', async () => {
    const { actor } = await owner('Sleepy Water');
    const session = await sessionOf(actor.personId);
    if (session?.kind !== 'session') throw new Error('No session.');
    const alive = (hours: number) =>
      withSession(session.secret, () => Promise.resolve(true), later(hours * HOUR_MS));
    expect(await alive(3.9)).toBe(true);
    expect(await alive(8.1)).toBeUndefined();
    for (const hours of [3.9, 7.7, 11.5, 11.9]) expect(await alive(hours)).toBe(true);
    expect(await alive(12.1)).toBeUndefined();
  });

  it('signs out everywhere', async () => {
    const { email } = await owner('Absent Water');
    const signedIn = await signInWith(email);
    const session = await sessionOf(signedIn?.id ?? '');
    await endAllSessions(signedIn?.id ?? '');
    expect(await findSignedIn(session)).toBeNull();
  });
});

describe('an invitation', () => {
  it('takes in someone new, once, with role and plants, and the letter confirms the address', async () => {
    const { actor } = await owner('Inviting Water');
    const person = await joined(actor, 'operator');
    const { members, invitations } = await readPeople(actor);
    expect(members.find(({ personId }) => personId === person.id)).toMatchObject({
      role: 'operator',
      plantIds: null,
    });
    expect(invitations).toEqual([]);
  });

  it('takes in someone who is here already only when they are signed in, and lets them belong to several', async () => {
    const first = await owner('First Water');
    const second = await owner('Second Water');
    await invite(first.actor, { email: second.email, role: 'consultant', plantIds: null });
    const secret = secretIn(await letterTo(mail.folder, second.email, /invites/));
    expect(await readInvitation(secret)).toMatchObject({ hasAccount: true, role: 'consultant' });
    await expect(acceptInvitation(null, { secret, account: null })).rejects.toMatchObject({
      code: 'forbidden',
    });
    await expect(
      acceptInvitation({ id: first.actor.personId }, { secret, account: null }),
    ).rejects.toMatchObject({ code: 'forbidden' });
    const id = second.actor.personId;
    await acceptInvitation({ id }, { secret, account: null });
    await expect(enter(await sessionOf(id), first.slug, 'plant.read')).resolves.toMatchObject({
      role: 'consultant',
    });
    await expect(enter(await sessionOf(id), second.slug, 'plant.read')).resolves.toMatchObject({
      role: 'owner',
    });
  });

  it('works once, within seven days, and not after it is revoked or replaced', async () => {
    const { actor } = await owner('Strict Water');
    const account = { name: 'Late Comer', password: PASSWORD };
    const email = fresh();
    const { invitationId } = await invite(actor, { email, role: 'operator', plantIds: null });
    const first = secretIn(await letterTo(mail.folder, email, /invites/));
    await expect(readInvitation(first, later(8 * 24 * HOUR_MS))).rejects.toMatchObject({
      code: 'notFound',
    });
    await revokeInvitation(actor, invitationId);
    await expect(readInvitation(first)).rejects.toMatchObject({ code: 'notFound' });
    await invite(actor, { email, role: 'operator', plantIds: null });
    const second = secretIn(
      (await lettersIn(mail.folder)).filter(({ to }) => to === email).at(-1) ?? {
        to: '',
        subject: '',
        text: '',
      },
    );
    const both = await Promise.allSettled([
      acceptInvitation(null, { secret: second, account }),
      acceptInvitation(null, { secret: second, account }),
    ]);
    expect(both.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    await expect(acceptInvitation(null, { secret: second, account })).rejects.toMatchObject({
      code: 'notFound',
    });
  });

  it('cannot be put on an owner by a manager, nor name plants of others', async () => {
    const { actor, slug } = await owner('Proper Water');
    const manager = await joined(actor, 'manager');
    const asManager = await enter(await sessionOf(manager.id), slug, 'member.write');
    await expect(
      invite(asManager, { email: fresh(), role: 'owner', plantIds: null }),
    ).rejects.toMatchObject({ code: 'forbidden' });
    await expect(
      invite(actor, { email: fresh(), role: 'operator', plantIds: [SMALL_WORKS.plantId] }),
    ).rejects.toMatchObject({ code: 'badInput' });
  });

  it('is limited to thirty letters an hour for one organisation', async () => {
    const { actor } = await owner('Eager Water');
    for (let i = 0; i < 30; i++) {
      await invite(actor, { email: fresh(), role: 'operator', plantIds: null });
    }
    await expect(
      invite(actor, { email: fresh(), role: 'operator', plantIds: null }),
    ).rejects.toMatchObject({ code: 'tooMany' });
  });
});

describe('a member', () => {
  it('has another role, or none, at the very next request', async () => {
    const { actor, slug } = await owner('Changing Water');
    const person = await joined(actor, 'manager');
    const session = await sessionOf(person.id);
    await expect(enter(session, slug, 'audit.read')).resolves.toBeDefined();
    await changeMember(actor, { personId: person.id, role: 'operator', plantIds: null });
    await expect(enter(session, slug, 'audit.read')).rejects.toMatchObject({ code: 'forbidden' });
    await expect(enter(session, slug, 'sample.write')).resolves.toBeDefined();
    await removeMember(actor, person.id);
    await expect(enter(session, slug, 'plant.read')).rejects.toMatchObject({ code: 'notFound' });
  });

  it('that is the last owner stays owner, even when two unmake each other at once', async () => {
    const { actor, slug } = await owner('Owned Water');
    await expect(removeMember(actor, actor.personId)).rejects.toMatchObject({ code: 'conflict' });
    const second = await joined(actor, 'owner');
    const asSecond = await enter(await sessionOf(second.id), slug, 'member.write');
    await Promise.allSettled([
      removeMember(actor, second.id),
      removeMember(asSecond, actor.personId),
    ]);
    const { members } = await readPeople(actor);
    expect(members.filter(({ role }) => role === 'owner')).toHaveLength(1);
  });

  it('of named plants sees those and no others, by the query and by the row policies alike', async () => {
    await admin('plants').insert(
      [1, 2].map((n) => ({
        id: `plt_extra_${n}`,
        organisation_id: SMALL_WORKS.organisationId,
        slug: `extra-${n}`,
        name: `Extra ${n}`,
        source_summary: '',
        time_zone: 'Europe/London',
        design_flow_ml_per_d: 1,
        position: n,
      })),
    );
    await admin('memberships')
      .where({ person_id: SMALL_WORKS.personId })
      .update({ all_plants: false });
    await admin('membership_plants').insert({
      organisation_id: SMALL_WORKS.organisationId,
      person_id: SMALL_WORKS.personId,
      plant_id: 'plt_extra_1',
    });
    const actor = await enter(await sessionOf(SMALL_WORKS.personId), 'small', 'plant.read');
    expect(actor.plantIds).toEqual(['plt_extra_1']);
    expect((await readPlants(actor)).map(({ id }) => id)).toEqual(['plt_extra_1']);
    await admin('membership_plants').where({ person_id: SMALL_WORKS.personId }).delete();
    const shut = await enter(await sessionOf(SMALL_WORKS.personId), 'small', 'plant.read');
    expect(await readPlants(shut)).toEqual([]);
  });
});

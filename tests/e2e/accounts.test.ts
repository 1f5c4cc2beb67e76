import type { Browser, Page } from 'playwright-core';
import { generate } from 'otplib';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { launchBrowser, openPage } from '../support/browser';
import { letterTo } from '../support/kept-letters';

const baseUrl = inject('baseUrl');
const outbox = inject('outbox');
const OWNER = { email: 'first@weirside.example', password: 'nine white stones' };
const MEMBER = { email: 'second@weirside.example', password: 'ten black stones' };
let browser: Browser;

beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const linkIn = (text: string): string => /https?:\/\/\S+#\S+/.exec(text)?.[0] ?? '';

async function signIn(page: Page, { email, password }: typeof OWNER): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

describe('people of a new utility, in the browser', () => {
  it('sign up, confirm, invite, join, use a second factor, forget a password, and sign out everywhere', async () => {
    const first = await openPage(browser, baseUrl);
    const { page } = first;

    // Sign up: problems stand at their fields, what was typed stays.
    await page.goto('/sign-up');
    await page.getByLabel('Utility or firm').fill('Weirside Water');
    await page.getByLabel('Your name').fill('Ada Weir');
    await page.getByLabel('E-mail').fill(OWNER.email);
    await page.getByLabel('Password').fill('short');
    await page.getByRole('button', { name: 'Open the account' }).click();
    await page.getByText('Use at least 12 characters').waitFor();
    expect(await page.getByLabel('Utility or firm').inputValue()).toBe('Weirside Water');
    await page.getByLabel('Password').fill(OWNER.password);
    await page.getByRole('button', { name: 'Open the account' }).click();
    await page.getByText(`We wrote to ${OWNER.email}`).waitFor();

    // Not yet: the address is unconfirmed, and only who knows the password learns so.
    await signIn(page, OWNER);
    await page.getByText('Confirm your address first').waitFor();

    // The letter, as the outbox page shows it, and its link.
    await page.goto('/outbox');
    await page
      .getByRole('heading', { name: 'Confirm your address for Marlwick' })
      .first()
      .waitFor();
    const confirm = linkIn((await letterTo(outbox, OWNER.email, /Confirm/)).text);
    await page.goto(confirm);
    await page.getByRole('button', { name: 'Confirm this address' }).click();
    await page.getByText('Your account is open').waitFor();
    await signIn(page, OWNER);
    await page.getByRole('heading', { name: 'No works yet' }).waitFor();

    // Invite someone, who joins from another browser.
    await page.getByRole('link', { name: 'People' }).click();
    await page.getByLabel('E-mail').fill(MEMBER.email);
    await page.getByLabel('Role').selectOption('manager');
    await page.getByRole('button', { name: 'Send the invitation' }).click();
    await page.getByText(`A letter went to ${MEMBER.email}`).waitFor();
    await page.getByText('by Ada Weir, until').waitFor();
    const invitation = linkIn((await letterTo(outbox, MEMBER.email, /invites/)).text);
    const second = await openPage(browser, baseUrl);
    await second.page.goto(invitation);
    await second.page.getByText('as manager').waitFor();
    await second.page.getByLabel('Your name').fill('Ben Brook');
    await second.page.getByLabel('Password').fill(MEMBER.password);
    await second.page.getByRole('button', { name: 'Join Weirside Water' }).click();
    await second.page.getByText('Joined').waitFor();
    await signIn(second.page, MEMBER);
    await second.page.getByRole('heading', { name: 'No works yet' }).waitFor();

    // A second factor: the key is typed from the page, the codes are shown once, the next sign-in asks.
    await second.page.getByRole('link', { name: 'Ben Brook' }).click();
    const factor = second.page.getByRole('region', { name: 'Second factor' });
    await factor.getByLabel('Password').fill(MEMBER.password);
    await factor.getByRole('button', { name: 'Set it up' }).click();
    const secret = await factor.getByText(/^[A-Z2-7]{32}$/).innerText();
    await factor.getByLabel('Six figures').fill(await generate({ secret }));
    await factor.getByRole('button', { name: 'Turn it on' }).click();
    await factor.getByText('Keep these codes').waitFor();
    const [recovery = ''] = await factor.getByRole('listitem').allInnerTexts();
    await factor.getByRole('button', { name: 'I have kept them' }).click();
    await factor.getByText('10 of 10 recovery codes').waitFor();
    await second.page.getByRole('button', { name: 'Sign out', exact: true }).click();
    await second.page.waitForURL(/sign-in/);
    await signIn(second.page, MEMBER);
    await second.page.getByLabel('Code').fill(recovery);
    await second.page.getByRole('button', { name: 'Sign in' }).click();
    await second.page.getByRole('heading', { name: 'No works yet' }).waitFor();

    // A forgotten password; the first browser is signed out by it.
    const third = await openPage(browser, baseUrl);
    await third.page.goto('/sign-in');
    await third.page.getByRole('link', { name: 'Forgotten password' }).click();
    await third.page.getByRole('heading', { name: 'Forgotten password' }).waitFor();
    await third.page.getByLabel('E-mail').fill(OWNER.email);
    await third.page.getByRole('button', { name: 'Send the link' }).click();
    await third.page.getByText('Look into your mail').waitFor();
    await third.page.goto(linkIn((await letterTo(outbox, OWNER.email, /new password/)).text));
    await third.page.getByLabel('New password').fill('eleven red stones');
    await third.page.getByRole('button', { name: 'Keep this password' }).click();
    await third.page.getByText('Every session of this account was ended').waitFor();
    await page.goto('/weirside-water/people');
    await page.waitForURL(/sign-in/);
    await signIn(page, { ...OWNER, password: 'eleven red stones' });
    await page.getByRole('heading', { name: 'No works yet' }).waitFor();

    // The owner signs the manager out everywhere, then removes them: out at the next click.
    await page.getByRole('link', { name: 'People' }).click();
    await page.getByRole('button', { name: 'Change Ben Brook' }).click();
    await page.getByRole('button', { name: 'Sign Ben Brook out everywhere' }).click();
    await page
      .getByRole('button', { name: 'Sign Ben Brook out everywhere' })
      .waitFor({ state: 'detached' });
    await second.page.goto('/weirside-water');
    await second.page.waitForURL(/sign-in/);
    await page.getByRole('button', { name: 'Remove Ben Brook' }).click();
    await page.getByRole('button', { name: 'Remove Ben Brook', exact: true }).last().click();
    await page.getByText(MEMBER.email).waitFor({ state: 'detached' });

    // All of it stands in the audit trail, filtered and exported.
    await page.getByRole('link', { name: 'Audit' }).click();
    for (const words of [
      'Organisation opened',
      'Person invited',
      'Person joined',
      'Person removed',
    ]) {
      await page.getByRole('listitem').filter({ hasText: words }).first().waitFor();
    }
    await page.getByLabel('Kind of change').selectOption('member.joined');
    await page.getByRole('button', { name: 'Filter' }).click();
    await page.getByText('1 pass this filter').waitFor();
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('link', { name: 'Export as CSV' }).click(),
    ]);
    expect(download.suggestedFilename()).toBe('audit.csv');

    // 401 is next-auth's answer to a refused sign-in; nothing else went wrong in any of the three browsers.
    for (const each of [first, second, third]) {
      const odd = each.complaints.filter(
        (line) =>
          !line.includes('/api/auth/callback/credentials') && !line.includes('status of 401'),
      );
      expect(odd).toEqual([]);
      await each.close();
    }
  });
});

describe('a token', () => {
  it('is made on its page, shown once, and opens what it was given until it is revoked', async () => {
    const { page, complaints, close } = await openPage(browser, baseUrl);
    const manager = inject('signIns').find(({ role }) => role === 'manager');
    if (manager === undefined) throw new Error('No manager.');
    await signIn(page, manager);
    await page.waitForURL(/\/plants\//);
    await page.getByRole('link', { name: 'Tokens' }).click();
    await page.getByLabel('Name').fill('Level logger');
    await page.getByRole('button', { name: 'Make the token' }).click();
    const token = await page.getByText(/^mwk_[a-z0-9]{6}_[\w-]{43}$/).innerText();
    const ask = () =>
      fetch(`${baseUrl}/api/v1/calverdine/plants`, {
        headers: { authorization: `Bearer ${token}` },
      }).then(({ status }) => status);
    expect(await ask()).toBe(200);
    await page.getByRole('button', { name: 'Revoke Level logger' }).click();
    await page
      .getByText(/^revoked /)
      .first()
      .waitFor();
    expect(await ask()).toBe(401);
    await page.reload();
    expect(await page.getByText(token).count()).toBe(0);
    expect(complaints).toEqual([]);
    await close();
  });
});

describe('a target', () => {
  it('is changed with a reason by a consultant; who comes second is told what stands now', async () => {
    const consultant = inject('signIns').find(({ role }) => role === 'consultant');
    if (consultant === undefined) throw new Error('No consultant.');
    const pages = await Promise.all([openPage(browser, baseUrl), openPage(browser, baseUrl)]);
    for (const { page } of pages) {
      await signIn(page, consultant);
      await page.waitForURL(/\/plants\//);
      await page.goto('/calverdine/plants/sallow-wells/targets');
      await page.getByRole('button', { name: 'Change pH' }).first().click();
    }
    const keep = async (page: Page, bound: 'Lowest' | 'Highest') => {
      await page.getByLabel('Preferred').fill(await page.getByLabel(bound).inputValue());
      await page.getByLabel('Why it changes').fill('A trial of the week');
      await page.getByRole('button', { name: 'Keep the change' }).click();
    };
    const [first, second] = pages;
    await keep(first.page, 'Lowest');
    await first.page
      .getByRole('button', { name: 'Keep the change' })
      .waitFor({ state: 'detached' });
    await keep(second.page, 'Highest');
    await second.page.getByText('Someone else changed this target meanwhile').waitFor();
    expect(await second.page.getByLabel('Why it changes').inputValue()).toBe('A trial of the week');
    for (const { complaints, close } of pages) {
      expect(complaints).toEqual([]);
      await close();
    }
  });
});

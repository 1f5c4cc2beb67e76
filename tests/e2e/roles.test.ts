import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { launchBrowser, openPage } from '../support/browser';
import { signIn, signInOf } from '../support/sign-in';

const baseUrl = inject('baseUrl');
const signIns = inject('signIns');
let browser: Browser;

beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const PLANT = '/calverdine/plants/quarrel-hill';

describe('a role sees what it may do, and no more', () => {
  it.each([
    { role: 'operator', samples: true, audit: false },
    { role: 'consultant', samples: false, audit: false },
    { role: 'manager', samples: true, audit: true },
    { role: 'owner', samples: true, audit: true },
  ])('$role: enters samples $samples, reads the audit $audit', async ({ role, samples, audit }) => {
    const { page, close } = await openPage(browser, baseUrl);
    await signIn(page, signInOf(signIns, role));
    await page.goto(PLANT);
    await page.getByRole('heading', { level: 1, name: 'Quarrel Hill' }).waitFor();
    await page.getByRole('list', { name: /line of water/ }).waitFor();
    expect(await page.getByRole('link', { name: 'Enter a sample' }).count()).toBe(samples ? 1 : 0);
    expect(await page.getByRole('link', { name: 'Audit' }).count()).toBe(audit ? 1 : 0);
    // A page that streams has sent its status before it knows; what it shows is what counts.
    const isThere = async (path: string) => {
      await page.goto(path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      return (await page.getByRole('heading', { name: 'There is no such page' }).count()) === 0;
    };
    expect(await isThere(`${PLANT}/samples/new?point=raw`)).toBe(samples);
    expect(await isThere('/calverdine/audit')).toBe(audit);
    expect(await isThere('/somebody-else')).toBe(false);
    await close();
  });
});

import AxeBuilder from '@axe-core/playwright';
import type { Browser, Cookie } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { launchBrowser, openPage } from '../support/browser';
import { signIn, signInOf } from '../support/sign-in';

const baseUrl = inject('baseUrl');
const owner = signInOf(inject('signIns'), 'owner');
let browser: Browser;
let session: Cookie[];

beforeAll(async () => {
  browser = await launchBrowser();
  const { page, close } = await openPage(browser, baseUrl);
  await signIn(page, owner);
  session = await page.context().cookies();
  await close();
});
afterAll(() => browser.close());

const PLANT = '/calverdine/plants/quarrel-hill';
const PAGES = [
  PLANT,
  `${PLANT}/samples`,
  `${PLANT}/samples/new?point=raw`,
  `${PLANT}/plans`,
  `${PLANT}/targets`,
  `${PLANT}/trends`,
  '/calverdine/people',
  '/calverdine/tokens',
  '/calverdine/audit',
  '/account',
  '/api-guide',
  '/outbox',
  '/sign-up',
  '/forgotten-password',
  '/invitation',
] as const;

describe.each([
  { colorScheme: 'light', width: 1280 },
  { colorScheme: 'dark', width: 1280 },
  { colorScheme: 'light', width: 320 },
] as const)('in $colorScheme at $width px', ({ colorScheme, width }) => {
  it.each(PAGES)('%s has no accessibility violation and no sideways scroll', async (path) => {
    const { page, close } = await openPage(browser, baseUrl, {
      colorScheme,
      viewport: { width, height: 900 },
    });
    await page.context().addCookies(session);
    await page.goto(path);
    await page.waitForLoadState('networkidle');
    // WCAG 2.2 A and AA, by axe's own tags.
    const { violations } = await new AxeBuilder({ page })
      .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
      .analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html ?? ''}`)).toEqual([]);
    const overflow = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    expect(overflow).toBe(0);
    await close();
  });
});

import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { launchBrowser, openPage } from '../support/browser';
import { signIn, signInOf } from '../support/sign-in';

const baseUrl = inject('baseUrl');
const operator = signInOf(inject('signIns'), 'operator');
let browser: Browser;

beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe('how sure a sample is', () => {
  it('draws its band in a worker while the page goes on, stops when asked, and draws again', async () => {
    const { page, complaints, close } = await openPage(browser, baseUrl);
    await signIn(page, operator);
    // The finished water is analysed in full, whatever other tests have entered of the raw.
    await page.goto('/calverdine/plants/quarrel-hill/samples?point=finished');
    await page.getByRole('table').waitFor();
    await page.locator('a[href*="/samples/smp_"]').first().click();
    await page.getByRole('heading', { name: 'How sure is this?' }).waitFor();
    // Frames are counted meanwhile: a page that waited for the engine would paint none.
    await page.evaluate(() => {
      const count = (): void => {
        const holder = window as unknown as { framesPainted?: number };
        holder.framesPainted = (holder.framesPainted ?? 0) + 1;
        requestAnimationFrame(count);
      };
      requestAnimationFrame(count);
    });
    await page.getByRole('button', { name: 'Draw the band' }).click();
    await page.getByText('In nine of ten draws').waitFor();
    const frames = await page.evaluate(
      () => (window as unknown as { framesPainted?: number }).framesPainted ?? 0,
    );
    expect(frames).toBeGreaterThan(2);
    const row = page.getByRole('row', { name: /^Calcite saturation index/ });
    const [low, middle, high] = (await row.getByRole('cell').allTextContents()).map((text) =>
      Number(text.replace('\u2212', '-')),
    );
    expect(low).toBeLessThan(middle ?? NaN);
    expect(middle).toBeLessThan(high ?? NaN);

    await page.getByRole('button', { name: 'Draw again' }).click();
    await page.getByRole('button', { name: 'Stop' }).click();
    await page.getByRole('button', { name: 'Draw the band' }).waitFor();
    await page.waitForTimeout(1500);
    expect(await page.getByText('In nine of ten draws').count()).toBe(0);
    expect(complaints).toEqual([]);
    await close();
  });
});

import pg from 'pg';
import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { launchBrowser, openPage } from '../support/browser';
import { signIn, signInOf } from '../support/sign-in';

const baseUrl = inject('baseUrl');
const operator = signInOf(inject('signIns'), 'operator');
const admin = new pg.Client({ connectionString: inject('adminUrl') });
let browser: Browser;

beforeAll(async () => {
  browser = await launchBrowser();
  await admin.connect();
});
afterAll(async () => {
  await browser.close();
  await admin.end();
});

const countSamples = async (): Promise<number> => {
  const { rows } = await admin.query<{ n: number }>('select count(*)::int as n from samples');
  return rows[0]?.n ?? -1;
};

const field = (page: Page, label: RegExp): Locator => page.getByRole('textbox', { name: label });

const RAW: readonly (readonly [RegExp, string])[] = [
  [/^Temperature/, '6.4'],
  [/^pH/, '6.62'],
  [/^Total alkalinity/, '11'],
  [/^Calcium/, '3.1'],
  [/^Magnesium/, '0.9'],
  [/^Sodium/, '4.2'],
  [/^Chloride/, '6.1'],
  [/^Sulfate/, '3.0'],
];

describe('the operator of Quarrel Hill', () => {
  it('goes from sign-in over a sample and a plan to the trend, and the browser never complains', async () => {
    const { page, complaints, close } = await openPage(browser, baseUrl);
    await signIn(page, operator);

    // Today
    await expectHeading(page, 'Quarrel Hill');
    await page.getByRole('list', { name: /line of water/ }).waitFor();
    await page.getByRole('link', { name: 'Enter a sample' }).click();

    // The sheet of the raw water, typed downwards with Enter
    await expectHeading(page, 'Enter a sample');
    await page.getByRole('link', { name: 'Raw', exact: false }).first().click();
    for (const [label, text] of RAW) await field(page, label).fill(text);
    const findings = page.getByRole('complementary', { name: 'What this water says' });
    await findings.getByText('Calcite saturation index').waitFor();
    const typedIndex = await figureBeside(findings, 'Calcite saturation index');
    expect(typedIndex).toMatch(/^\u2212[2-5]\.\d\d$/);
    const before = await countSamples();
    await page.getByRole('button', { name: 'Save the sample' }).click();

    // The kept sample says the same as the preview
    await page.waitForURL(/\/samples\/smp_/);
    expect(await countSamples()).toBe(before + 1);
    expect(await page.getByRole('cell', { name: '6.62', exact: true }).count()).toBe(1);
    const kept = page.getByRole('region', { name: 'What this water says' });
    expect(await figureBeside(kept, 'Calcite saturation index')).toBe(typedIndex);

    // A plan from it: caustic soda to pH 8.20
    await page.getByRole('link', { name: 'Plan a dose from this water' }).click();
    await expectHeading(page, 'Plan a dose');
    await page.getByLabel('Feed', { exact: true }).selectOption('sodium-hydroxide');
    await page.getByLabel('To reach').selectOption('pH');
    await field(page, /^Target/).fill('8.2');
    await page.getByText('Suggested dose').waitFor();
    const ledger = page.getByRole('region', { name: 'Ledger of quantities' });
    expect(await ledgerRow(ledger, 'pH')).toEqual(['6.62', '+1.58', '8.20']);
    await field(page, /^Why this dose/).fill('raw water is soft and sour after rain');
    await page.getByRole('button', { name: 'Save as a plan' }).click();

    // The kept plan shows the same ledger and its cautions
    await page.waitForURL(/\/plans\/pln_/);
    expect(
      await ledgerRow(page.getByRole('region', { name: 'Ledger of quantities' }), 'pH'),
    ).toEqual(['6.62', '+1.58', '8.20']);
    await page
      .getByRole('region', { name: 'Cautions' })
      .getByText(/jar test/)
      .waitFor();

    // The sample over time
    await page.getByRole('link', { name: /^Raw/ }).click();
    await page.getByRole('link', { name: 'See it over time' }).click();
    await page.waitForURL(/\/trends/);
    await page.locator('canvas').first().waitFor();
    expect(complaints).toEqual([]);
    await close();
  });

  it('gets a sentence at each wrong field, keeps what was typed, and nothing is saved', async () => {
    const { page, close } = await openPage(browser, baseUrl);
    await signIn(page, operator);
    await page.goto('/calverdine/plants/quarrel-hill/samples/new?point=raw');
    const wrong: readonly (readonly [RegExp, string, RegExp])[] = [
      [/^Temperature/, '-3', /lies between 0 and 45/],
      [/^pH/, '71', /Is it 7\.1\?/],
      [/^Total alkalinity/, '12,5', /point for decimals here: 12\.5/],
      [/^Calcium/, '-', /no figures yet/],
    ];
    for (const [label, text] of wrong) await field(page, label).fill(text);
    const before = await countSamples();
    await page.getByRole('button', { name: 'Save the sample' }).click();
    const summary = page.getByRole('alert').filter({ hasText: 'Nothing was saved' });
    await summary.waitFor();
    expect(await summary.evaluate((element) => element === document.activeElement)).toBe(true);
    for (const [label, text, sentence] of wrong) {
      const input = field(page, label);
      expect(await input.inputValue()).toBe(text);
      expect(await input.getAttribute('aria-invalid')).toBe('true');
      const describedBy = (await input.getAttribute('aria-describedby')) ?? '';
      const told = await Promise.all(
        describedBy.split(' ').map((id) => page.locator(`[id="${id}"]`).textContent()),
      );
      expect(told.join(' ')).toMatch(sentence);
    }
    expect(page.url()).toMatch(/samples\/new/);
    expect(await countSamples()).toBe(before);
    await close();
  });

  it('reads why a target cannot be met instead of a dose', async () => {
    const { page, close } = await openPage(browser, baseUrl);
    await signIn(page, operator);
    await page.goto('/calverdine/plants/quarrel-hill/samples?point=raw');
    await page.getByRole('row').nth(1).getByRole('link').first().click();
    await page.getByRole('link', { name: 'Plan a dose from this water' }).click();
    await page.getByLabel('Feed', { exact: true }).selectOption('carbon-dioxide');
    await page.getByLabel('To reach').selectOption('pH');
    await field(page, /^Target/).fill('9');
    await page.getByText('This target cannot be met').waitFor();
    expect(await page.getByRole('button', { name: 'Save as a plan' }).count()).toBe(1);
    await page.getByRole('button', { name: 'Save as a plan' }).click();
    await page.getByText('Not saved').waitFor();
    await close();
  });

  it('saves from the keyboard alone: Enter goes down the sheet, Ctrl and Enter saves', async () => {
    const { page, close } = await openPage(browser, baseUrl);
    await signIn(page, operator);
    await page.goto('/calverdine/plants/quarrel-hill/samples/new?point=raw');
    await field(page, /^Temperature/).focus();
    for (const text of ['6.1', '6.70', '12']) {
      await page.keyboard.type(text);
      await page.keyboard.press('Enter');
    }
    expect(await field(page, /^Total alkalinity/).inputValue()).toBe('12');
    await page.keyboard.press('Control+Enter');
    await page.waitForURL(/\/samples\/smp_/);
    expect(await page.getByRole('cell', { name: '6.70', exact: true }).count()).toBe(1);
    await close();
  });
});

const expectHeading = (page: Page, name: string): Promise<void> =>
  page.getByRole('heading', { level: 1, name }).waitFor();

/** The figure of one index in a list of them. */
async function figureBeside(within: Locator, label: string): Promise<string> {
  const row = within.locator('dl > div').filter({ hasText: label }).first();
  return (await row.locator('dd').textContent())?.trim() ?? '';
}

async function ledgerRow(within: Locator, label: string): Promise<string[]> {
  const row = within
    .getByRole('row')
    .filter({ has: within.page().getByRole('rowheader', { name: label, exact: true }) });
  return row.getByRole('cell').allTextContents();
}

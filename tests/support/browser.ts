import { chromium, type Browser, type BrowserContextOptions, type Page } from 'playwright-core';
import { CHROMIUM } from '@/docker-free-scripts/setup/chromium.mjs';

/** Debian's Chromium, kept from asking anything of the outside. */
export const launchBrowser = (): Promise<Browser> =>
  chromium.launch({
    executablePath: CHROMIUM,
    args: [
      '--headless',
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });

export interface WatchedPage {
  page: Page;
  /** Console errors and warnings, page errors, and requests that would have left the machine. */
  complaints: string[];
  close: () => Promise<void>;
}

/** A page in a context of its own that writes down everything it should not have done. */
export async function openPage(
  browser: Browser,
  baseUrl: string,
  options: BrowserContextOptions = {},
): Promise<WatchedPage> {
  const context = await browser.newContext({ baseURL: baseUrl, locale: 'en-GB', ...options });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error' || message.type() === 'warning') {
      complaints.push(`console ${message.type()}: ${message.text()}`);
    }
  });
  // The console says that something was not found, not what.
  page.on('response', (response) => {
    if (response.status() >= 400) complaints.push(`${response.status()} ${response.url()}`);
  });
  page.on('pageerror', (error) => complaints.push(`page error: ${error.message}`));
  page.on('request', (request) => {
    const url = new URL(request.url());
    if (url.protocol.startsWith('http') && url.origin !== new URL(baseUrl).origin) {
      complaints.push(`request to ${url.origin}`);
    }
  });
  return { page, complaints, close: () => context.close() };
}

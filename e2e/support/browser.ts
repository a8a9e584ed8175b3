import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';

/** As root in a closed network: no sandbox, and no calls home that would be refused one by one. */
const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export function launch(): Promise<Browser> {
  return chromium.launch({ executablePath: process.env['CHROME_BIN'] ?? '/usr/bin/chromium', args: FLAGS });
}

export interface Visit {
  readonly context: BrowserContext;
  readonly page: Page;
  /** What the page complained of: errors on its console, exceptions, requests that left the machine. */
  readonly complaints: string[];
}

/** A fresh visitor: no cookies, nothing stored, everything the page complains of kept. */
export async function visit(
  browser: Browser,
  address: string,
  options: Parameters<Browser['newContext']>[0] = {},
): Promise<Visit> {
  const context = await browser.newContext({ baseURL: address, locale: 'en-GB', timezoneId: 'UTC', ...options });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(`exception: ${error.message}`));
  page.on('console', (message) => {
    // A refused request is the server's answer, which each journey checks on the page itself.
    if (message.type() === 'error' && !/Failed to load resource/.test(message.text()))
      complaints.push(`console: ${message.text()}`);
  });
  page.on('request', (request) => {
    const { protocol, host } = new URL(request.url());
    const own = host === new URL(address).host || protocol === 'data:' || protocol === 'blob:';
    if (!own) complaints.push(`request left the machine: ${request.url()}`);
  });
  return { context, page, complaints };
}

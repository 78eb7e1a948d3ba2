import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { chromium, type Browser, type Page } from 'playwright-core';

export const SIZES = {
  phone: { width: 390, height: 844 },
  wide: { width: 1440, height: 900 },
} as const;
export type Size = keyof typeof SIZES;

const FAILURES = path.resolve(__dirname, '../../.data-test/failures');

export const productUrl = () => process.env.SPATE_E2E_URL!;

/** Debian's Chromium, with nothing that reaches for the network. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
      '--no-first-run',
      '--disable-quic',
    ],
  });
}

interface Visit {
  page: Page;
  /** Whatever the page threw. */
  errors: string[];
}

/**
 * A fresh person at a screen of that size. Where the visit fails, what stood on the screen is kept as a picture under
 * `.data-test/failures`, with what the page said.
 */
export async function visit(
  browser: Browser,
  size: Size,
  name: string,
  walk: (visit: Visit) => Promise<void>,
): Promise<void> {
  const context = await browser.newContext({
    viewport: SIZES[size],
    acceptDownloads: true,
    hasTouch: size === 'phone',
    baseURL: productUrl(),
  });
  const page = await context.newPage();
  page.setDefaultTimeout(60_000);
  const errors: string[] = [];
  const said: string[] = [];
  page.on('pageerror', (error) => errors.push(String(error)));
  page.on('console', (message) => said.push(`${message.type()}: ${message.text()}`));
  page.on('requestfailed', (request) => said.push(`failed: ${request.url()}`));
  try {
    await walk({ page, errors });
    if (errors.length) throw new Error(`The page threw:\n${errors.join('\n')}`);
  } catch (error) {
    mkdirSync(FAILURES, { recursive: true });
    const file = path.join(FAILURES, `${name}-${size}`.replaceAll(/\W+/g, '-'));
    await page.screenshot({ path: `${file}.png` }).catch(() => undefined);
    writeFileSync(`${file}.txt`, [page.url(), ...errors, ...said].join('\n'));
    throw error;
  } finally {
    await context.close();
  }
}

/** Pixels by which the page is wider than its window. */
export const sidewaysOverflow = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

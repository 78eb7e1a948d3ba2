import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';

export const SIZES = {
  phone: { width: 390, height: 844 },
  wide: { width: 1440, height: 900 },
} as const;
export type Size = keyof typeof SIZES;

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

/** A fresh person at a screen of that size; whatever the page throws or logs as an error is kept. */
export async function openPage(
  browser: Browser,
  size: Size,
): Promise<{ context: BrowserContext; page: Page; errors: string[] }> {
  const context = await browser.newContext({
    viewport: SIZES[size],
    acceptDownloads: true,
    hasTouch: size === 'phone',
    baseURL: productUrl(),
  });
  const page = await context.newPage();
  page.setDefaultTimeout(60_000);
  const errors: string[] = [];
  page.on('pageerror', (error) => errors.push(String(error)));
  return { context, page, errors };
}

/** Pixels by which the page is wider than its window. */
export const sidewaysOverflow = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

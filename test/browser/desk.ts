import { type Browser, type BrowserContextOptions, chromium, type Page } from 'playwright-core';
import { browserFlags } from '../tools/browser-flags.mjs';
import { findBrowser } from '../tools/find-browser.mjs';

/** A page of the desk together with everything that went wrong in it. */
export interface Visit {
  readonly page: Page;
  /** Console errors, uncaught exceptions and failed requests, in order. Expect it to be empty. */
  readonly complaints: readonly string[];
  readonly close: () => Promise<void>;
}

/** The browser all visits of one test file share. */
export const openBrowser = (): Promise<Browser> =>
  chromium.launch({
    executablePath: findBrowser(),
    args: browserFlags(),
    chromiumSandbox: process.getuid?.() !== 0,
  });

/** Opens an address in a fresh profile at 1440 × 900 and listens for complaints from the start. */
export async function visit(
  browser: Browser,
  url: string,
  options: BrowserContextOptions = {},
): Promise<Visit> {
  const context = await browser.newContext({
    viewport: { width: 1440, height: 900 },
    reducedMotion: 'reduce',
    ...options,
  });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  page.on('pageerror', (error) => complaints.push(String(error)));
  page.on('requestfailed', (request) => complaints.push(`request failed: ${request.url()}`));
  await page.goto(url);
  return { page, complaints, close: () => context.close() };
}

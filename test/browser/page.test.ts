import { pathToFileURL } from 'node:url';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { openBrowser, visit } from './desk.js';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser?.close());

const addresses = {
  'the served page': () => inject('deskUrl'),
  'the one-file page opened from disk': () => pathToFileURL('dist/offline/index.html').href,
};

describe.each(Object.entries(addresses))('%s', (_name, address) => {
  test('opens with its title and without a complaint', async () => {
    const { page, complaints, close } = await visit(browser, address());
    expect(await page.title()).toContain('Stratabeam');
    expect(await page.getByText('Stratabeam').first().isVisible()).toBe(true);
    expect(complaints).toEqual([]);
    await close();
  });

  test('fetches nothing from another host', async () => {
    const { page, close } = await visit(browser, 'about:blank');
    const hosts = new Set<string>();
    page.on('request', (request) => hosts.add(new URL(request.url()).host));
    await page.goto(address());
    await page.waitForLoadState('networkidle');
    expect([...hosts]).toEqual([new URL(address()).host]);
    await close();
  });
});

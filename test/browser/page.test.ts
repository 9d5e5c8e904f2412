import { pathToFileURL } from 'node:url';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { accessibilityFaults } from './accessibility.js';
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
    await page.getByText('Stratabeam').first().waitFor();
    expect(complaints).toEqual([]);
    await close();
  });

  test('fetches nothing from another host', async () => {
    const { page, close } = await visit(browser, 'about:blank');
    const fetched: URL[] = [];
    page.on('request', (request) => fetched.push(new URL(request.url())));
    await page.goto(address());
    await page.waitForLoadState('networkidle');
    const own = new URL(address()).host;
    const foreign = fetched.filter(({ protocol, host }) => /^http/.test(protocol) && host !== own);
    expect(fetched.length).toBeGreaterThan(0);
    expect(foreign.map(String)).toEqual([]);
    await close();
  });
});

describe('the served page', () => {
  test.each(['light', 'dark'] as const)('has no accessibility fault in %s', async (colorScheme) => {
    const { page, close } = await visit(browser, inject('deskUrl'), { colorScheme });
    await page.waitForLoadState('networkidle');
    expect(await accessibilityFaults(page)).toEqual([]);
    await close();
  });
});

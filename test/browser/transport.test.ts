import type { Browser, CDPSession, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { openBrowser, visit } from './desk.js';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser?.close());

interface Process {
  readonly type: string;
  readonly cpuTime: number;
}

/** Processor seconds that all pages and their workers take while the wall clock passes `wait_ms`. */
async function rendererSeconds(session: CDPSession, page: Page, wait_ms: number): Promise<number> {
  const spent = async () => {
    const { processInfo } = (await session.send('SystemInfo.getProcessInfo')) as {
      processInfo: Process[];
    };
    return processInfo
      .filter(({ type }) => type === 'renderer')
      .reduce((sum, { cpuTime }) => sum + cpuTime, 0);
  };
  const before = await spent();
  await page.waitForTimeout(wait_ms);
  return (await spent()) - before;
}

const section = (page: Page) => page.locator('transport-section');
const runButton = (page: Page) => section(page).getByRole('button', { name: 'Run the check' });
const cancelButton = (page: Page) => section(page).getByRole('button', { name: 'Cancel' });
const photons = (page: Page) => section(page).locator('.setting select').nth(2);

/** The desk with an answer on it. */
async function opened() {
  const visited = await visit(browser, inject('deskUrl'));
  await visited.page.locator('comparison-table table').waitFor();
  return visited;
}

describe('check by transport', () => {
  test('flies a small run in workers and judges every quantity', async () => {
    const { page, complaints, close } = await opened();
    await photons(page).selectOption('100 000');
    await runButton(page).click();
    await section(page).getByText('closes within 0.2 %').waitFor();
    await runButton(page).waitFor();
    const verdicts = await section(page).locator('.verdict').allTextContents();
    expect(verdicts.length).toBeGreaterThan(5);
    for (const verdict of verdicts) expect(verdict).toMatch(/agrees|differs|not yet decided/);
    await section(page)
      .getByText(/^100 000 photons/)
      .waitFor();
    const tables = () => section(page).locator('.tables').textContent();
    const flownFrom = async (seed: string) => {
      await section(page).getByLabel('seed').fill(seed);
      await section(page).getByLabel('seed').press('Enter');
      await runButton(page).click();
    };
    const first = await tables();
    await flownFrom('2');
    await section(page)
      .getByText(/^100 000 photons/)
      .waitFor();
    await expect.poll(tables, { timeout: 20_000 }).not.toBe(first);
    await flownFrom('1');
    await expect.poll(tables, { timeout: 20_000 }).toBe(first);
    expect(complaints).toEqual([]);
    await close();
  });

  test('is cancelled at once and leaves no busy worker', async () => {
    const { page, complaints, close } = await opened();
    const session = await browser.newBrowserCDPSession();
    await photons(page).selectOption('10 000 000');
    await runButton(page).click();
    await section(page).locator('.results').waitFor();
    expect(await rendererSeconds(session, page, 1500)).toBeGreaterThan(0.1);
    // Said in the same turn of the page: cancelling waits for no worker.
    const said = await section(page).evaluate(async (element) => {
      const root = element.shadowRoot as ShadowRoot;
      root.querySelector<HTMLButtonElement>('button.plain')?.click();
      await Promise.all([
        (document.querySelector('desk-page') as unknown as { updateComplete: Promise<unknown> })
          .updateComplete,
        (element as unknown as { updateComplete: Promise<unknown> }).updateComplete,
      ]);
      return root.querySelector('.run')?.textContent ?? '';
    });
    expect(said).toContain('cancelled; incomplete: ');
    // Ten million photons would keep a worker busy for longer than this waits.
    await expect
      .poll(() => rendererSeconds(session, page, 500), { timeout: 12_000 })
      .toBeLessThan(0.05);
    expect(complaints).toEqual([]);
    await close();
  });

  test('answers edits while photons fly', async () => {
    const { page, complaints, close } = await opened();
    await photons(page).selectOption('10 000 000');
    await runButton(page).click();
    await section(page).locator('.results').waitFor();
    // The run is of Current: an edit of Proposed leaves it flying.
    const side = page.locator('beam-path .side.right');
    const kerma = side.locator('[data-station="incident"] figure-value button');
    const before = await kerma.textContent();
    const potential = side.locator('[data-station="potential"] input');
    await potential.fill('84');
    await potential.press('Enter');
    await expect.poll(() => kerma.textContent(), { timeout: 20_000 }).not.toBe(before);
    expect(await cancelButton(page).isVisible()).toBe(true);
    await cancelButton(page).click();
    expect(complaints).toEqual([]);
    await close();
  });

  test('greys what a changed case has left behind, and stops flying it', async () => {
    const { page, close } = await opened();
    await photons(page).selectOption('10 000 000');
    await runButton(page).click();
    await section(page).locator('.results').waitFor();
    const potential = page.locator('beam-path .left input').first();
    await potential.fill('84');
    await potential.press('Enter');
    await section(page)
      .locator('.run')
      .getByText(/the case has changed; incomplete/)
      .waitFor();
    await section(page).locator('.results.stale').waitFor();
    await close();
  });

  test('draws the photons of the run in the stack, and takes them away', async () => {
    const { page, complaints, close } = await opened();
    await photons(page).selectOption('100 000');
    await runButton(page).click();
    await section(page).getByText('closes within 0.2 %').waitFor();
    await section(page)
      .getByLabel(/draw the paths/)
      .check();
    const words = page.locator('stack-view').getByText(/Photon paths of Current: \d+ primary/);
    await page.locator('stack-view summary').click();
    await words.waitFor();
    await section(page)
      .getByLabel(/draw the paths/)
      .uncheck();
    await words.waitFor({ state: 'detached' });
    expect(complaints).toEqual([]);
    await close();
  });

  test('inks absorbed energy once it is asked for', async () => {
    const { page, complaints, close } = await opened();
    await page.locator('stack-view select').selectOption('energy absorbed per depth');
    await page.locator('stack-view summary').click();
    const cells = page.locator('stack-view tbody tr', { hasText: 'soft tissue' }).locator('td');
    await expect.poll(() => cells.last().textContent(), { timeout: 20_000 }).toMatch(/\d/);
    expect(complaints).toEqual([]);
    await close();
  });
});

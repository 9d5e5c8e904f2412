import type { Browser, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, inject, test } from 'vitest';
import { parseCaseText } from '../../physics/case/index.js';
import { brokenCases } from '../physics/case/broken-cases.js';
import { openBrowser, type Visit, visit } from './desk.js';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser?.close());

/** The incident air kerma of one side, as it stands on the page. */
const kerma = (page: Page, side: 'left' | 'right') =>
  page.locator(`beam-path .side.${side} [data-station="incident"] figure-value button`);
const potential = (page: Page, side: 'left' | 'right') =>
  page.locator(`beam-path .side.${side} [data-station="potential"] input`);
const answered = async (page: Page) => {
  await expect.poll(() => kerma(page, 'left').textContent(), { timeout: 20_000 }).toMatch(/\d/);
  await settled(page);
};
/** Waits until no number is greyed. */
const settled = (page: Page) =>
  expect
    .poll(() => page.locator('beam-path figure-value[stale]').count(), { timeout: 20_000 })
    .toBe(0);

/** Drops files on the page, as from a folder. */
const drop = (page: Page, files: readonly { name: string; text: string }[]) =>
  page.evaluate((dropped) => {
    const carried = new DataTransfer();
    for (const { name, text } of dropped) carried.items.add(new File([text], name));
    document.body.dispatchEvent(
      new DragEvent('drop', { dataTransfer: carried, bubbles: true, cancelable: true }),
    );
  }, files);

const withDesk = async (check: (visit: Visit) => Promise<void>) => {
  const opened = await visit(browser, inject('deskUrl'));
  await answered(opened.page);
  await check(opened);
  expect(opened.complaints).toEqual([]);
  await opened.close();
};

/** One page for what leaves the case as it was. */
describe('the desk, looked at', () => {
  let desk: Visit;
  beforeAll(async () => {
    desk = await visit(browser, inject('deskUrl'));
  });
  beforeEach(() => answered(desk.page));
  afterEach(() => expect(desk.complaints).toEqual([]));
  afterAll(() => desk?.close());

  test('opens on a worked example with both techniques computed', async () => {
    const { page } = desk;
    expect(await page.locator('desk-header .title input').inputValue()).not.toBe('');
    expect(await kerma(page, 'right').textContent()).toMatch(/\d/);
  });

  for (const [width, height] of [
    [390, 844],
    [1024, 768],
    [1440, 900],
  ]) {
    test(`nothing makes the page wider than a window of ${width} × ${height}`, async () => {
      const { page } = desk;
      await page.setViewportSize({ width, height });
      await expect
        .poll(() => page.evaluate(() => document.documentElement.scrollWidth))
        .toBe(width);
    });
  }

  test('the curve is read at a potential with the keyboard alone', async () => {
    const { page } = desk;
    const slider = page.locator('curve-panel input[type="range"]');
    await slider.waitFor();
    await slider.focus();
    await page.keyboard.press('ArrowRight');
    await expect.poll(() => page.locator('curve-panel output').textContent()).toMatch(/\d mGy/);
  });

  test('a layer is moved, added and removed with the keyboard alone, focus going along', async () => {
    const { page } = desk;
    const names = () =>
      page
        .locator('patient-section layer-row text-field input')
        .evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).value));
    /** Number of the layer whose row holds the focus. */
    const focused = () =>
      page
        .locator('layer-row')
        .evaluateAll((rows) => rows.findIndex((row) => row.matches(':focus-within')));
    const before = await names();
    await page.locator('layer-row').first().locator('number-field input').first().focus();
    await page.keyboard.press('Alt+ArrowDown');
    await expect.poll(names).toEqual([before[1], before[0], ...before.slice(2)]);
    await expect.poll(focused).toBe(1);
    await page.keyboard.press('Alt+ArrowUp');
    await expect.poll(names).toEqual(before);
    await expect.poll(focused).toBe(0);
    await page.keyboard.press('Alt+Insert');
    await expect.poll(async () => (await names()).length).toBe(before.length + 1);
    await expect.poll(focused).toBe(1);
    await page.keyboard.press('Alt+Delete');
    await expect.poll(names).toEqual(before);
  });

  test('each number says how it is computed, and Escape goes back to it', async () => {
    const { page } = desk;
    await kerma(page, 'right').focus();
    await page.keyboard.press('Enter');
    await page.locator('explain-card').getByText('without backscatter').waitFor();
    await page.keyboard.press('Escape');
    expect(await page.locator('explain-card').isVisible()).toBe(false);
  });
});

/** A fresh page for each. */
describe('the desk, used', () => {
  test('an edit of the potential changes the numbers, undo and redo bring them back', () =>
    withDesk(async ({ page }) => {
      const before = await kerma(page, 'right').textContent();
      const field = potential(page, 'right');
      const kV = await field.inputValue();
      await field.fill(String(Number(kV) + 20));
      await field.press('Enter');
      await expect.poll(() => kerma(page, 'right').textContent()).not.toBe(before);
      await settled(page);
      const after = await kerma(page, 'right').textContent();
      await page.keyboard.press('Control+z');
      await expect.poll(() => field.inputValue()).toBe(kV);
      await expect.poll(() => kerma(page, 'right').textContent()).toBe(before);
      await page.keyboard.press('Control+Shift+z');
      await expect.poll(() => kerma(page, 'right').textContent()).toBe(after);
    }));

  test('a value out of range is shown at its field while the last good result stays', () =>
    withDesk(async ({ page }) => {
      const before = await kerma(page, 'right').textContent();
      await potential(page, 'right').fill('7000');
      await potential(page, 'right').press('Enter');
      await page.locator('beam-path .side.right .fault').waitFor();
      expect(await potential(page, 'right').inputValue()).toBe('7000');
      await settled(page);
      expect(await kerma(page, 'right').textContent()).toBe(before);
    }));

  test('a crash loses nothing: the page comes back with the edit', () =>
    withDesk(async ({ page }) => {
      await potential(page, 'right').fill('64');
      await potential(page, 'right').press('Enter');
      await settled(page);
      await page.waitForTimeout(800);
      await page.reload();
      await answered(page);
      expect(await potential(page, 'right').inputValue()).toBe('64');
    }));

  test('after a reload nothing can be undone into another case', () =>
    withDesk(async ({ page }) => {
      await potential(page, 'right').fill('64');
      await potential(page, 'right').press('Enter');
      await page.reload();
      await answered(page);
      expect(await potential(page, 'right').inputValue()).toBe('64');
      const undo = page.locator('desk-header button', { hasText: 'Undo' });
      expect(await undo.isDisabled()).toBe(true);
      await page.keyboard.press('Control+z');
      expect(await potential(page, 'right').inputValue()).toBe('64');
    }));

  test('every worked example opens and is computed', () =>
    withDesk(async ({ page }) => {
      const select = page.locator('desk-header select').first();
      const names = (await select.locator('option').allTextContents()).slice(1);
      expect(names.length).toBeGreaterThan(1);
      for (const name of names) {
        await select.selectOption(name);
        await expect.poll(() => page.locator('desk-header .title input').inputValue()).toBe(name);
        await answered(page);
        expect(await page.locator('desk-page .trouble').count()).toBe(0);
        expect(await page.locator('fault-list li').count()).toBe(0);
      }
    }));
});

describe('broken files', () => {
  test(
    'each shows its fault by path and rule and leaves the desk working',
    () =>
      withDesk(async ({ page }) => {
        const title = await page.locator('desk-header .title input').inputValue();
        const faults = page.locator('fault-list li');
        for (const { name, text } of brokenCases) {
          const read = parseCaseText(text);
          const [{ path, rule }] = 'faults' in read ? read.faults : [];
          await drop(page, [{ name: 'broken.case.json', text }]);
          const shown = async () => (await faults.allTextContents()).join('\n');
          await expect.poll(shown, { message: name, interval: 20 }).toContain(rule);
          expect(await shown(), name).toContain(path);
        }
        // Some opened with a sound value standing in for the faulty one: undo goes back through them.
        const undo = page.getByRole('button', { name: 'Undo' });
        while (await undo.isEnabled()) await page.keyboard.press('Control+z');
        await page.locator('fault-list button').click();
        expect(await page.locator('desk-header .title input').inputValue()).toBe(title);
        await settled(page);
        expect(await page.locator('desk-page .trouble').count()).toBe(0);
      }),
    240_000,
  );

  test('markup in names is never interpreted', () =>
    withDesk(async ({ page }) => {
      const markup = '<img src="x:" onerror="globalThis.hit = 1">';
      const document = {
        format: 'stratabeam.case',
        version: 1,
        title: markup,
        question: markup,
        room: { name: markup, filters: [{ name: markup, layers: [] }] },
        patient: {
          layers: [{ name: markup, material: 'water', thickness_mm: 200 }],
          sizes: [{ name: markup, thickness_mm: 200 }],
        },
        task: {
          detail: {
            shape: 'vessel',
            inLayer: markup,
            size_mm: 5,
            agent: { name: 'iodine', amount: { value: 20, unit: 'mg element/mL' } },
          },
        },
        techniques: [
          {
            name: markup,
            potential_kV: 80,
            filter: markup,
            control: { detectorAirKerma_uGy: 2.5 },
          },
          {
            name: `${markup} 2`,
            potential_kV: 70,
            filter: markup,
            control: { detectorAirKerma_uGy: 2.5 },
          },
        ],
      };
      await drop(page, [{ name: 'markup.case.json', text: JSON.stringify(document) }]);
      await expect.poll(() => page.locator('desk-header .title input').inputValue()).toBe(markup);
      await answered(page);
      await page.waitForTimeout(1500);
      expect(await page.locator('img').count()).toBe(0);
      expect(await page.evaluate('globalThis.hit')).toBeUndefined();
    }));
});

import type { Page } from 'playwright-core';

/** One picture: where to look, how large, and what to do before it is taken. */
export interface Shot {
  readonly name: string;
  readonly viewport: { readonly width: number; readonly height: number };
  readonly colorScheme: 'light' | 'dark';
  /** Appended to the desk's address, `#…` or `?…`. */
  readonly hash?: string;
  readonly fullPage?: boolean;
  /** Waits or clicks; the page has loaded and its fonts are ready. */
  readonly prepare?: (page: Page) => Promise<void>;
}

const sizes = [
  { width: 1440, height: 900 },
  { width: 1024, height: 768 },
];
const schemes = ['light', 'dark'] as const;

/** Waits for the first answer, the curve and the limits at every size. */
const answered = async (page: Page): Promise<void> => {
  const figure = page.locator(
    'beam-path .side.right [data-station="incident"] figure-value button',
  );
  await figure.filter({ hasText: /\d/ }).waitFor({ timeout: 60_000 });
  await page.locator('curve-panel svg').first().waitFor({ timeout: 60_000 });
  await page.locator('beam-path stack-view canvas').waitFor({ timeout: 60_000 });
  await page.waitForTimeout(4_000);
};

/** The desk as it opens. Add a picture by adding a row to `shots`. */
const opening: readonly Shot[] = sizes.flatMap((viewport) =>
  schemes.map((colorScheme) => ({
    name: `desk-${viewport.width}x${viewport.height}-${colorScheme}`,
    viewport,
    colorScheme,
    prepare: answered,
  })),
);

/** Begins a check by transport of so many photons and brings it into view, with results on it. */
const runCheck = async (page: Page, photons: string): Promise<void> => {
  const section = page.locator('transport-section');
  await section.locator('.setting select').nth(2).selectOption(photons);
  await section.getByRole('button', { name: 'Run the check' }).click();
  await section.locator('.results').waitFor();
  await section.evaluate((element) => element.scrollIntoView({ block: 'start' }));
};

/** The check by transport while photons fly, and when they have. */
const checks: readonly Shot[] = schemes.flatMap((colorScheme) => [
  {
    name: `check-running-${colorScheme}`,
    viewport: sizes[0],
    colorScheme,
    prepare: async (page) => {
      await runCheck(page, '10 000 000');
      await page.waitForTimeout(2000);
    },
  },
  {
    name: `check-done-${colorScheme}`,
    viewport: sizes[0],
    colorScheme,
    prepare: async (page) => {
      await runCheck(page, '1 000 000');
      const section = page.locator('transport-section');
      await section.getByRole('button', { name: 'Run the check' }).waitFor({ timeout: 120_000 });
    },
  },
]);

/** The paths of a check's photons, and where scatter comes from, in the stack. */
const stacks: readonly Shot[] = [
  {
    name: 'stack-paths',
    viewport: sizes[1],
    colorScheme: 'light',
    prepare: async (page) => {
      await runCheck(page, '100 000');
      await page
        .locator('transport-section')
        .getByLabel(/draw the paths/)
        .check();
      await page.evaluate(() => scrollTo(0, 0));
      await page.waitForTimeout(500);
    },
  },
  {
    name: 'stack-absorbed-energy',
    viewport: sizes[0],
    colorScheme: 'light',
    prepare: async (page) => {
      await page.locator('stack-view select').selectOption('energy absorbed per depth');
      await page.waitForTimeout(5000);
    },
  },
];

export const shots: readonly Shot[] = [...opening, ...checks, ...stacks];

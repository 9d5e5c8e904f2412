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

/** The desk as it opens. Add a picture by adding a row to `shots`. */
const opening: readonly Shot[] = sizes.flatMap((viewport) =>
  schemes.map((colorScheme) => ({
    name: `desk-${viewport.width}x${viewport.height}-${colorScheme}`,
    viewport,
    colorScheme,
  })),
);

export const shots: readonly Shot[] = [...opening];

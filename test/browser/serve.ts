import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { preview } from 'vite';
import type { TestProject } from 'vitest/node';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of the built desk, ending in a slash. */
    deskUrl: string;
  }
}

const configFile = fileURLToPath(new URL('../../components/vite.config.ts', import.meta.url));

/** Serves the built desk as `npm start` does; returns its address and how to stop. */
export async function serveDesk(): Promise<{ url: string; close: () => Promise<void> }> {
  const server = await preview({ configFile, logLevel: 'warn', preview: { port: 4300 } });
  const url = server.resolvedUrls?.local[0];
  if (!url) throw new Error('the preview server gave no local address');
  return { url, close: () => server.close() };
}

/**
 * Runs once before the browser tests. It does not build: inside vitest NODE_ENV is `test`, which
 * would give a development build. `npm test` and `npm run test:browser` build beforehand.
 */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  for (const page of ['web', 'offline']) {
    if (!existsSync(fileURLToPath(new URL(`../../dist/${page}/index.html`, import.meta.url)))) {
      throw new Error(`dist/${page}: absent: must be built; run npm run build`);
    }
  }
  const { url, close } = await serveDesk();
  project.provide('deskUrl', url);
  return close;
}

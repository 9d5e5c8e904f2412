import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { build, preview } from 'vite';
import type { TestProject } from 'vitest/node';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of the built desk, ending in a slash. */
    deskUrl: string;
  }
}

const configFile = fileURLToPath(new URL('../../components/vite.config.ts', import.meta.url));
const built = (name: string) =>
  existsSync(fileURLToPath(new URL(`../../dist/${name}/index.html`, import.meta.url)));

/** Builds what is missing (`npm test` has built it already); a stale build is the caller's care. */
export async function buildMissing(): Promise<void> {
  if (!built('web')) await build({ configFile, logLevel: 'warn' });
  if (!built('offline')) await build({ configFile, logLevel: 'warn', mode: 'offline' });
}

/** Serves the built desk as `npm start` does; returns its address and how to stop. */
export async function serveDesk(): Promise<{ url: string; close: () => Promise<void> }> {
  const server = await preview({ configFile, logLevel: 'warn', preview: { port: 4300 } });
  const url = server.resolvedUrls?.local[0];
  if (!url) throw new Error('the preview server gave no local address');
  return { url, close: () => server.close() };
}

export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  await buildMissing();
  const { url, close } = await serveDesk();
  project.provide('deskUrl', url);
  return close;
}

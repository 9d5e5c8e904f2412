import { createRequire } from 'node:module';

/** Stratabeam's own version; found the same way from source, from the build and when installed. */
export const version = (): string => {
  const manifest: { version: string } = createRequire(import.meta.url)('stratabeam/package.json');
  return manifest.version;
};

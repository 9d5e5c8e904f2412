import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { defineConfig, type Plugin } from 'vite';
import { viteSingleFile } from 'vite-plugin-singlefile';

/**
 * The one-file page cannot fetch a worker script, so wherever `NAME.offline.ts` lies beside
 * `NAME.ts` the offline build takes the former: it makes the same thing from inlined code.
 */
const offlineTwins = (): Plugin => ({
  name: 'offline-twins',
  enforce: 'pre',
  async resolveId(source, importer, options) {
    const found = await this.resolve(source, importer, { ...options, skipSelf: true });
    if (!found?.id.endsWith('.ts') || found.id.includes('node_modules')) return found;
    const twin = found.id.replace(/\.ts$/, '.offline.ts');
    return importer !== twin && existsSync(twin) ? { ...found, id: twin } : found;
  },
});

export default defineConfig(({ mode }) => {
  const offline = mode === 'offline';
  return {
    root: fileURLToPath(new URL('.', import.meta.url)),
    base: './',
    publicDir: false,
    cacheDir: fileURLToPath(new URL('../node_modules/.vite/desk', import.meta.url)),
    // A blob module worker fails silently on file://, a classic one runs.
    worker: { format: offline ? 'iife' : 'es' },
    plugins: offline ? [offlineTwins(), viteSingleFile({ removeViteModuleLoader: true })] : [],
    build: {
      outDir: fileURLToPath(new URL(offline ? '../dist/offline' : '../dist/web', import.meta.url)),
      emptyOutDir: true,
      target: 'es2022',
      chunkSizeWarningLimit: 1500,
      reportCompressedSize: false,
    },
  };
});

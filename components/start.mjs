/**
 * `npm start`: builds the desk, serves it on this machine and opens it in the system's browser
 * where there is one. `npm start -- --port 8080 --host --no-open` are understood.
 */
import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';
import { build, preview } from 'vite';

const { values } = parseArgs({
  options: {
    port: { type: 'string', default: '4173' },
    host: { type: 'boolean', default: false },
    'no-open': { type: 'boolean', default: false },
  },
});

const configFile = fileURLToPath(new URL('./vite.config.ts', import.meta.url));

await build({ configFile, logLevel: 'warn' });
const server = await preview({
  configFile,
  logLevel: 'warn',
  preview: { port: Number(values.port), host: values.host },
});

const address = server.resolvedUrls?.local[0] ?? `http://localhost:${values.port}/`;
console.log(`\n  Stratabeam is ready at  ${address}\n  Ctrl+C stops it.\n`);
for (const elsewhere of server.resolvedUrls?.network ?? []) {
  console.log(`  From other machines:    ${elsewhere}`);
}
if (!values['no-open']) openInBrowser(address);

/**
 * Opens an address with what the system provides; without a display or an opener, does nothing.
 * @param {string} url
 */
function openInBrowser(url) {
  const hasDisplay = Boolean(process.env.DISPLAY || process.env.WAYLAND_DISPLAY);
  if (process.platform === 'linux' && !hasDisplay) return;
  const [command, ...args] = {
    darwin: ['open', url],
    win32: ['cmd', '/c', 'start', '', url],
  }[/** @type {string} */ (process.platform)] ?? ['xdg-open', url];
  const opener = spawn(command, args, { stdio: 'ignore', detached: true });
  opener.on('error', () => console.log('  No browser could be opened; open the address yourself.'));
  opener.unref();
}

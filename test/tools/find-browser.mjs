/**
 * Finds the Chromium the tests drive: `CHROME_PATH`, then the usual names on PATH, then the usual
 * places; on Debian as root it installs one. Otherwise it says what to do and ends with exit 1.
 * `node test/tools/find-browser.mjs` prints the path.
 */
import { spawnSync } from 'node:child_process';
import { accessSync, constants, existsSync, statSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const names = [
  'chromium',
  'chromium-browser',
  'google-chrome',
  'google-chrome-stable',
  'chrome',
  'microsoft-edge',
];

const places = [
  '/usr/bin/chromium',
  '/usr/lib/chromium/chromium',
  '/snap/bin/chromium',
  '/opt/google/chrome/chrome',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge',
  'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
  'C:\\Program Files (x86)\\Google\\Chrome\\Application\\chrome.exe',
  'C:\\Program Files (x86)\\Microsoft\\Edge\\Application\\msedge.exe',
];

const advice = `No Chromium was found for the browser tests. Do one of these and try again:
  Debian, Ubuntu   apt-get install chromium   (as root the tests do it themselves on Debian)
  Fedora           dnf install chromium
  macOS, Windows   install Google Chrome or Microsoft Edge
  anywhere         CHROME_PATH=/path/to/chrome npm test`;

/** @param {string} path */
const isExecutable = (path) => {
  try {
    accessSync(path, constants.X_OK);
    return statSync(path).isFile();
  } catch {
    return false;
  }
};

/**
 * Where a browser is already, or undefined.
 * @param {Record<string, string | undefined>} [env]
 * @param {readonly string[]} [fixedPlaces]
 * @returns {string | undefined}
 */
export function presentBrowser(env = process.env, fixedPlaces = places) {
  const onPath = (env.PATH ?? '')
    .split(delimiter)
    .filter(Boolean)
    .flatMap((folder) => names.map((name) => join(folder, name)));
  const candidates = [env.CHROME_PATH ?? '', ...onPath, ...fixedPlaces];
  return candidates.find((path) => path !== '' && isExecutable(path));
}

/** Installs Debian's Chromium; what apt says goes to standard error. */
function installOnDebian() {
  console.error('No Chromium found; installing Debian’s with apt-get …');
  const lock = ['-o', 'DPkg::Lock::Timeout=300'];
  const packages = ['chromium', 'fonts-dejavu-core'];
  for (const args of [
    [...lock, '-q', 'update'],
    [...lock, '-q', 'install', '-y', '--no-install-recommends', ...packages],
  ]) {
    const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    spawnSync('apt-get', args, { env, stdio: ['ignore', 2, 2] });
  }
}

/**
 * The path of a browser to drive; installs one on Debian as root, else ends the process.
 * @returns {string}
 */
export function findBrowser() {
  const chosen = process.env.CHROME_PATH;
  if (chosen && !isExecutable(chosen)) {
    console.error(`CHROME_PATH: ${chosen}: must be an executable file; correct it or unset it`);
    process.exit(1);
  }
  const present = presentBrowser();
  if (present) return present;
  if (process.getuid?.() === 0 && existsSync('/etc/debian_version')) installOnDebian();
  const installed = presentBrowser();
  if (installed) return installed;
  console.error(advice);
  process.exit(1);
}

if (process.argv[1] === fileURLToPath(import.meta.url)) console.log(findBrowser());

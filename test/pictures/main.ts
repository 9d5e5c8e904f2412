/**
 * `npm run pictures`: builds the desk and writes what it looks like, in two sizes and two schemes,
 * to test/pictures/. `npm run pictures -- FILTER` takes only the pictures whose name holds FILTER.
 */
import { statSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';
import { openBrowser, visit } from '../browser/desk.js';
import { serveDesk } from '../browser/serve.js';
import { shots } from './shots.js';

const largest_kB = 500;
const wanted = shots.filter((shot) => shot.name.includes(process.argv[2] ?? ''));
const configFile = fileURLToPath(new URL('../../components/vite.config.ts', import.meta.url));

await build({ configFile, logLevel: 'warn' });
const desk = await serveDesk();
const browser = await openBrowser();
try {
  for (const { name, viewport, colorScheme, hash, fullPage, prepare } of wanted) {
    const { page, complaints, close } = await visit(browser, desk.url + (hash ?? ''), {
      viewport,
      colorScheme,
    });
    await page.waitForLoadState('networkidle');
    await page.evaluate(() => document.fonts.ready);
    await prepare?.(page);
    const path = fileURLToPath(new URL(`./${name}.png`, import.meta.url));
    await page.screenshot({ path, fullPage: fullPage ?? false, animations: 'disabled' });
    await close();

    const size_kB = Math.round(statSync(path).size / 1000);
    console.log(`test/pictures/${name}.png  ${size_kB} kB`);
    for (const complaint of complaints) console.error(`${name}: ${complaint}`);
    if (complaints.length > 0) process.exitCode = 1;
    if (size_kB > largest_kB) {
      console.error(`${name}: ${size_kB} kB: must be below ${largest_kB} kB; crop or simplify it`);
      process.exitCode = 1;
    }
  }
} finally {
  await browser.close();
  await desk.close();
}

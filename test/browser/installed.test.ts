import { execFileSync, spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));
const shell = process.platform === 'win32';

/** What a stranger has after `npm install stratabeam` in an empty folder. */
describe('the packed and installed project', () => {
  const folder = mkdtempSync(join(tmpdir(), 'stratabeam-installed-'));
  const here = join(folder, 'elsewhere');
  const run = (command: string, ...args: string[]) =>
    execFileSync(command, args, { cwd: here, encoding: 'utf8', shell, stdio: 'pipe' });
  let packed: string[] = [];

  beforeAll(() => {
    mkdirSync(here);
    writeFileSync(join(here, 'package.json'), '{ "name": "elsewhere", "type": "module" }');
    const report = execFileSync(
      'npm',
      ['pack', '--ignore-scripts', '--json', '--pack-destination', folder],
      { cwd: root, encoding: 'utf8', shell, stdio: 'pipe' },
    );
    const [pack] = JSON.parse(report) as [{ filename: string; files: { path: string }[] }];
    packed = pack.files.map(({ path }) => path);
    run(
      'npm',
      'install',
      '--prefer-offline',
      '--no-fund',
      '--no-audit',
      join(folder, pack.filename),
    );
  }, 180_000);
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  test('holds the library, the command, the one-file desk and the examples', () => {
    expect(packed).toEqual(
      expect.arrayContaining([
        'LICENSE',
        'README.md',
        'package.json',
        'dist/lib/physics/index.js',
        'dist/lib/physics/index.d.ts',
        'dist/lib/components/command/main.js',
        'dist/offline/index.html',
      ]),
    );
    expect(packed.some((path) => path.startsWith('components/examples/'))).toBe(true);
  });

  test('holds no desk modules, tests, generators, maps or build information', () => {
    const strangers = packed.filter((path) =>
      /components\/desk|lib\/test|generate|\.map$|tsbuildinfo|(?<!\.d)\.ts$/.test(path),
    );
    expect(strangers).toEqual([]);
  });

  test('installs no development package', () => {
    const names = readdirSync(join(here, 'node_modules'));
    expect(names).toContain('stratabeam');
    for (const name of ['vite', 'vitest', 'typescript', 'tsx']) expect(names).not.toContain(name);
  });

  test('every library folder can be imported by its name', () => {
    const { exports } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')) as {
      exports: Record<string, string>;
    };
    const names = Object.keys(exports).filter((name) => !name.includes('*') && !/json$/.test(name));
    const lines = names.map((name) => `await import('stratabeam${name.slice(1)}');`);
    writeFileSync(join(here, 'all.js'), `${lines.join('\n')}\nconsole.log('imported');\n`);
    expect(names.length).toBeGreaterThan(0);
    expect(run(process.execPath, 'all.js').trim()).toBe('imported');
  });

  test('npx stratabeam names the commands that README describes, and no others', () => {
    const help = run('npx', 'stratabeam', '--help');
    const [, named] = help.split('Commands:');
    const commands = [...named.matchAll(/^ {2}([a-z]+) \[options\]/gm)].map(([, name]) => name);
    const readme = readFileSync(join(root, 'README.md'), 'utf8');
    const described = [...readme.matchAll(/^\| `([a-z]+)\b[^|]*` \|/gm)].map(([, name]) => name);
    expect(commands.sort()).toEqual(described.sort());
    expect(commands).toContain('weigh');
  });

  test('npx stratabeam beam computes', () => {
    const through = shell ? '"aluminium 2.5 mm"' : 'aluminium 2.5 mm';
    const words = ['beam', '--potential', '80', '--through', through, '--json'];
    const beam = run('npx', 'stratabeam', ...words);
    const { meanEnergy_keV } = JSON.parse(beam) as { meanEnergy_keV: number };
    expect(meanEnergy_keV).toBeGreaterThan(20);
    expect(meanEnergy_keV).toBeLessThan(80);
  });

  test('npx stratabeam weighs a shipped example', () => {
    const examples = join(here, 'node_modules/stratabeam/components/examples');
    const [name] = readdirSync(examples).filter((file) => file.endsWith('.case.json'));
    const weigh = ['stratabeam', 'weigh', join(examples, name ?? ''), '--json'];
    const { status, stdout } = spawnSync('npx', weigh, { cwd: here, encoding: 'utf8', shell });
    expect([0, 1]).toContain(status);
    const { evaluations } = JSON.parse(stdout) as { evaluations: unknown[] };
    expect(evaluations.length).toBeGreaterThanOrEqual(2);
  });
});

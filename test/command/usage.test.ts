import { describe, expect, it } from 'vitest';
import { cautions } from '../../physics/cautions.js';
import { runCommand } from './run-command.js';

describe('the command line', () => {
  it.each([
    ['--help'],
    ['weigh', '--help'],
    ['beam', '--help'],
    ['matter', '-h'],
    ['checks', '-h'],
  ])('states the cautions under %s %s', async (...words) => {
    const { code, out, err } = await runCommand(words.filter((word) => word !== undefined));
    expect({ code, err }).toEqual({ code: 0, err: '' });
    expect(out).toContain(cautions.join('\n'));
  });

  it('names the worked cases under weigh --help', async () => {
    const { out } = await runCommand(['weigh', '--help']);
    expect(out).toMatch(/Worked cases .* in components\/examples:\n/);
    expect(out).toMatch(/ aortography\.case\.json +Aortography, abdomen\n/);
  });

  it('prints its version', async () => {
    const { code, out } = await runCommand(['--version']);
    expect(code).toBe(0);
    expect(out).toMatch(/^\d+\.\d+\.\d+\n$/);
  });

  it('without a command prints the help as an error', async () => {
    const { code, out, err } = await runCommand([]);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toMatch(/^Usage: stratabeam/);
  });

  it.each([
    [['wiegh'], /^command: "wiegh": must be one of weigh, .*; see --help\n$/],
    [['weigh'], /^CASE: missing: must be given; see --help\n$/],
    [['weigh', 'a.json', 'b.json'], /^arguments: too many: must be those of the command; /],
    [['beam'], /^--potential: missing: must be given with a value; write --potential <kV>\n$/],
    [['beam', '--potential'], /^--potential: missing: must be given with a value; /],
    [
      ['matter', 'Cu', '--colour'],
      /^--colour: given: is not an option of this command; see --help\n$/,
    ],
  ])('refuses %j', async (words, line) => {
    const { code, out, err } = await runCommand(words);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toMatch(line);
    const json = await runCommand([...words, '--json']);
    expect(JSON.parse(json.err).faults).toHaveLength(1);
  });
});

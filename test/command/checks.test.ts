import { describe, expect, it } from 'vitest';
import type { CheckRow } from '../../physics/checks/index.js';
import { jsonOf, runCommand } from './run-command.js';

describe('stratabeam checks', () => {
  it('gives every row with expected, computed, tolerance, verdict, source and provenance', async () => {
    const { code, out } = await runCommand(['checks', '--json']);
    const { rows } = JSON.parse(out) as { rows: readonly Record<string, unknown>[] };
    expect(code).toBe(0);
    expect(rows.length).toBeGreaterThan(1000);
    for (const row of rows) {
      expect(typeof row.expected).toBe('number');
      expect(typeof row.tolerance).toBe('number');
      expect(['met', 'short', 'unconfirmed source']).toContain(row.verdict);
      expect(['computed', 'data carried']).toContain(row.kind);
      expect(row.source).not.toBe('');
      expect(row.provenance).not.toBe('');
    }
  });

  it('shows people a table for each source and the count', async () => {
    const { out } = await runCommand(['checks']);
    expect(out).toMatch(/Hubbell JH, Seltzer SM\..*\(published\)\n\ncheck /);
    expect(out).toMatch(/\n\d+ values computed\n/);
    expect(out).toMatch(/\nall +\d+ +0 +0\n/);
    expect(out).toMatch(/\nall +\d+ +0 +18\n/);
    expect(out).toMatch(/\nNo check fell short\.\n$/);
    const brief = await runCommand(['checks', '--summary']);
    expect(brief.out.length).toBeLessThan(out.length / 5);
  });

  it('counts by provenance, and what is carried apart from what is computed', async () => {
    const { rows } = (await jsonOf(['checks'])) as unknown as { rows: readonly CheckRow[] };
    const { out } = await runCommand(['checks', '--summary']);
    const count = (kind: CheckRow['kind'], provenance: CheckRow['provenance']) =>
      rows.filter((row) => row.kind === kind && row.provenance === provenance).length;
    for (const [provenance, words] of [
      ['published', 'published, text or abstract read'],
      ['recalled', 'published, recalled without the text'],
      ['computed', 'computed separately, not published'],
      ['assumed', 'common practice, no source'],
    ] as const) {
      expect(out).toMatch(
        new RegExp(`\n${words} +computed +${count('computed', provenance)} +0 +0\n`),
      );
    }
    expect(out).toMatch(
      new RegExp(`\n${rows.filter((row) => row.kind === 'data carried').length} values of data`),
    );
  });

  it('lists as CSV', async () => {
    const { out } = await runCommand(['checks', '--csv']);
    expect(out.split('\n')[0]).toBe(
      'id,kind,expected,computed,unit,tolerance,toleranceIs,verdict,source,provenance,note',
    );
  });
});

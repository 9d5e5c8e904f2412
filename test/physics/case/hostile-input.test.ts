import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { caseHash, faultLine, parseCase, parseCaseText } from '../../../physics/case/index.js';
import { type Loose, soundCase, soundText } from './broken-cases.js';

/** Every place of a value: the paths to its leaves and branches. */
const places = (value: Loose, path: (string | number)[] = []): (string | number)[][] =>
  value === null || typeof value !== 'object'
    ? [path]
    : [path, ...Object.keys(value).flatMap((key) => places(value[key], [...path, key]))];

const replaced = (root: Loose, path: readonly (string | number)[], value: unknown): Loose => {
  if (path.length === 0) return value;
  const copy = structuredClone(root);
  const holder = path.slice(0, -1).reduce((inner, key) => inner[key], copy);
  holder[path[path.length - 1]] = value;
  return copy;
};

const everyPlace = places(soundCase());

describe('whatever is handed in', () => {
  it('is either a case with a hash or faults of one line each', () => {
    const check = (result: ReturnType<typeof parseCase>): void => {
      if ('case' in result) {
        expect(caseHash(result.case)).toMatch(/^[0-9a-f]{64}$/);
        return;
      }
      expect(result.faults.length).toBeGreaterThan(0);
      for (const fault of result.faults) expect(faultLine(fault)).not.toMatch(/\n/);
    };
    fc.assert(
      fc.property(
        fc.constantFrom(...everyPlace),
        fc.oneof(
          fc.jsonValue({ maxDepth: 2 }),
          fc.constantFrom(1e308, -1e308, 5e-324, -0, '', '\ud800', '\u0000', {}, [], null),
          fc.string({ unit: 'binary' }),
        ),
        (path, value) => check(parseCase(replaced(soundCase(), path, value))),
      ),
      { seed: 1, numRuns: 500 },
    );
    fc.assert(
      fc.property(fc.jsonValue(), (value) => check(parseCase(value))),
      { seed: 2, numRuns: 300 },
    );
  });

  it('as text is read as JSON.parse reads it, or refused where JSON.parse refuses it', () => {
    const outcome = (read: () => unknown): unknown => {
      try {
        return { value: read() };
      } catch {
        return 'refused';
      }
    };
    fc.assert(
      fc.property(
        fc.nat(soundText.length - 1),
        fc.constantFrom('', ' ', '"', '{', '}', '[', ']', ',', ':', '\\', '0', '-', 'e', '\n', '.'),
        (at, piece) => {
          const text = soundText.slice(0, at) + piece + soundText.slice(at + 1);
          const result = parseCaseText(text);
          if (outcome(() => JSON.parse(text)) === 'refused') {
            expect('faults' in result && result.faults[0].path).toMatch(/^line \d+, column \d+$/);
          } else {
            const syntax = 'faults' in result && /^line/.test(result.faults[0].path);
            // The one thing refused beyond JSON.parse is a key that stands twice.
            if (syntax && 'faults' in result) {
              expect(result.faults[0].rule).toBe('must not stand twice in one object');
            }
          }
        },
      ),
      { seed: 3, numRuns: 500 },
    );
  });
});

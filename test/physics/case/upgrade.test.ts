import { describe, expect, it } from 'vitest';
import { upgraded } from '../../../physics/case/upgrade.js';

const rename = (input: unknown): unknown => {
  const { kVp, ...rest } = input as { kVp: number };
  return { ...rest, version: 2, potential_kV: kVp };
};

describe('an older case', () => {
  it('is brought up step by step', () => {
    const last = (input: unknown) => ({ ...(input as object), version: 3, checked: true });
    expect(upgraded({ version: 1, kVp: 80 }, { 1: rename, 2: last }, 3)).toEqual({
      input: { version: 3, potential_kV: 80, checked: true },
    });
  });
});

describe('a newer case', () => {
  it('is refused with a way out', () => {
    expect(upgraded({ version: 4 }, {}, 3)).toEqual({
      fault: {
        path: 'version',
        value: '4',
        rule: 'must be at most 3',
        remedy: 'open it with the Stratabeam that wrote it, or a newer one',
      },
    });
  });
});

describe('a version that is no number', () => {
  it('is left to the schema', () => {
    for (const version of ['1', null, 1.5, undefined]) {
      expect(upgraded({ version })).toEqual({ input: { version } });
    }
  });
});

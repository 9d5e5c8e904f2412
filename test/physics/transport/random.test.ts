import { describe, expect, it } from 'vitest';
import { nextExponential } from '../../../physics/transport/exponential.js';
import {
  nextBits,
  nextUniform,
  randomStream,
  splitmix32,
} from '../../../physics/transport/random.js';

describe('the random stream', () => {
  it('is xoshiro128** 1.1: checked against the published recurrence in wide integers', () => {
    const stream = randomStream(42, 3);
    const words = [...stream.state].map((word) => BigInt(word >>> 0));
    const mask = 0xffffffffn;
    const rotated = (x: bigint, k: bigint) => ((x << k) | (x >> (32n - k))) & mask;
    for (let i = 0; i < 3000; i++) {
      const [a, b, c, d] = words;
      const expected = (rotated((b * 5n) & mask, 7n) * 9n) & mask;
      expect(BigInt(nextBits(stream) >>> 0)).toBe(expected);
      const c1 = c ^ a;
      const d1 = d ^ b;
      words[0] = a ^ d1;
      words[1] = b ^ c1;
      words[2] = c1 ^ ((b << 9n) & mask);
      words[3] = rotated(d1, 11n);
    }
  });

  it('starts from state 1, 2, 3, 4 with 11520, the first number of the authors’ reference', () => {
    const stream = { ...randomStream(0, 0), state: Int32Array.of(1, 2, 3, 4) };
    expect(nextBits(stream)).toBe(11520);
  });

  it('gives batches of one seed different states, and seeds different batches', () => {
    const words = new Set<number>();
    for (let batch = 0; batch < 500; batch++) {
      for (const word of randomStream(7, batch).state) words.add(word);
    }
    expect(words.size).toBe(2000);
    expect(splitmix32(1, 0)).not.toBe(splitmix32(2, 0));
  });

  it('is uniform: mean ½, variance 1/12, and no bit of the word leans', () => {
    const stream = randomStream(5, 0);
    const count = 200_000;
    let sum = 0;
    let squares = 0;
    const bits = new Int32Array(32);
    for (let i = 0; i < count; i++) {
      const uniform = nextUniform(stream);
      sum += uniform;
      squares += uniform * uniform;
      const word = nextBits(stream);
      for (let bit = 0; bit < 32; bit++) bits[bit] += (word >>> bit) & 1;
    }
    const mean = sum / count;
    expect(Math.abs(mean - 0.5)).toBeLessThan(4 * Math.sqrt(1 / 12 / count));
    expect(Math.abs(squares / count - 1 / 3)).toBeLessThan(4 * Math.sqrt(4 / 45 / count));
    for (const ones of bits) {
      expect(Math.abs(ones - count / 2)).toBeLessThan(5 * Math.sqrt(count / 4));
    }
  });
});

describe('the free path', () => {
  it('is exponential: every decile of e^−x holds a tenth, the tail e^−7.7 included', () => {
    const stream = randomStream(8, 0);
    const count = 400_000;
    const deciles = new Int32Array(10);
    let beyondTail = 0;
    let sum = 0;
    for (let i = 0; i < count; i++) {
      const path = nextExponential(stream);
      sum += path;
      deciles[Math.min(9, Math.floor(10 * -Math.expm1(-path)))]++;
      if (path > 7.7) beyondTail++;
    }
    expect(Math.abs(sum / count - 1)).toBeLessThan(4 / Math.sqrt(count));
    for (const held of deciles) {
      expect(Math.abs(held - count / 10)).toBeLessThan(4.5 * Math.sqrt(count * 0.09));
    }
    const expected = count * Math.exp(-7.7);
    expect(Math.abs(beyondTail - expected)).toBeLessThan(4.5 * Math.sqrt(expected));
  });
});

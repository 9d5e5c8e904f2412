/**
 * xoshiro128** 1.1 (Blackman & Vigna, "Scrambled linear pseudorandom number generators", ACM Trans.
 * Math. Softw. 47 (2021) 36), in 32-bit integer arithmetic. Numbers are made a block at a time with
 * the state in local variables, and handed out from the block.
 */
export interface RandomStream {
  readonly state: Int32Array;
  readonly block: Int32Array;
  /** Next number of the block to hand out. */
  at: number;
}

const blockLength = 1024;

/** The 64-bit golden-ratio increment of splitmix, cut to 32 bits. */
const increment = 0x9e3779b9;

/**
 * Word `index` of the 32-bit splitmix sequence of `seed` (Steele, Lea & Flood, OOPSLA 2014, with the
 * 32-bit MurmurHash3 finaliser): mix(mix(seed) + (index + 1) · 0x9e3779b9).
 */
export function splitmix32(seed: number, index: number): number {
  return mix((mix(seed | 0) + Math.imul(index + 1, increment)) | 0);
}

/**
 * The stream of one batch: its four state words are words 4b to 4b + 3 of the splitmix sequence of
 * `seed`, so no two of the first 2³⁰ batches of a seed share a word. `seed` is taken modulo 2³².
 */
export function randomStream(seed: number, batch: number): RandomStream {
  const state = Int32Array.from({ length: 4 }, (_, word) => splitmix32(seed, 4 * batch + word));
  if (state.every((word) => word === 0)) state[0] = 1;
  return { state, block: new Int32Array(blockLength), at: blockLength };
}

/** The next 32 random bits, as a signed integer. */
export function nextBits(stream: RandomStream): number {
  if (stream.at === blockLength) refill(stream);
  return stream.block[stream.at++];
}

/** A uniform number in the open interval (0, 1). */
export function nextUniform(stream: RandomStream): number {
  return ((nextBits(stream) >>> 0) + 0.5) * 2 ** -32;
}

function refill(stream: RandomStream): void {
  const { state, block } = stream;
  let [a, b, c, d] = state;
  for (let i = 0; i < blockLength; i++) {
    const product = Math.imul(b, 5);
    block[i] = Math.imul((product << 7) | (product >>> 25), 9);
    const shifted = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= shifted;
    d = (d << 11) | (d >>> 21);
  }
  state[0] = a;
  state[1] = b;
  state[2] = c;
  state[3] = d;
  stream.at = 0;
}

function mix(word: number): number {
  let bits = word ^ (word >>> 16);
  bits = Math.imul(bits, 0x85ebca6b);
  bits ^= bits >>> 13;
  bits = Math.imul(bits, 0xc2b2ae35);
  return bits ^ (bits >>> 16);
}

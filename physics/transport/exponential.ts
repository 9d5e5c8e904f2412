import { nextBits, nextUniform, type RandomStream } from './random.js';

/**
 * Ziggurat for e^−x (Marsaglia & Tsang, "The ziggurat method for generating random variables",
 * J. Stat. Softw. 5 (2000) 8): 256 strips of equal area, the tail beyond r. r and v as published.
 */
const tailStart = 7.69711747013105;
const stripArea = 3.949659822581557e-3;
const strips = 256;
const words = 2 ** 32;

const accept = new Float64Array(strips);
const scale = new Float64Array(strips);
const height = new Float64Array(strips);
fillStrips();

/** A free path in mean free paths: an exponentially distributed number of mean 1. */
export function nextExponential(stream: RandomStream): number {
  const bits = nextBits(stream);
  const strip = bits & 255;
  const magnitude = bits >>> 0;
  if (magnitude < accept[strip]) return magnitude * scale[strip];
  return outsideStrip(stream, magnitude);
}

// About one number in a hundred comes here.
function outsideStrip(stream: RandomStream, firstMagnitude: number): number {
  let magnitude = firstMagnitude;
  for (;;) {
    const strip = magnitude % strips;
    if (magnitude < accept[strip]) return magnitude * scale[strip];
    if (strip === 0) return tailStart - Math.log(nextUniform(stream));
    const x = magnitude * scale[strip];
    const y = height[strip] + nextUniform(stream) * (height[strip - 1] - height[strip]);
    if (y < Math.exp(-x)) return x;
    magnitude = nextBits(stream) >>> 0;
  }
}

function fillStrips(): void {
  let x = tailStart;
  const base = stripArea / Math.exp(-x);
  accept[0] = (x / base) * words;
  scale[0] = base / words;
  height[0] = 1;
  scale[strips - 1] = x / words;
  height[strips - 1] = Math.exp(-x);
  accept[1] = 0;
  for (let i = strips - 2; i >= 1; i--) {
    const next = -Math.log(stripArea / x + Math.exp(-x));
    accept[i + 1] = (next / x) * words;
    x = next;
    scale[i] = x / words;
    height[i] = Math.exp(-x);
  }
}

/**
 * Decimals of at most five digits, four characters of base64 each: 7 bits of exponent (offset 64)
 * above 17 bits of mantissa, value = mantissa × 10^exponent. Published tables are decimal, so their
 * values come back digit for digit.
 */
const alphabet = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/';
const sextetOf = Uint8Array.from({ length: 128 }, (_, code) =>
  Math.max(0, alphabet.indexOf(String.fromCharCode(code))),
);
const mantissaBits = 17;
const exponentOffset = 64;

// Powers of ten up to 10^22 are exact in binary64, so one product or quotient rounds correctly.
const powersOfTen = Float64Array.from({ length: 23 }, (_, power) => Number(`1e${power}`));

/** Reads the `count` decimals that start at decimal number `start` of a packed text. */
export function unpackDecimals(packed: string, start: number, count: number): Float64Array {
  const values = new Float64Array(count);
  for (let i = 0, at = 4 * start; i < count; i++, at += 4) {
    const word =
      (sextetOf[packed.charCodeAt(at)] << 18) |
      (sextetOf[packed.charCodeAt(at + 1)] << 12) |
      (sextetOf[packed.charCodeAt(at + 2)] << 6) |
      sextetOf[packed.charCodeAt(at + 3)];
    values[i] = decimal(word & ((1 << mantissaBits) - 1), (word >> mantissaBits) - exponentOffset);
  }
  return values;
}

/** Writes decimals so that `unpackDecimals` returns them, rounded to five digits (5e-6 relative). */
export function packDecimals(values: readonly number[]): string {
  return values.map(packDecimal).join('');
}

function decimal(mantissa: number, exponent: number): number {
  if (exponent < -22 || exponent > 22) return Number(`${mantissa}e${exponent}`);
  return exponent < 0 ? mantissa / powersOfTen[-exponent] : mantissa * powersOfTen[exponent];
}

function packDecimal(value: number): string {
  if (!(value >= 0)) throw new Error(`${value}: only numbers from 0 upward can be packed`);
  const [digits, power] = value.toExponential(4).split('e');
  let mantissa = Number(digits.replace('.', ''));
  let exponent = mantissa === 0 ? 0 : Number(power) - 4;
  while (mantissa > 0 && mantissa % 10 === 0) {
    mantissa /= 10;
    exponent++;
  }
  const word = ((exponent + exponentOffset) << mantissaBits) | mantissa;
  return [18, 12, 6, 0].map((shift) => alphabet[(word >> shift) & 63]).join('');
}

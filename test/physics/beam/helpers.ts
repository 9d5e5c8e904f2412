import { expect } from 'vitest';
import { type Material, namedMaterial } from '../../../materials/index.js';
import { attenuate, type Spectrum, tungstenSpectrum } from '../../../physics/beam/index.js';

export function material(name: string): Material {
  const found = namedMaterial(name);
  if (!found) throw new Error(`${name}: no such material`);
  return found;
}

export const aluminium = material('aluminium');
export const copper = material('copper');

/** A constant-potential tube behind aluminium and copper, output scale 1, 1 m in vacuum. */
export const tubeBeam = (
  potential_kV: number,
  anodeAngle_deg: number,
  aluminium_mm: number,
  copper_mm = 0,
  ripple_percent = 0,
): Spectrum =>
  attenuate(
    tungstenSpectrum({ potential_kV, anodeAngle_deg, ripple_percent, extraEdges_keV: [8.979] }),
    [
      { material: aluminium, thickness_mm: aluminium_mm },
      { material: copper, thickness_mm: copper_mm },
    ],
  );

/** Asserts a relative tolerance and prints both values and the source when it fails. */
export function expectWithin(
  value: number | null,
  expected: number,
  tolerance_percent: number,
  what: string,
): void {
  const off_percent = 100 * ((value ?? Number.NaN) / expected - 1);
  const message = `${what}: computed ${value}, expected ${expected}, off by ${off_percent.toFixed(3)} %`;
  expect(Math.abs(off_percent), message).toBeLessThanOrEqual(tolerance_percent);
}

/** Asserts that a value rounds to what was printed. */
export function expectPrinted(value: number, printed: string, what: string): void {
  const digits = printed
    .replace(/e.*$/i, '')
    .replace(/^-?0*\.?0*/, '')
    .replace('.', '').length;
  expect(Number(value.toPrecision(digits)), `${what}: computed ${value}, printed ${printed}`).toBe(
    Number(printed),
  );
}

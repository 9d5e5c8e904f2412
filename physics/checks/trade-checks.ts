import {
  electronDensity_per_cm3,
  elementByZ,
  massAttenuation,
  partialCoefficients,
} from '../../materials/index.js';
import { findRoot } from '../numeric/find-root.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { numberAfter, type ReferenceRow, referenceRows } from './reference-rows.js';

/** Facts every practitioner knows and no one cites. */
export const tradeChecks = (): CheckRow[] =>
  referenceRows('trade_facts').map((row) => {
    const relative = /^([\d.]+)%$/.exec(row.tolerance)?.[1];
    const tolerance =
      relative === undefined
        ? {
            absolute: Number.parseFloat(row.tolerance) || 0,
            rounding: row.tolerance === 'last digit',
          }
        : { relative: Number(relative) / 100 };
    return checkRow(row, facts[row.set]?.(row) ?? null, tolerance);
  });

const facts: Readonly<Record<string, (row: ReferenceRow) => number>> = {
  gamma: ({ item, conditions, unit }) => {
    const material = materialOf(/of (\w+)/.exec(item)?.[1] ?? '');
    const energy_keV = numberAfter(conditions);
    const linear_per_cm = massAttenuation(material, energy_keV) * material.density_g_per_cm3;
    const depths = item.startsWith('half') ? Math.LN2 : Math.LN10;
    return (depths / linear_per_cm) * (unit === 'mm' ? 10 : 1);
  },
  crossover: ({ item }) => {
    const material = materialOf(/ in (.+)/.exec(item)?.[1] ?? '');
    const excess = (energy_keV: number): number => {
      const partial = partialCoefficients(material, energy_keV);
      return Math.log(partial.incoherent_cm2_per_g / partial.photoelectric_cm2_per_g);
    };
    return findRoot(excess, 10, 150) ?? Number.NaN;
  },
  exponent: ({ conditions }) => photoelectricExponent(numberAfter(conditions)),
  'incoherent per electron': ({ conditions }) => {
    const energy_keV = numberAfter(conditions);
    const carbon = incoherentPerElectron(6, energy_keV);
    const departures = zRange(6, 20).map(
      (z) => 100 * Math.abs(incoherentPerElectron(z, energy_keV) / carbon - 1),
    );
    return Math.max(...departures);
  },
  'pair production': ({ conditions }) =>
    partialCoefficients(materialOf('lead'), numberAfter(conditions)).pair_cm2_per_g,
};

const zRange = (from: number, to: number): number[] =>
  Array.from({ length: to - from + 1 }, (_, i) => from + i);

const element = (z: number) => materialOf(elementByZ(z).name);

/** Slope of ln τ/ρ against ln Z by least squares. */
const photoelectricExponent = (energy_keV: number): number => {
  const points = zRange(6, 29).map((z) => ({
    x: Math.log(z),
    y: Math.log(partialCoefficients(element(z), energy_keV).photoelectric_cm2_per_g),
  }));
  const mean = (pick: (p: { x: number; y: number }) => number): number =>
    points.reduce((sum, point) => sum + pick(point), 0) / points.length;
  const x0 = mean(({ x }) => x);
  const y0 = mean(({ y }) => y);
  const along = mean(({ x, y }) => (x - x0) * (y - y0));
  return along / mean(({ x }) => (x - x0) ** 2);
};

const incoherentPerElectron = (z: number, energy_keV: number): number => {
  const material = element(z);
  const perGram = partialCoefficients(material, energy_keV).incoherent_cm2_per_g;
  return (perGram * material.density_g_per_cm3) / electronDensity_per_cm3(material);
};

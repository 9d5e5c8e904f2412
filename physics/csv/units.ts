import { airKermaPerRoentgen_mGy } from '../../materials/index.js';

/** Units a heading may carry, by the unit the column is kept in, with the factor that converts. */
const factors: Record<string, Record<string, number>> = {
  mm: { um: 1e-3, mm: 1, cm: 10, m: 1000 },
  mmAl: { umAl: 1e-3, mmAl: 1, cmAl: 10, mm: 1, cm: 10 },
  kV: { kV: 1, kVp: 1, kv: 1, KV: 1, kvp: 1, V: 1e-3 },
  mA: { mA: 1, ma: 1, A: 1000 },
  ms: { us: 1e-3, ms: 1, s: 1000, sec: 1000 },
  mAs: { mAs: 1, mas: 1, As: 1000 },
  keV: { eV: 1e-3, keV: 1, kev: 1, MeV: 1000 },
  'uGy/mAs': {
    'nGy/mAs': 1e-3,
    'uGy/mAs': 1,
    'mGy/mAs': 1000,
    'mR/mAs': airKermaPerRoentgen_mGy.value,
  },
  percent: { percent: 1, '%': 1, fraction: 100 },
  '/mm2/keV/mAs': { '/mm2/keV/mAs': 1, '/cm2/keV/mAs': 0.01 },
  '/mm2/mAs': { '/mm2/mAs': 1, '/cm2/mAs': 0.01 },
  number: { number: 1 },
};

/** Spelling of a unit for look-up: `mGy per mAs`, `mGy_per_mAs` and `mGy/mAs` are one. */
const spelling = (unit: string): string =>
  unit
    .trim()
    .replace(/[µμ]/g, 'u')
    .replace(/²/g, '2')
    .replace(/(^|[\s_])per[\s_]/g, '/')
    .replace(/^(photons|1)\//, '/')
    .replace(/[\s_·*]/g, '');

/** Factor from `unit` to the unit a column is kept in; null when it measures something else. */
export const unitFactor = (unit: string, kept: string): number | null =>
  factors[kept]?.[spelling(unit)] ?? null;

/** The units a column kept in `kept` may be written in. */
export const unitsFor = (kept: string): readonly string[] => Object.keys(factors[kept] ?? {});

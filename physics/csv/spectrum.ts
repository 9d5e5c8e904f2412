import { readColumns } from './read-columns.js';

const energy = {
  kind: 'number',
  names: ['energy', 'photon energy'],
  unit: 'keV',
  min: 0,
  max: 20_000,
} as const;
const fluenceNames = ['fluence', 'photon fluence', 'photons', 'spectrum'];

const perKeV = {
  energy_keV: energy,
  fluence: { kind: 'number', names: fluenceNames, unit: '/mm2/keV/mAs' },
} as const;
const perBin = {
  energy_keV: energy,
  fluence: { kind: 'number', names: fluenceNames, unit: '/mm2/mAs' },
} as const;

/**
 * A spectrum from a table with columns `energy_keV` and either `fluence_per_mm2_per_keV_per_mAs` or,
 * per bin around each energy, `fluence_per_mm2_per_mAs`. A heading without a unit means per keV.
 * Negative fluence is kept here: spectrumFromRows clips it and says so.
 */
export function parseSpectrumCsv(
  text: string,
  mapping?: { energy_keV?: string; fluence?: string },
) {
  const table = readColumns(text, perKeV, mapping);
  if (table.lines.length > 0) return { ...table, fluenceIs: 'per keV' as const };
  const binned = readColumns(text, perBin, mapping);
  return binned.lines.length > 0
    ? { ...binned, fluenceIs: 'per bin' as const }
    : { ...table, fluenceIs: 'per keV' as const };
}

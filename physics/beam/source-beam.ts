import { energyAbsorptionLimit_keV } from '../../materials/index.js';
import type { Source } from '../case/schema.js';
import { lineSpectrum, monoenergetic } from './line-sources.js';
import { type SourceBeam, spectrumFromRows } from './user-spectrum.js';

/**
 * The beam of a source that stands in for the tube, photons per mm² and mAs at 1 m. Sources without
 * a tube have no mAs of their own: their intensities are taken as photons per mm² "and mAs", so that
 * a control that fixes kerma scales them.
 *
 * @param potential_kV bounds a measured spectrum
 * @returns no spectrum, and a finding that says why, when the file's rows are missing or photons lie
 *   above 3 MeV
 */
export function sourceBeam(
  source: Source,
  potential_kV: number,
  extraEdges_keV: readonly number[] = [],
): SourceBeam {
  if (source.kind === 'spectrum') {
    return spectrumFromRows({
      rows: source.rows ?? [],
      fluenceIs: 'per keV',
      potential_kV,
      extraEdges_keV,
      path: 'room.source.file',
    });
  }
  const spectrum =
    source.kind === 'monoenergetic' ? monoenergetic(source.energy_keV) : lineSpectrum(source.lines);
  const highest_keV = Math.max(...spectrum.energies_keV);
  if (highest_keV <= energyAbsorptionLimit_keV) return { spectrum, findings: [] };
  const path = source.kind === 'monoenergetic' ? 'room.source.energy_keV' : 'room.source.lines';
  return {
    spectrum: null,
    findings: [
      {
        code: 'airKermaUnknown',
        severity: 'limit',
        message: `${path}: ${highest_keV} keV: air kerma is known up to ${energyAbsorptionLimit_keV} keV; leave out photons above it.`,
        path,
        value: highest_keV,
        bound: energyAbsorptionLimit_keV,
      },
    ],
  };
}

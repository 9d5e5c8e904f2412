import { parseSpectrumCsv } from '../csv/spectrum.js';
import { numberText } from '../number-text.js';
import type { Finding } from '../results.js';
import { airKerma_uGy } from './air-kerma.js';
import { energyGrid } from './energy-grid.js';
import { type Histogram, rebin } from './rebin.js';
import { type Spectrum, scaleSpectrum } from './spectrum.js';

/** A spectrum the user brings: rows of energy in keV and photons per mm² and mAs. */
export interface SpectrumRows {
  readonly rows: readonly (readonly [energy_keV: number, fluence: number])[];
  /** Whether fluence is per keV at each energy or per bin around it. */
  readonly fluenceIs: 'per keV' | 'per bin';
  readonly potential_kV: number;
  readonly extraEdges_keV?: readonly number[];
  /** Where the spectrum stands in the case, for findings. */
  readonly path?: string;
}

/** A source's beam, and what had to be said about it; null when there is none. */
export interface SourceBeam {
  readonly spectrum: Spectrum | null;
  readonly findings: readonly Finding[];
}

/**
 * A measured or computed spectrum on the grid of a tube potential. Each row owns the energies halfway
 * to its neighbours; photon number is kept. Negative fluence is clipped, and what lies below 5 keV or
 * above the potential is dropped; both are told as findings. Tube, inherent filter and ripple are not
 * applied to it.
 */
export function spectrumFromRows(request: SpectrumRows): SourceBeam {
  const path = request.path ?? 'room.source';
  const rows = request.rows
    .filter(([energy, fluence]) => Number.isFinite(energy) && Number.isFinite(fluence))
    .toSorted(([a], [b]) => a - b)
    .filter(([energy], i, all) => i === 0 || energy > all[i - 1][0]);
  const dropped = droppedFinding(path, request.rows.length - rows.length);
  if (rows.length < 2) {
    const message = `${path}: a spectrum needs at least two energies; ${rows.length} can be read.`;
    const finding: Finding = { code: 'spectrumUnreadable', severity: 'limit', message, path };
    return { spectrum: null, findings: [finding, ...dropped] };
  }
  const { histogram, clipped } = histogramOf(rows, request.fluenceIs);
  const grid = energyGrid(request.potential_kV, request.extraEdges_keV);
  const { counts, below, above } = rebin(histogram, grid.edges_keV);
  const fluence = new Float64Array(grid.energies_keV.length);
  fluence.set(counts);
  const all = histogram.counts.reduce((sum, count) => sum + count, 0);
  return {
    spectrum: {
      edges_keV: grid.edges_keV,
      energies_keV: grid.energies_keV,
      fluence_per_mm2: fluence,
    },
    findings: [
      ...dropped,
      ...lossFinding('spectrumClipped', path, clipped, all, 'were negative and were set to zero'),
      ...lossFinding(
        'spectrumAbovePotential',
        path,
        above,
        all,
        `lie above ${request.potential_kV} kV and were dropped`,
      ),
      ...lossFinding('spectrumBelowGrid', path, below, all, 'lie below 5 keV and were dropped'),
    ],
  };
}

/** The same from a table; bad rows are returned beside it. */
export function spectrumFromCsv(
  text: string,
  potential_kV: number,
  extraEdges_keV?: readonly number[],
) {
  const { rows, fluenceIs, badRows } = parseSpectrumCsv(text);
  const pairs = rows.map((row) => [row.energy_keV, row.fluence] as const);
  return { ...spectrumFromRows({ rows: pairs, fluenceIs, potential_kV, extraEdges_keV }), badRows };
}

/** The same beam scaled to a measured air kerma at the same point; null for an empty beam. */
export function rescaleToAirKerma(spectrum: Spectrum, airKerma: number): Spectrum | null {
  const own = airKerma_uGy(spectrum);
  return own > 0 ? scaleSpectrum(spectrum, airKerma / own) : null;
}

function histogramOf(
  rows: SpectrumRows['rows'],
  fluenceIs: SpectrumRows['fluenceIs'],
): { histogram: Histogram; clipped: number } {
  const energies = rows.map(([energy]) => energy);
  const last = energies.length - 1;
  const edges = new Float64Array(energies.length + 1);
  for (let i = 1; i <= last; i++) edges[i] = (energies[i - 1] + energies[i]) / 2;
  edges[0] = energies[0] - (edges[1] - energies[0]);
  edges[last + 1] = energies[last] + (energies[last] - edges[last]);
  let clipped = 0;
  const counts = Float64Array.from(rows, ([, fluence], i) => {
    const photons = fluenceIs === 'per bin' ? fluence : fluence * (edges[i + 1] - edges[i]);
    if (photons < 0) clipped -= photons;
    return Math.max(0, photons);
  });
  return { histogram: { edges, counts }, clipped };
}

function droppedFinding(path: string, count: number): Finding[] {
  if (count === 0) return [];
  const message = `${path}: ${count} rows repeat an energy or hold no number and were left out.`;
  return [
    { code: 'spectrumRowsLeftOut', severity: 'caution', message, path, value: count, bound: 0 },
  ];
}

function lossFinding(
  code: string,
  path: string,
  lost: number,
  all: number,
  what: string,
): Finding[] {
  if (!(lost > 0)) return [];
  const percent = all > 0 ? (100 * lost) / all : 100;
  return [
    {
      code,
      severity: percent > 1 ? 'caution' : 'note',
      message: `${path}: photons amounting to ${numberText(percent)} % of the spectrum ${what}.`,
      path,
      value: percent,
      bound: 1,
    },
  ];
}

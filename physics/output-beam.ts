import { kept } from '../materials/kept.js';
import {
  attenuate,
  outputFactorAt_kV,
  type Spectrum,
  scaleSpectrum,
  sourceBeam,
  tungstenSpectrum,
} from './beam/index.js';
import type { Prepared } from './prepare.js';
import type { Finding } from './results.js';

/** Output scale g of the room's tube at a potential: calibrated, or as entered. */
export const outputFactorAt = (
  { room, calibration }: Pick<Prepared, 'room' | 'calibration'>,
  potential_kV: number,
): number => (calibration ? outputFactorAt_kV(calibration, potential_kV) : room.tube.outputFactor);

/** The room's beam, or what had to be said about it. */
export interface OutputBeam {
  readonly spectrum: Spectrum | null;
  readonly findings: readonly Finding[];
}

/**
 * The room's beam at 1 m in vacuum behind inherent and added filter, photons per mm² and mAs.
 * A source that replaces the tube has no inherent filter; without a tube "mAs" is one unit of load.
 * The same object for the same potential and filter of a room, so that its quality is found once.
 */
export const outputBeam = (
  prepared: Prepared,
  potential_kV: number,
  filter: string,
): OutputBeam => {
  const beams = kept(beamsOf, prepared, () => new Map<string, OutputBeam>());
  if (beams.size > beamsKept) beams.clear();
  return kept(beams, `${potential_kV}:${filter}`, () => makeBeam(prepared, potential_kV, filter));
};

/** More than any room's potentials times filters; what random potentials fill is let go. */
const beamsKept = 4000;
const beamsOf = new WeakMap<Prepared, Map<string, OutputBeam>>();

const makeBeam = (prepared: Prepared, potential_kV: number, filter: string): OutputBeam => {
  const { source, tube } = prepared.room;
  const added = prepared.filters.get(filter) ?? [];
  if (source) {
    const { spectrum, findings } = sourceBeam(source, potential_kV, prepared.edges_keV);
    return { spectrum: spectrum && attenuate(spectrum, added), findings };
  }
  const bare = tungstenSpectrum({
    potential_kV,
    anodeAngle_deg: tube.anodeAngle_deg,
    ripple_percent: tube.ripple_percent,
    extraEdges_keV: prepared.edges_keV,
  });
  const spectrum = scaleSpectrum(
    attenuate(bare, [...prepared.inherentFilter, ...added]),
    outputFactorAt(prepared, potential_kV),
  );
  return { spectrum, findings: [] };
};

import {
  attenuate,
  monoenergetic,
  type Spectrum,
  scaleSpectrum,
  tungstenSpectrum,
} from '../../../physics/beam/index.js';
import {
  type ChannelScatter,
  detectorResponse,
  type LinearReadout,
  noiseTerms,
  type ReadoutWeights,
  readBeam,
  readoutWeights,
  roomGrid,
} from '../../../physics/readout/index.js';
import type { PlacedDetail, Stack } from '../../../physics/stack/index.js';
import { resolveMaterial } from '../../../physics/stack/index.js';
import { material } from '../scatter/stacks.js';
import { abdomen, type Changes, detailIn, stackIn } from '../stack/abdomen.js';

/** The same scatter-to-primary ratio at every energy: enough for laws, known in advance. */
export const evenScatter =
  (withoutGrid: number, behindGrid = withoutGrid) =>
  (energies_keV: Float64Array): ChannelScatter => {
    const at = (ratio: number) => {
      const column = energies_keV.map(() => ratio);
      return { signal: column, noise: column, counts: column, airKerma: column };
    };
    return { withoutGrid: at(withoutGrid), behindGrid: at(behindGrid) };
  };

/** A tube beam behind 2.5 mm Al and what is added, per mAs at 1 m. */
export const tubeBeam = (potential_kV: number, copper_mm = 0): Spectrum =>
  attenuate(
    tungstenSpectrum({
      potential_kV,
      anodeAngle_deg: 12,
      ripple_percent: 0,
      outputFactor: 0.87,
      extraEdges_keV: [33.169, 35.985, 50.239],
    }),
    [
      { material: material('aluminium'), thickness_mm: 2.5 },
      { material: material('copper'), thickness_mm: copper_mm },
    ],
  );

/** A beam of one energy with a number of photons per mm² at the detector, whatever stands before. */
export const photons = (energy_keV: number, fluence_per_mm2: number): Spectrum =>
  scaleSpectrum(monoenergetic(energy_keV), fluence_per_mm2);

export interface AbdomenRead {
  readonly readout: LinearReadout;
  readonly weights: ReadoutWeights;
  readonly detail: PlacedDetail;
  readonly stack: Stack;
  readonly atDetector: Spectrum;
}

/** Reads the invented abdomen: `beam` is sent through the patient unless it is `atDetector`. */
export const readAbdomen = (
  changes: Changes,
  {
    beam = tubeBeam(80),
    atDetector,
    gridIn = false,
    scatterOn = evenScatter(0),
  }: {
    readonly beam?: Spectrum;
    readonly atDetector?: Spectrum;
    readonly gridIn?: boolean;
    readonly scatterOn?: (energies_keV: Float64Array) => ChannelScatter;
  } = {},
): AbdomenRead => {
  const c = abdomen(changes);
  const materials = resolveMaterial(c);
  const stack = stackIn(c);
  const detail = detailIn(c, stack);
  const detector = detectorResponse(c.room.detector, materials);
  const arriving = atDetector ?? attenuate(beam, stack.layers);
  const chain = {
    detector,
    grid: gridIn && c.room.grid ? roomGrid(c.room.grid, materials) : null,
    scatterOn,
    detail,
    noise: noiseTerms(c, c.techniques[0].acquisition, detector),
  };
  const weights = readoutWeights(chain, arriving.energies_keV);
  return {
    readout: readBeam(weights, arriving.fluence_per_mm2),
    weights,
    detail,
    stack,
    atDetector: arriving,
  };
};

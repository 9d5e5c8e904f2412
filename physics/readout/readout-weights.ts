import { kept } from '../../materials/kept.js';
import { airKermaPerPhoton_uGy_mm2 } from '../beam/index.js';
import type { DetectorScatter } from '../scatter/responses.js';
import type { PlacedDetail } from '../stack/place-detail.js';
import { detailColumns } from './detail-columns.js';
import type { DetectorResponse } from './detector-response.js';
import type { NoiseTerms } from './noise-terms.js';
import type { RoomGrid } from './room-grid.js';

/** Scatter over primary on the channels of a beam. */
export interface ChannelScatter {
  readonly withoutGrid: DetectorScatter;
  readonly behindGrid: DetectorScatter | null;
}

/** Everything behind the patient that turns photons into an answer; one per stack and technique. */
export interface ReadoutChain {
  readonly detector: DetectorResponse;
  /** Null when there is no grid or it is out. */
  readonly grid: RoomGrid | null;
  /** Scatter responses on a grid of channels; null to leave scatter out. */
  readonly scatterOn: ((energies_keV: Float64Array) => ChannelScatter) | null;
  readonly detail: PlacedDetail;
  readonly noise: NoiseTerms;
}

/**
 * The rows of `ReadoutWeights.rows`: each is what one photon per mm² of the plain stack's primary at
 * the detector plane, before the grid, adds to one quantity.
 */
export enum Row {
  /** Reference background signal and scatter signal without grid. */
  openPrimary,
  openScatter,
  /** The same behind the grid. */
  primary,
  scatter,
  /** Quantum variance of both behind the grid, optical Swank factor included. */
  variance,
  primaryKerma,
  totalKerma,
  /** What could be absorbed: energy behind the grid (photons when counting). */
  arriving,
  /** Energy fluence in front of the grid and its loss in the detail's central path. */
  energyFluence,
  energyFluenceLoss,
  /** Signal behind the grid through the detail's central path. */
  detail,
  /** Background minus detail, behind the grid: the central path, then the paths one by one. */
  difference,
  firstPath,
}

/** Weights of a chain on one energy grid; a beam is read by dot products with the rows. */
export interface ReadoutWeights {
  readonly chain: ReadoutChain;
  readonly channels: number;
  /** Row after row, `channels` values each. */
  readonly rows: Float64Array;
  /** Areas of the path rows in mm² at the detail; empty when the central path is all there is. */
  readonly pathAreas_mm2: Float64Array;
  /** Where a reading puts the sums of the rows; overwritten by the next. */
  readonly sums: Float64Array;
}

const known = new WeakMap<ReadoutChain, WeakMap<Float64Array, ReadoutWeights>>();

/**
 * Weights of a readout chain on an energy grid, kept by the identity of both: a sweep over filters
 * pays for detector, grid, scatter and detail once per potential.
 *
 * Scatter is taken in proportion to the reference background's primary, channel by channel. (The
 * responses belong to the plain stack; a reference other than the layer shifts it by the few tenths
 * of a percent that the primary shifts.) A measured grid replaces both transmissions of the model.
 */
export const readoutWeights = (chain: ReadoutChain, energies_keV: Float64Array): ReadoutWeights =>
  kept(
    kept(known, chain, () => new WeakMap<Float64Array, ReadoutWeights>()),
    energies_keV,
    () => makeWeights(chain, energies_keV),
  );

const makeWeights = (chain: ReadoutChain, energies_keV: Float64Array): ReadoutWeights => {
  const { detector, detail } = chain;
  const channels = energies_keV.length;
  const { epsilon, epsilon2 } = detector.on(energies_keV);
  const kerma = airKermaPerPhoton_uGy_mm2(energies_keV);
  const { transmission, open, behind } = gridAndScatter(chain, energies_keV);
  const { central, paths } = detailColumns(detail, energies_keV);
  const pathRows = paths.length > 1 ? paths : [];
  const rows = new Float64Array((Row.firstPath + pathRows.length) * channels);
  for (let i = 0; i < channels; i++) {
    const energy = energies_keV[i];
    const set = (row: number, value: number): void => {
      rows[row * channels + i] = value;
    };
    const background = central.reference[i];
    const passed = transmission[i] * background;
    const signal = energy * epsilon[i];
    set(Row.openPrimary, background * signal);
    set(Row.openScatter, background * signal * open.signal[i]);
    set(Row.primary, passed * signal);
    set(Row.scatter, passed * signal * behind.signal[i]);
    const variance = (energy * energy * epsilon2[i]) / detector.opticalSwank;
    set(Row.variance, passed * variance * (1 + behind.noise[i]));
    set(Row.primaryKerma, passed * kerma[i]);
    set(Row.totalKerma, passed * kerma[i] * (1 + behind.airKerma[i]));
    set(Row.arriving, passed * (detector.response === 'counting' ? 1 : energy));
    set(Row.energyFluence, background * energy);
    set(Row.energyFluenceLoss, central.difference[i] * energy);
    set(Row.detail, transmission[i] * central.detail[i] * signal);
    set(Row.difference, transmission[i] * central.difference[i] * signal);
    for (let k = 0; k < pathRows.length; k++) {
      set(Row.firstPath + k, transmission[i] * pathRows[k].difference[i] * signal);
    }
  }
  const areas = pathRows.length > 0 ? detail.paths.map(({ area_mm2 }) => area_mm2) : [];
  return {
    chain,
    channels,
    rows,
    pathAreas_mm2: Float64Array.from(areas),
    sums: new Float64Array(rows.length / channels),
  };
};

interface GridAndScatter {
  readonly transmission: Float64Array;
  readonly open: DetectorScatter;
  readonly behind: DetectorScatter;
}

/** Primary transmission of the grid and scatter over primary on both its sides. */
const gridAndScatter = (
  { grid, scatterOn }: ReadoutChain,
  energies_keV: Float64Array,
): GridAndScatter => {
  const scatter = scatterOn?.(energies_keV) ?? noScatter(energies_keV.length);
  const open = scatter.withoutGrid;
  if (!grid) return { transmission: energies_keV.map(() => 1), open, behind: open };
  if (grid.measured) {
    const { primaryTransmission, scatterTransmission } = grid.measured;
    const change = primaryTransmission > 0 ? scatterTransmission / primaryTransmission : 0;
    return {
      transmission: energies_keV.map(() => primaryTransmission),
      open,
      behind: scaled(open, change),
    };
  }
  if (!scatter.behindGrid) {
    throw new Error('the grid is in and the scatter responses were computed without it');
  }
  return { transmission: grid.table.primaryOn(energies_keV), open, behind: scatter.behindGrid };
};

const scaled = (scatter: DetectorScatter, factor: number): DetectorScatter => ({
  signal: scatter.signal.map((value) => value * factor),
  noise: scatter.noise.map((value) => value * factor),
  counts: scatter.counts.map((value) => value * factor),
  airKerma: scatter.airKerma.map((value) => value * factor),
});

const noScatter = (channels: number): ChannelScatter => {
  const zero = new Float64Array(channels);
  const none = { signal: zero, noise: zero, counts: zero, airKerma: zero };
  return { withoutGrid: none, behindGrid: none };
};

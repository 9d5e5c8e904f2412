import { elementaryCharge_C, massAttenuationOn } from '../../materials/index.js';
import { boundedMemo } from '../numeric/bounded-memo.js';
import { bremsstrahlung } from './bremsstrahlung.js';
import { characteristicLine } from './characteristic-lines.js';
import { type EnergyGrid, energyGrid } from './energy-grid.js';
import { referenceMaterial } from './reference-materials.js';
import { rippleVoltages_kV } from './ripple.js';
import type { Spectrum } from './spectrum.js';
import { kLines } from './tungsten-coefficients.js';

/** What decides a tube's unfiltered beam. */
export interface TubeSetting {
  /** Peak potential, 20 to 150 kV. */
  readonly potential_kV: number;
  /** 6 to 22°. */
  readonly anodeAngle_deg: number;
  /** (Vmax − Vmin)/Vmax in percent; 0 is constant potential. */
  readonly ripple_percent?: number;
  /** Output scale g; 0.87 ± 30 % uncalibrated, 1 is the bare model. */
  readonly outputFactor?: number;
  /** K edges of everything else in the beam, made bin boundaries. */
  readonly extraEdges_keV?: readonly number[];
  /**
   * Channels to use instead of the potential's own: those of a potential at least as high. Many
   * random potentials on one grid share everything that is remembered per grid; the bin that holds
   * the potential is filled as far as the potential.
   */
  readonly grid?: EnergyGrid;
}

/** Tube output is quoted at this distance from the focal spot. */
export const outputDistance_mm = 1000;

/** Electrons in one mAs: 10⁻³ C over the elementary charge. */
const electrons_per_mAs = 1e-3 / elementaryCharge_C.value;
/** One steradian at 1 m covers 10⁶ mm². */
const steradian_per_mm2 = 1e-6;
const photonScale = electrons_per_mAs * steradian_per_mm2;
const spectraKept = 256;

/**
 * Spectrum of a tungsten reflection anode: photons per mm² and mAs in each channel, 1 m from the
 * focal spot, in vacuum, before any filter.
 *
 * Model: bremsstrahlung.ts and characteristic-lines.ts; ripple.ts for the voltage. L lines are not
 * modelled, so at least 1 mm aluminium equivalent must follow (filtration-faults.ts). Uncertainty of
 * the output ±10 % from the model and ±30 % from tube to tube until calibrated.
 *
 * @throws RangeError outside 20 to 150 kV or 6 to 22°, or for a grid that ends below the potential
 */
export function tungstenSpectrum(setting: TubeSetting): Spectrum {
  const { potential_kV, anodeAngle_deg, ripple_percent = 0, outputFactor = 1 } = setting;
  if (!(potential_kV >= 20 && potential_kV <= 150)) {
    throw new RangeError(`potential ${potential_kV} kV: must be 20 to 150`);
  }
  if (!(anodeAngle_deg >= 6 && anodeAngle_deg <= 22)) {
    throw new RangeError(`anode angle ${anodeAngle_deg}°: must be 6 to 22`);
  }
  const grid = setting.grid ?? energyGrid(potential_kV, setting.extraEdges_keV);
  if (!(grid.potential_kV >= potential_kV)) {
    throw new RangeError(`grid to ${grid.potential_kV} keV: must reach ${potential_kV} kV`);
  }
  const bare = bareFluence({ grid, potential_kV, anodeAngle_deg, ripple_percent });
  return {
    edges_keV: grid.edges_keV,
    energies_keV: grid.energies_keV,
    fluence_per_mm2: outputFactor === 1 ? bare : bare.map((fluence) => fluence * outputFactor),
  };
}

interface BareRequest {
  readonly grid: EnergyGrid;
  readonly potential_kV: number;
  readonly anodeAngle_deg: number;
  readonly ripple_percent: number;
}

const gridNumbers = new WeakMap<EnergyGrid, number>();
let gridsNumbered = 0;
function gridNumber(grid: EnergyGrid): number {
  let number = gridNumbers.get(grid);
  if (number === undefined) {
    number = gridsNumbered++;
    gridNumbers.set(grid, number);
  }
  return number;
}

const bareFluence = boundedMemo<BareRequest, Float64Array>(
  spectraKept,
  (r) => `${gridNumber(r.grid)}:${r.potential_kV}:${r.anodeAngle_deg}:${r.ripple_percent}`,
  ({ grid, potential_kV, anodeAngle_deg, ripple_percent }) => {
    const fluence = new Float64Array(grid.energies_keV.length);
    const voltages = rippleVoltages_kV(potential_kV, ripple_percent);
    for (const voltage of voltages) addFluence(fluence, grid, voltage, anodeAngle_deg);
    const scale = photonScale / voltages.length;
    for (let i = 0; i < fluence.length; i++) fluence[i] *= scale;
    return fluence;
  },
);

/** Adds photons per steradian and electron at one constant voltage. */
function addFluence(
  fluence: Float64Array,
  grid: EnergyGrid,
  voltage_kV: number,
  anodeAngle_deg: number,
): void {
  const massAttenuation = massAttenuationOn(referenceMaterial('tungsten'), grid.energies_keV);
  const edges = grid.edges_keV;
  const bins = edges.length - 1;
  const photonsAt = bremsstrahlung(voltage_kV, anodeAngle_deg);
  for (let i = 0; i < bins && edges[i] < voltage_kV; i++) {
    const top = Math.min(edges[i + 1], voltage_kV);
    const terms = photonsAt((edges[i] + top) / 2, massAttenuation[i]);
    fluence[i] += terms.photons_per_keV_sr_electron * (top - edges[i]);
  }
  const lineAt = characteristicLine(voltage_kV, anodeAngle_deg);
  for (let j = 0; j < grid.lineCount; j++) {
    fluence[bins + j] += lineAt(kLines[j].share, massAttenuation[bins + j]);
  }
}

import { absorptionEdges, type Material } from '../../materials/index.js';
import { kept } from '../../materials/kept.js';
import type { Detector } from '../case/schema.js';
import { KeptBy, nothing } from '../numeric/kept-by.js';
import {
  type DetectorInteractions,
  detectorInteractions,
  type Interaction,
} from './detector-interactions.js';

/** A detector's answer on an energy grid at normal incidence. */
export interface DetectorColumns {
  readonly eta: Float64Array;
  readonly epsilon: Float64Array;
  readonly epsilon2: Float64Array;
}

/**
 * What one photon leaves in the detector, by energy and direction. The signal of a photon is E·ε
 * and its share in quantum variance E²·ε₂ in either mode: keV when energy-integrating, counts when
 * counting (then ε = η/E and ε₂ = η/E² above the threshold, 0 below).
 */
export interface DetectorResponse {
  readonly name: string;
  /** η: share of photons detected. */
  readonly efficiency: (energy_keV: number, cosBeta: number) => number;
  /** ε: share of the photon's energy in the signal. */
  readonly energyFraction: (energy_keV: number, cosBeta: number) => number;
  /** ε₂: mean square of that energy over E². */
  readonly energySquareFraction: (energy_keV: number, cosBeta: number) => number;
  /** The three at normal incidence, kept per grid by identity; not to be written to. */
  readonly on: (energies_keV: Float64Array) => DetectorColumns;
  /** Light noise on top of the spread of energy absorbed: quantum variance is divided by it. */
  readonly opticalSwank: number;
  readonly response: Detector['response'];
  /**
   * Where the response jumps, 5 to 150 keV: the K edges of its material, and the threshold when
   * counting. An energy grid in front of the detector should hold them.
   */
  readonly edges_keV: readonly number[];
  /** Absorbs every photon and adds no noise of its own. */
  readonly isIdeal: boolean;
}

type Read = (energy_keV: number, eta: number, lost_keV: number, lostSquare_keV2: number) => number;

const known = new KeptBy<DetectorResponse>();

/**
 * The response of a detector: any material at an areal density, or `ideal` (η = 1, no escape).
 *
 * η = 1 − exp(−μm/cosβ) with the total coefficient. Of each interaction the whole energy is taken as
 * absorbed unless a K photon escapes: with P_l the chance per interaction that line l leaves the
 * slab, ⟨e⟩ = E − ΣP_l E_l and ⟨e²⟩ = E² − ΣP_l E_l(2E − E_l), since e is E − E_l with chance P_l and
 * E otherwise; ε = η⟨e⟩/E and ε₂ = η⟨e²⟩/E² (Swank 1973, J Appl Phys 44, 4199: the ratio ε²/(ηε₂)
 * is the noise factor of the absorbed energy). P_l = w τ_i (1 − 1/J) ω p_l / μ · G_l with the escape
 * G_l of `slabEscape`. Energy that Compton-scattered photons take out of the slab is not modelled
 * (valid where photoelectric absorption dominates: below about 120 keV in these materials).
 *
 * Range 1 keV to 20 MeV in energy, cosβ above 0 to 1. Kept per detector and the material its name stands for.
 *
 * @throws Error when the material's name is unknown to `materials`.
 */
export const detectorResponse = (
  detector: Detector,
  materials: (name: string) => Material,
): DetectorResponse => {
  const material = detector.material === 'ideal' ? null : materials(detector.material);
  return known.get([detector, material ?? nothing], () => makeResponse(detector, material));
};

const makeResponse = (detector: Detector, material: Material | null): DetectorResponse => {
  const slab = material && detectorInteractions(material, detector.arealDensity_mg_per_cm2 / 1000);
  const reads = readsOf(detector);
  return {
    name: detector.material,
    isIdeal: material === null,
    response: detector.response,
    opticalSwank: material ? detector.opticalSwank : 1,
    edges_keV: edgesOf(detector, material),
    efficiency: angular(slab, reads.eta),
    energyFraction: angular(slab, reads.epsilon),
    energySquareFraction: angular(slab, reads.epsilon2),
    on: columns(slab, reads),
  };
};

const edgesOf = (detector: Detector, material: Material | null): number[] => {
  const edges = (material ? absorptionEdges(material, 5, 150) : [])
    .filter(({ shell }) => shell === 'K')
    .map(({ energy_keV }) => energy_keV);
  const threshold_keV = detector.countingThreshold_keV;
  if (detector.response === 'counting' && threshold_keV > 5) edges.push(threshold_keV);
  return [...new Set(edges)].sort((a, b) => a - b);
};

/** How a detected photon is read out, by mode. */
const readsOf = (detector: Detector): Record<keyof DetectorColumns, Read> => {
  const threshold_keV = detector.countingThreshold_keV;
  return detector.response === 'counting'
    ? {
        eta: (E, eta) => (E >= threshold_keV ? eta : 0),
        epsilon: (E, eta) => (E >= threshold_keV ? eta / E : 0),
        epsilon2: (E, eta) => (E >= threshold_keV ? eta / (E * E) : 0),
      }
    : {
        eta: (_E, eta) => eta,
        epsilon: (E, eta, lost) => eta * (1 - lost / E),
        epsilon2: (E, eta, lost, lostSquare) => eta * (1 - (2 * lost) / E + lostSquare / (E * E)),
      };
};

const angular = (
  slab: DetectorInteractions | null,
  read: Read,
): ((energy_keV: number, cosBeta: number) => number) => {
  if (!slab) return (energy_keV) => read(energy_keV, 1, 0, 0);
  const scratch = slab.make();
  return (energy_keV, cosBeta) =>
    readAt(slab, read, energy_keV, slab.at(energy_keV, scratch), cosBeta);
};

const readAt = (
  { emissions }: DetectorInteractions,
  read: Read,
  energy_keV: number,
  { depth, photons }: Interaction,
  cosBeta: number,
): number => {
  const slant = depth / Math.max(cosBeta, 1e-9);
  let lost = 0;
  let lostSquare = 0;
  for (let k = 0; k < photons.length; k++) {
    if (photons[k] === 0) continue;
    lost += photons[k] * emissions[k].escapedEnergy_keV(slant);
    lostSquare += photons[k] * emissions[k].escapedEnergySquare_keV2(slant);
  }
  return read(energy_keV, -Math.expm1(-slant), lost, lostSquare);
};

const columns = (
  slab: DetectorInteractions | null,
  reads: Record<keyof DetectorColumns, Read>,
): ((energies_keV: Float64Array) => DetectorColumns) => {
  const made = new WeakMap<Float64Array, DetectorColumns>();
  const compute = (energies_keV: Float64Array): DetectorColumns => {
    if (!slab) {
      const column = (read: Read) => energies_keV.map((energy) => read(energy, 1, 0, 0));
      return {
        eta: column(reads.eta),
        epsilon: column(reads.epsilon),
        epsilon2: column(reads.epsilon2),
      };
    }
    const { depth, photons } = slab.on(energies_keV);
    const scratch = slab.make();
    const column = (read: Read) =>
      energies_keV.map((energy, i) => {
        scratch.depth = depth[i];
        for (let k = 0; k < photons.length; k++) scratch.photons[k] = photons[k][i];
        return readAt(slab, read, energy, scratch, 1);
      });
    return {
      eta: column(reads.eta),
      epsilon: column(reads.epsilon),
      epsilon2: column(reads.epsilon2),
    };
  };
  return (energies_keV) => kept(made, energies_keV, () => compute(energies_keV));
};

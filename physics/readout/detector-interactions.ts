import {
  type Material,
  massAttenuation,
  massAttenuationOn,
  partialCoefficients,
  partialCoefficientsOn,
} from '../../materials/index.js';
import { locate, locatorOf } from '../numeric/locate.js';
import { edgeNodes, edgesWithin } from './edge-nodes.js';
import { type KEmission, kEmissions } from './k-emission.js';

/** How a photon of one energy meets the detector, whatever its direction. */
export interface Interaction {
  /** μm at normal incidence. */
  depth: number;
  /** K photons per interaction, for every emitting element. */
  readonly photons: Float64Array;
}

/** A detector slab as photons see it. */
export interface DetectorInteractions {
  readonly emissions: readonly KEmission[];
  /** Fills `into` for an energy; from a table between 4 and 150 keV (to 5e-5), direct outside. */
  readonly at: (energy_keV: number, into: Interaction) => Interaction;
  /** The same on a grid, exact: μm, and K photons per interaction element by element. */
  readonly on: (energies_keV: Float64Array) => {
    readonly depth: Float64Array;
    readonly photons: readonly Float64Array[];
  };
  readonly make: () => Interaction;
}

const range_keV = [4, 150] as const;
/** Nodes stand 0.8 % apart. */
const nodesPerUnit = 120;

/** Attenuation and K emission of a detector of a material and areal density in g/cm². */
export const detectorInteractions = (
  material: Material,
  arealDensity_g_per_cm2: number,
): DetectorInteractions => {
  const emissions = kEmissions(material, arealDensity_g_per_cm2);

  const photonsPerInteraction = (
    emission: KEmission,
    energy_keV: number,
    photoelectric: number,
    total: number,
  ): number =>
    energy_keV < emission.edge_keV
      ? 0
      : (emission.massFraction * photoelectric * emission.photonsPerPhotoelectric) / total;

  const on = (energies_keV: Float64Array) => {
    const total = massAttenuationOn(material, energies_keV);
    const photons = emissions.map((emission) => {
      const { photoelectric } = partialCoefficientsOn(emission.element, energies_keV);
      return photoelectric.map((value, i) =>
        photonsPerInteraction(emission, energies_keV[i], value, total[i]),
      );
    });
    return { depth: total.map((value) => value * arealDensity_g_per_cm2), photons };
  };

  const direct = (energy_keV: number, into: Interaction): Interaction => {
    const total = massAttenuation(material, energy_keV);
    into.depth = total * arealDensity_g_per_cm2;
    emissions.forEach((emission, k) => {
      const element = partialCoefficients(emission.element, energy_keV);
      into.photons[k] = photonsPerInteraction(
        emission,
        energy_keV,
        element.photoelectric_cm2_per_g,
        total,
      );
    });
    return into;
  };

  const nodes = edgeNodes(...range_keV, edgesWithin([material], ...range_keV), nodesPerUnit);
  const table = on(nodes);
  const logDepth = table.depth.map((depth) => Math.log(depth));
  const locator = locatorOf(nodes);

  const at = (energy_keV: number, into: Interaction): Interaction => {
    if (energy_keV < range_keV[0] || energy_keV > range_keV[1]) return direct(energy_keV, into);
    const i = locate(locator, energy_keV);
    const share = (energy_keV - nodes[i]) / (nodes[i + 1] - nodes[i]);
    into.depth = Math.exp(logDepth[i] + share * (logDepth[i + 1] - logDepth[i]));
    for (let k = 0; k < table.photons.length; k++) {
      const column = table.photons[k];
      into.photons[k] = column[i] + share * (column[i + 1] - column[i]);
    }
    return into;
  };

  return {
    emissions,
    at,
    on,
    make: () => ({ depth: 0, photons: new Float64Array(emissions.length) }),
  };
};

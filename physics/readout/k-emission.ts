import {
  elementByZ,
  kShell,
  type Material,
  massAttenuation,
  namedMaterial,
} from '../../materials/index.js';
import { slabEscape } from './slab-escape.js';

/** Elements below this emit K photons too soft to leave where they are born. */
const lightestEmitter = 30;

/**
 * K fluorescence of one element of a detector: how often it follows an interaction, and the mean of
 * the energy that then leaves the slab, as functions of the slab's depth for the incoming photon.
 */
export interface KEmission {
  readonly element: Material;
  readonly massFraction: number;
  readonly edge_keV: number;
  /** (1 − 1/J)·ω: K photons per photoelectric event in this element above its edge. */
  readonly photonsPerPhotoelectric: number;
  /** Σ pₗ·Gₗ·Eₗ and Σ pₗ·Gₗ·Eₗ² per K photon, at depth α = μm/cosβ. */
  readonly escapedEnergy_keV: (depth: number) => number;
  readonly escapedEnergySquare_keV2: (depth: number) => number;
}

/** Nodes in ln α; escape bends slowly with it. */
const depthNodes = 160;
const depthRange = [1e-4, 1e4] as const;

/** Linear in ln α between nodes of a smooth function; relative error below 1e-4 (tested). */
const tabulated = (compute: (depth: number) => number): ((depth: number) => number) => {
  const from = Math.log(depthRange[0]);
  const step = (Math.log(depthRange[1]) - from) / (depthNodes - 1);
  const values = Float64Array.from({ length: depthNodes }, (_, i) =>
    compute(Math.exp(from + i * step)),
  );
  return (depth) => {
    const place = Math.min(depthNodes - 1, Math.max(0, (Math.log(depth) - from) / step));
    const i = Math.min(depthNodes - 2, Math.floor(place));
    return values[i] + (place - i) * (values[i + 1] - values[i]);
  };
};

/** The emitting elements of a detector of an areal density, lightest first. */
export const kEmissions = (material: Material, arealDensity_g_per_cm2: number): KEmission[] =>
  material.massFractions.flatMap(({ z, massFraction }): KEmission[] => {
    const shell = z >= lightestEmitter ? kShell(z) : undefined;
    const element = namedMaterial(elementByZ(z).name);
    if (!shell || !element) return [];
    const lines = shell.lines.map((line) => {
      // Two tables meet here: no K photon exceeds its own edge, which some would by 0.2 keV.
      const energy_keV = Math.min(line.energy_keV, shell.edge_keV * (1 - 1e-6));
      const depth = massAttenuation(material, energy_keV) * arealDensity_g_per_cm2;
      return { energy_keV, depth, share: line.share };
    });
    const escaped = (power: number) =>
      tabulated((depth) =>
        lines.reduce(
          (sum, line) =>
            sum + line.share * slabEscape(depth, line.depth) * line.energy_keV ** power,
          0,
        ),
      );
    return [
      {
        element,
        massFraction,
        edge_keV: shell.edge_keV,
        photonsPerPhotoelectric: (1 - 1 / shell.jumpRatio) * shell.yield,
        escapedEnergy_keV: escaped(1),
        escapedEnergySquare_keV2: escaped(2),
      },
    ];
  });

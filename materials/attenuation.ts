import { elementCoefficients, type PartialCoefficients } from './element-coefficients.js';
import { elementColumns } from './element-columns.js';
import { elementByZ } from './elements.js';
import { elementEnergyAbsorption, energyAbsorptionLimit_keV } from './energy-absorption.js';
import { kept } from './kept.js';
import type { Material } from './material.js';

/** Coefficients of a material by process at one energy (1 keV to 20 MeV), cm²/g: μ/ρ = Σ wᵢ(μ/ρ)ᵢ. */
export function partialCoefficients(material: Material, energy_keV: number): PartialCoefficients {
  const sum = {
    coherent_cm2_per_g: 0,
    incoherent_cm2_per_g: 0,
    photoelectric_cm2_per_g: 0,
    pair_cm2_per_g: 0,
    massAttenuation_cm2_per_g: 0,
  };
  for (const { z, massFraction } of material.massFractions) {
    const element = elementCoefficients(z, energy_keV);
    sum.coherent_cm2_per_g += massFraction * element.coherent_cm2_per_g;
    sum.incoherent_cm2_per_g += massFraction * element.incoherent_cm2_per_g;
    sum.photoelectric_cm2_per_g += massFraction * element.photoelectric_cm2_per_g;
    sum.pair_cm2_per_g += massFraction * element.pair_cm2_per_g;
    sum.massAttenuation_cm2_per_g += massFraction * element.massAttenuation_cm2_per_g;
  }
  return sum;
}

/** Total mass attenuation coefficient μ/ρ, coherent scattering included, cm²/g. */
export function massAttenuation(material: Material, energy_keV: number): number {
  return partialCoefficients(material, energy_keV).massAttenuation_cm2_per_g;
}

/** μen/ρ in cm²/g, 1 keV to 3 MeV; null above. See `energyAbsorptionCaution` for heavy elements. */
export function massEnergyAbsorption(material: Material, energy_keV: number): number | null {
  if (energy_keV > energyAbsorptionLimit_keV) return null;
  return material.massFractions.reduce(
    (sum, { z, massFraction }) => sum + massFraction * elementEnergyAbsorption(z, energy_keV),
    0,
  );
}

/**
 * A sentence where μen/ρ leaves out bremsstrahlung that matters (an element above Z = 20, above
 * 150 keV) or is not given at all (above 3 MeV); null where there is nothing to say.
 */
export function energyAbsorptionCaution(material: Material, energy_keV: number): string | null {
  if (energy_keV > energyAbsorptionLimit_keV) {
    return `${material.name}: μen/ρ is not given above ${energyAbsorptionLimit_keV} keV, where bremsstrahlung losses cannot be neglected.`;
  }
  const heaviest = material.massFractions.at(-1);
  if (energy_keV <= 150 || !heaviest || heaviest.z <= 20) return null;
  return `${material.name}: μen/ρ at ${energy_keV} keV neglects bremsstrahlung from ${elementByZ(heaviest.z).name}; it is too high by up to about 8 %.`;
}

/**
 * μ/ρ on an energy grid, cm²/g. Kept per grid and material by identity: neither may be changed after.
 */
export function massAttenuationOn(material: Material, energies_keV: Float64Array): Float64Array {
  return onGrid(totals, material, energies_keV, () =>
    weightedSum(material, energies_keV, (columns) => columns.massAttenuation),
  );
}

/** Coefficients by process on an energy grid, cm²/g; pair production is left out. */
export interface PartialColumns {
  readonly coherent: Float64Array;
  readonly incoherent: Float64Array;
  readonly photoelectric: Float64Array;
}

/** Coherent, incoherent and photoelectric coefficients on an energy grid; kept as `massAttenuationOn`. */
export function partialCoefficientsOn(
  material: Material,
  energies_keV: Float64Array,
): PartialColumns {
  return onGrid(partials, material, energies_keV, () => ({
    coherent: weightedSum(material, energies_keV, (columns) => columns.coherent),
    incoherent: weightedSum(material, energies_keV, (columns) => columns.incoherent),
    photoelectric: weightedSum(material, energies_keV, (columns) => columns.photoelectric),
  }));
}

/** μen/ρ on an energy grid up to 3 MeV, cm²/g (throws above); kept as `massAttenuationOn`. */
export function massEnergyAbsorptionOn(
  material: Material,
  energies_keV: Float64Array,
): Float64Array {
  return onGrid(absorptions, material, energies_keV, () =>
    weightedSum(material, energies_keV, (columns) => columns.energyAbsorption()),
  );
}

type GridCache<T> = WeakMap<Float64Array, WeakMap<Material, T>>;
const totals: GridCache<Float64Array> = new WeakMap();
const partials: GridCache<PartialColumns> = new WeakMap();
const absorptions: GridCache<Float64Array> = new WeakMap();

function onGrid<T>(
  cache: GridCache<T>,
  material: Material,
  energies_keV: Float64Array,
  make: () => T,
): T {
  return kept(
    kept(cache, energies_keV, () => new WeakMap<Material, T>()),
    material,
    make,
  );
}

function weightedSum(
  material: Material,
  energies_keV: Float64Array,
  pick: (columns: ReturnType<typeof elementColumns>) => Float64Array,
): Float64Array {
  const sum = new Float64Array(energies_keV.length);
  for (const { z, massFraction } of material.massFractions) {
    const column = pick(elementColumns(z, energies_keV));
    for (let i = 0; i < sum.length; i++) sum[i] += massFraction * column[i];
  }
  return sum;
}

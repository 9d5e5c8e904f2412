import { avogadro_per_mol } from './constants.js';
import { elementByZ } from './elements.js';
import type { Material } from './material.js';
import { formFactor, incoherentScatteringFunction } from './scattering-functions.js';

/** Σ wᵢ/Aᵢ · value(Zᵢ), mol/g: turns an atomic quantity into one per gram (times Avogadro's constant). */
function perGram(material: Material, value: (z: number) => number): number {
  return material.massFractions.reduce(
    (sum, { z, massFraction }) =>
      sum + (massFraction / elementByZ(z).atomicWeight_g_per_mol) * value(z),
    0,
  );
}

/** Σ wᵢ/Aᵢ · Fᵢ²(q), mol/g, q = sin(θ/2)/λ in 1/Å (independent atoms). */
export function formFactorSquaredPerGram(material: Material, q_per_angstrom: number): number {
  return perGram(material, (z) => formFactor(z, q_per_angstrom) ** 2);
}

/** Σ wᵢ/Aᵢ · Sᵢ(q), mol/g, q = sin(θ/2)/λ in 1/Å (independent atoms). */
export function scatteringFunctionPerGram(material: Material, q_per_angstrom: number): number {
  return perGram(material, (z) => incoherentScatteringFunction(z, q_per_angstrom));
}

/** Atoms per gram. */
export function atoms_per_g(material: Material): number {
  return avogadro_per_mol.value * perGram(material, () => 1);
}

/** Electrons per gram. */
export function electrons_per_g(material: Material): number {
  return avogadro_per_mol.value * perGram(material, (z) => z);
}

/** Electrons per cm³; water at 1 g/cm³: 3.343e23. */
export function electronDensity_per_cm3(material: Material): number {
  return electrons_per_g(material) * material.density_g_per_cm3;
}

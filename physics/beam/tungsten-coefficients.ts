/**
 * The numbers of the tungsten tube model, fitted by us to a single-scattering electron Monte Carlo
 * (elastic: Salvat, Jablonski & Powell 2005, Dirac partial waves; stopping: Bethe with Berger &
 * Seltzer, I = 727 eV, Joy & Luo below; Møller losses; bremsstrahlung: Seltzer & Berger 1986, angular
 * shape Kirkpatrick & Wiedmann 1945 retarded after Statham 1976; K ionisation: Casnati 1982 and
 * fluorescence by bremsstrahlung). None was fitted to a published beam quality.
 *
 * Fit error at 12°: 0.15 % in first and 0.22 % in second half-value layer, 0.43 % in air kerma.
 * Polynomials list their coefficients from the constant term upward.
 */

/** Tungsten K absorption edge (XCOM). */
export const kEdge_keV = 69.525;

/** No K lines below: the direct depth is singular at 69.64 kV, and their yield there is nil. */
export const lowestLinePotential_kV = 69.7;

/** ln of the electron range in g/cm², in l = ln(T0/100 kV). */
export const rangeCoefficients = [-3.52099, 1.61478, -0.04537, -0.01497] as const;

/** Yield Y = Σ uⁱ (aᵢ₀ + aᵢ₁ l + aᵢ₂ l²), u = E/T0: row i holds aᵢ₀, aᵢ₁, aᵢ₂. */
export const yieldCoefficients = [
  [1.2714, 0.1686, -0.1746],
  [-1.5703, -3.0038, 1.3423],
  [4.1455, 12.2542, -4.7107],
  [-6.6776, -27.6326, 7.3474],
  [6.015, 30.1045, -4.8798],
  [-1.8395, -12.7648, 0.9433],
] as const;

/** Scale of N(E) = yieldScale · Y · (T0 − E)/E · escape. */
export const yieldScale = 1e-5;

/** Depth ζ = R0 v / (d0 + d1 √v + d2 v) · exp[l (e0 + e1 v)], v = 1 − u, in g/cm². */
export const depthCoefficients = {
  denominator: [0.3687, 4.1592, 2.2941],
  exponent: [-0.105, 0.0589],
} as const;

/** Shape κ = k0 − k4 v⁴ of the depth distribution. */
export const shapeCoefficients = { constant: 1.6758, fourthPower: 0.2295 } as const;

/** K vacancies per electron, in L = ln(T0/69.525 − 1): by electrons directly and by bremsstrahlung. */
export const vacancyCoefficients = {
  direct: [-7.2856, 1.5222, -0.0795],
  indirect: [-6.569, 1.6173, -0.0482],
} as const;

/**
 * Depth of K vacancies. Direct: R0 w / (d0 + d1 √w), w = 1 − 69.525/T0, in g/cm²; indirect: a
 * polynomial in x = (T0 − 100)/100, in g/cm².
 */
export const vacancyDepthCoefficients = {
  directDenominator: [-0.3249, 7.9374],
  indirect: [0.05781, 0.04863, -0.00951],
} as const;

/** Shape of the two depth distributions. */
export const vacancyShape = { direct: 1.7, indirect: 0.6456 } as const;

/** Fluorescence yield of the tungsten K shell. */
export const kFluorescenceYield = 0.9538;

/** Tungsten K lines: energy and share of all K photons. */
export const kLines = [
  { name: 'Kα1', energy_keV: 59.318, share: 0.50243 },
  { name: 'Kα2', energy_keV: 57.981, share: 0.28917 },
  { name: 'Kβ1', energy_keV: 67.244, share: 0.10808 },
  { name: 'Kβ3', energy_keV: 66.95, share: 0.05588 },
  { name: 'Kβ2', energy_keV: 69.077, share: 0.03859 },
] as const;

/** c₀ + c₁ x + c₂ x² + … */
export const polynomial = (coefficients: readonly number[], x: number): number =>
  coefficients.reduceRight((sum, coefficient) => sum * x + coefficient, 0);

/** A physical constant with what is needed to trust it. `uncertainty` is one standard deviation. */
export interface Constant {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  readonly uncertainty: number;
  readonly reference: string;
}

const codata2018 = 'CODATA 2018 (Tiesinga et al., Rev. Mod. Phys. 93 (2021) 025010)';
const exactSi = 'exact by definition of the SI (2019)';

export const avogadro_per_mol = constant('Avogadro constant', 6.02214076e23, '1/mol', 0, exactSi);
export const elementaryCharge_C = constant('elementary charge', 1.602176634e-19, 'C', 0, exactSi);
export const planck_J_s = constant('Planck constant', 6.62607015e-34, 'J s', 0, exactSi);
export const lightSpeed_m_per_s = constant('speed of light', 299_792_458, 'm/s', 0, exactSi);
export const electronRestEnergy_keV = constant(
  'electron rest energy',
  510.99895,
  'keV',
  1.5e-7,
  codata2018,
);
export const classicalElectronRadius_cm = constant(
  'classical electron radius',
  2.8179403262e-13,
  'cm',
  1.3e-22,
  codata2018,
);
export const airEnergyPerIonPair_eV = constant(
  'mean energy expended in dry air per ion pair',
  33.97,
  'eV',
  0.05,
  'Boutillon & Perroche-Roux, Phys. Med. Biol. 32 (1987) 213; kept by ICRU Report 90 with 0.35 % uncertainty',
);
export const roentgen_C_per_kg = constant(
  'roentgen',
  2.58e-4,
  'C/kg',
  0,
  'exact by definition (ICRU, 1962)',
);

/** 1 keV in joule. */
export const joulePerKeV = derived(
  'kiloelectronvolt',
  1e3 * elementaryCharge_C.value,
  'J',
  'elementary charge × 1000 V',
);
/** Photon energy times wavelength, keV·Å. */
export const photonEnergyWavelength_keV_angstrom = derived(
  'photon energy times wavelength',
  (planck_J_s.value * lightSpeed_m_per_s.value * 1e10) / joulePerKeV.value,
  'keV Å',
  'h c / (1 keV)',
);
/** Twice the electron rest energy: the threshold of pair production, keV. */
export const pairThreshold_keV = derived(
  'pair production threshold',
  2 * electronRestEnergy_keV.value,
  'keV',
  '2 × electron rest energy',
);
/** Air kerma of an exposure of 1 R, mGy, radiative losses neglected. */
export const airKermaPerRoentgen_mGy = derived(
  'air kerma per roentgen',
  roentgen_C_per_kg.value * airEnergyPerIonPair_eV.value * 1e3,
  'mGy/R',
  'roentgen × mean energy per ion pair / elementary charge',
);
/** Thomson cross section of one electron, cm². */
export const thomsonCrossSection_cm2 = derived(
  'Thomson cross section',
  (8 * Math.PI * classicalElectronRadius_cm.value ** 2) / 3,
  'cm²',
  '8π/3 × classical electron radius²',
);

function constant(
  name: string,
  value: number,
  unit: string,
  uncertainty: number,
  reference: string,
): Constant {
  return Object.freeze({ name, value, unit, uncertainty, reference });
}

function derived(name: string, value: number, unit: string, formula: string): Constant {
  return constant(name, value, unit, 0, `computed: ${formula}`);
}

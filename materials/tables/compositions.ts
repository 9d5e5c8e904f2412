import type { MaterialFamily, Provenance } from '../material.js';

/** Where compositions and densities come from. */
export const compositionSources = {
  icru44: { source: 'ICRU Report 44 (1989) as used in NISTIR 5632', provenance: 'recalled' },
  icru46: { source: 'ICRU Report 46 (1992)', provenance: 'recalled' },
  icrp110: { source: 'ICRP Publication 110 (2009)', provenance: 'recalled' },
  star: { source: 'ICRP Publication 23 (1975) and ICRU compositions as tabulated by NIST STAR (Berger et al.)', provenance: 'published' },
  srd126: { source: 'NISTIR 5632 (Hubbell & Seltzer)', provenance: 'recalled' },
} as const satisfies Record<string, { source: string; provenance: Provenance }>;

/** One row of the table below. */
export interface Composition {
  readonly name: string;
  readonly family: MaterialFamily;
  readonly from: keyof typeof compositionSources;
  readonly density_g_per_cm3: number;
  readonly massFractions: Readonly<Record<string, number>>;
}

/**
 * Compositions by mass as published, rounded there. The ICRU 44 rows are recalled; with them the
 * attenuation of NISTIR 5632 is reproduced within 0.04 %. Deflated lung is lung tissue itself;
 * `lung` is the same tissue inflated (ICRU 44: 0.26 g/cm³).
 */
export const compositions: readonly Composition[] = [
  {
    name: 'soft tissue',
    family: 'soft tissue',
    from: 'icru44',
    density_g_per_cm3: 1.06,
    massFractions: { H: 0.102, C: 0.143, N: 0.034, O: 0.708, Na: 0.002, P: 0.003, S: 0.003, Cl: 0.002, K: 0.003 },
  },
  {
    name: 'soft tissue ICRU 46',
    family: 'soft tissue',
    from: 'icru46',
    density_g_per_cm3: 1.03,
    massFractions: { H: 0.105, C: 0.256, N: 0.027, O: 0.602, Na: 0.001, P: 0.002, S: 0.003, Cl: 0.002, K: 0.002 },
  },
  {
    name: 'soft tissue ICRP',
    family: 'soft tissue',
    from: 'star',
    density_g_per_cm3: 1,
    massFractions: { H: 0.104472, C: 0.23219, N: 0.02488, O: 0.630238, Na: 0.00113, Mg: 0.00013, P: 0.00133, S: 0.00199, Cl: 0.00134, K: 0.00199, Ca: 0.00023, Fe: 5e-05, Zn: 3e-05 },
  },
  {
    name: 'soft tissue ICRU four-component',
    family: 'soft tissue',
    from: 'star',
    density_g_per_cm3: 1,
    massFractions: { H: 0.101172, C: 0.111, N: 0.026, O: 0.761828 },
  },
  {
    name: 'muscle',
    family: 'soft tissue',
    from: 'icru44',
    density_g_per_cm3: 1.05,
    massFractions: { H: 0.102, C: 0.143, N: 0.034, O: 0.71, Na: 0.001, P: 0.002, S: 0.003, Cl: 0.001, K: 0.004 },
  },
  {
    name: 'muscle ICRP',
    family: 'soft tissue',
    from: 'star',
    density_g_per_cm3: 1.04,
    massFractions: { H: 0.100637, C: 0.10783, N: 0.02768, O: 0.754773, Na: 0.00075, Mg: 0.00019, P: 0.0018, S: 0.00241, Cl: 0.00079, K: 0.00302, Ca: 3e-05, Fe: 4e-05, Zn: 5e-05 },
  },
  {
    name: 'muscle ICRU striated',
    family: 'soft tissue',
    from: 'star',
    density_g_per_cm3: 1.04,
    massFractions: { H: 0.101997, C: 0.123, N: 0.035, O: 0.729003, Na: 0.0008, Mg: 0.0002, P: 0.002, S: 0.005, K: 0.003 },
  },
  {
    name: 'adipose',
    family: 'adipose',
    from: 'icru44',
    density_g_per_cm3: 0.95,
    massFractions: { H: 0.114, C: 0.598, N: 0.007, O: 0.278, Na: 0.001, S: 0.001, Cl: 0.001 },
  },
  {
    name: 'adipose ICRP',
    family: 'adipose',
    from: 'star',
    density_g_per_cm3: 0.92,
    massFractions: { H: 0.119477, C: 0.63724, N: 0.00797, O: 0.232333, Na: 0.0005, Mg: 2e-05, P: 0.00016, S: 0.00073, Cl: 0.00119, K: 0.00032, Ca: 2e-05, Fe: 2e-05, Zn: 2e-05 },
  },
  {
    name: 'blood',
    family: 'liquid',
    from: 'icru44',
    density_g_per_cm3: 1.06,
    massFractions: { H: 0.102, C: 0.11, N: 0.033, O: 0.745, Na: 0.001, P: 0.001, S: 0.002, Cl: 0.003, K: 0.002, Fe: 0.001 },
  },
  {
    name: 'blood ICRP',
    family: 'liquid',
    from: 'star',
    density_g_per_cm3: 1.06,
    massFractions: { H: 0.101866, C: 0.10002, N: 0.02964, O: 0.759414, Na: 0.00185, Mg: 4e-05, Si: 3e-05, P: 0.00035, S: 0.00185, Cl: 0.00278, K: 0.00163, Ca: 6e-05, Fe: 0.00046, Zn: 1e-05 },
  },
  {
    name: 'brain',
    family: 'soft tissue',
    from: 'icru44',
    density_g_per_cm3: 1.04,
    massFractions: { H: 0.107, C: 0.145, N: 0.022, O: 0.712, Na: 0.002, P: 0.004, S: 0.002, Cl: 0.003, K: 0.003 },
  },
  {
    name: 'brain ICRP',
    family: 'soft tissue',
    from: 'star',
    density_g_per_cm3: 1.03,
    massFractions: { H: 0.110667, C: 0.12542, N: 0.01328, O: 0.737723, Na: 0.00184, Mg: 0.00015, P: 0.00354, S: 0.00177, Cl: 0.00236, K: 0.0031, Ca: 9e-05, Fe: 5e-05, Zn: 1e-05 },
  },
  {
    name: 'breast',
    family: 'soft tissue',
    from: 'icru44',
    density_g_per_cm3: 1.02,
    massFractions: { H: 0.106, C: 0.332, N: 0.03, O: 0.527, Na: 0.001, P: 0.001, S: 0.002, Cl: 0.001 },
  },
  {
    name: 'lung',
    family: 'lung',
    from: 'icru44',
    density_g_per_cm3: 0.26,
    massFractions: { H: 0.103, C: 0.105, N: 0.031, O: 0.749, Na: 0.002, P: 0.002, S: 0.003, Cl: 0.003, K: 0.002 },
  },
  {
    name: 'lung deflated',
    family: 'lung',
    from: 'icru44',
    density_g_per_cm3: 1.05,
    massFractions: { H: 0.103, C: 0.105, N: 0.031, O: 0.749, Na: 0.002, P: 0.002, S: 0.003, Cl: 0.003, K: 0.002 },
  },
  {
    name: 'lung ICRP',
    family: 'lung',
    from: 'star',
    density_g_per_cm3: 1.05,
    massFractions: { H: 0.101278, C: 0.10231, N: 0.02865, O: 0.757072, Na: 0.00184, Mg: 0.00073, P: 0.0008, S: 0.00225, Cl: 0.00266, K: 0.00194, Ca: 9e-05, Fe: 0.00037, Zn: 1e-05 },
  },
  {
    name: 'liver',
    family: 'soft tissue',
    from: 'icru46',
    density_g_per_cm3: 1.06,
    massFractions: { H: 0.102, C: 0.139, N: 0.03, O: 0.716, Na: 0.002, P: 0.003, S: 0.003, Cl: 0.002, K: 0.003 },
  },
  {
    name: 'kidney',
    family: 'soft tissue',
    from: 'icru46',
    density_g_per_cm3: 1.05,
    massFractions: { H: 0.103, C: 0.132, N: 0.03, O: 0.724, Na: 0.002, P: 0.002, S: 0.002, Cl: 0.002, K: 0.002, Ca: 0.001 },
  },
  {
    name: 'skin',
    family: 'soft tissue',
    from: 'icru46',
    density_g_per_cm3: 1.09,
    massFractions: { H: 0.1, C: 0.204, N: 0.042, O: 0.645, Na: 0.002, P: 0.001, S: 0.002, Cl: 0.003, K: 0.001 },
  },
  {
    name: 'skin ICRP',
    family: 'soft tissue',
    from: 'star',
    density_g_per_cm3: 1.1,
    massFractions: { H: 0.100588, C: 0.22825, N: 0.04642, O: 0.619002, Na: 7e-05, Mg: 6e-05, P: 0.00033, S: 0.00159, Cl: 0.00267, K: 0.00085, Ca: 0.00015, Fe: 1e-05, Zn: 1e-05 },
  },
  {
    name: 'cortical bone',
    family: 'bone',
    from: 'icru44',
    density_g_per_cm3: 1.92,
    massFractions: { H: 0.034, C: 0.155, N: 0.042, O: 0.435, Na: 0.001, Mg: 0.002, P: 0.103, S: 0.003, Ca: 0.225 },
  },
  {
    name: 'cortical bone ICRP',
    family: 'bone',
    from: 'star',
    density_g_per_cm3: 1.85,
    massFractions: { H: 0.047234, C: 0.14433, N: 0.04199, O: 0.446096, Mg: 0.0022, P: 0.10497, S: 0.00315, Ca: 0.20993, Zn: 0.0001 },
  },
  {
    name: 'compact bone ICRU',
    family: 'bone',
    from: 'star',
    density_g_per_cm3: 1.85,
    massFractions: { H: 0.063984, C: 0.278, N: 0.027, O: 0.410016, Mg: 0.002, P: 0.07, S: 0.002, Ca: 0.147 },
  },
  {
    name: 'mineral bone ICRP 110',
    family: 'bone',
    from: 'icrp110',
    density_g_per_cm3: 1.92,
    massFractions: { H: 0.036, C: 0.159, N: 0.042, O: 0.448, Na: 0.003, Mg: 0.002, P: 0.094, S: 0.003, Ca: 0.213 },
  },
  {
    name: 'spongiosa',
    family: 'bone',
    from: 'icru46',
    density_g_per_cm3: 1.18,
    massFractions: { H: 0.085, C: 0.404, N: 0.028, O: 0.367, Na: 0.001, Mg: 0.001, P: 0.034, S: 0.002, Cl: 0.002, K: 0.001, Ca: 0.074, Fe: 0.001 },
  },
  {
    name: 'water',
    family: 'liquid',
    from: 'icru44',
    density_g_per_cm3: 1,
    massFractions: { H: 0.111898, O: 0.888102 },
  },
  {
    name: 'air',
    family: 'gas',
    from: 'icru44',
    density_g_per_cm3: 0.001205,
    massFractions: { C: 0.000124, N: 0.755268, O: 0.231781, Ar: 0.012827 },
  },
  {
    name: 'pmma',
    family: 'plastic',
    from: 'icru44',
    density_g_per_cm3: 1.19,
    massFractions: { H: 0.080541, C: 0.599846, O: 0.319613 },
  },
  {
    name: 'caesium iodide',
    family: 'detector',
    from: 'srd126',
    density_g_per_cm3: 4.51,
    massFractions: { I: 0.488451, Cs: 0.511549 },
  },
  {
    name: 'gadolinium oxysulfide',
    family: 'detector',
    from: 'srd126',
    density_g_per_cm3: 7.44,
    massFractions: { O: 0.084527, S: 0.084704, Gd: 0.830769 },
  },
  {
    name: 'cadmium telluride',
    family: 'detector',
    from: 'srd126',
    density_g_per_cm3: 6.2,
    massFractions: { Cd: 0.468358, Te: 0.531642 },
  },
];

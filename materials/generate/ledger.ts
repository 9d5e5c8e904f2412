import { eadlFiles } from './eadl.js';
import { momentumTransfers_per_angstrom } from './scattering-functions.js';

/** SHA-256 of an input, by the name the ledger gives it. */
export interface HashedInput {
  readonly name: string;
  readonly sha256: string;
}

/** The packed text as committed. */
export interface PackedOutput {
  readonly sha256: string;
  readonly bytes: number;
  readonly gzipBytes: number;
}

/** Names of the inputs, as they stand in the ledger. */
export const xcomFile = 'XCOM_CrossSections.dat';
export const scatteringInput = 'scattering functions, as sampled';

/** The ledger of materials/tables, line by line. */
export function ledger(
  inputs: readonly HashedInput[],
  output: PackedOutput,
  range_keV: { readonly from: number; readonly to: number },
): string[] {
  const hash = (name: string) => inputs.find((input) => input.name === name)?.sha256 ?? 'missing';
  const [firstNode] = momentumTransfers_per_angstrom;
  return [
    '# Ledger of the tables',
    '',
    'Written by `npm run materials`, which needs the Debian packages python-fisx-common (1.2.0) and',
    'python3-xraylib (4.0.0). Unchanged inputs leave this file and `elements.ts` unchanged.',
    '',
    '## elements.ts',
    '',
    `Elements 1 to 92, ${range_keV.from} keV to ${range_keV.to / 1000} MeV. Packed text: ${output.bytes} bytes, ${output.gzipBytes} with gzip.`,
    'Every value is a decimal of at most five digits and comes back digit for digit (pair production,',
    'given with seven digits, rounded to five: 5e-6 relative).',
    '',
    `SHA-256 of the packed text: \`${output.sha256}\``,
    '',
    '### Cross sections',
    '',
    '- Source: M. J. Berger and J. H. Hubbell, XCOM: Photon Cross Sections on a Personal Computer,',
    '  NBSIR 87-3597, National Bureau of Standards, 1987.',
    `- Input: \`${xcomFile}\` of python-fisx-common 1.2.0`,
    `  SHA-256 \`${hash(xcomFile)}\``,
    '- Licence: work of the United States government, public domain. Changed here: cut to the range',
    '  above; doubled rows that are no edge dropped; coherent and incoherent scattering kept at the',
    '  energies common to most elements only: the rows around edges are interpolated values, and a few',
    '  would bend a spline through them (Fr at 2.9999 keV repeats the row of 3 keV, Pa at 5.1807 keV',
    '  lies 5 % above its neighbours).',
    '- Provenance: published, read from the file.',
    '- Interpolation: coherent and incoherent natural cubic spline, log-log; photoelectric monotone',
    '  cubic, log-log, inside each edge segment, the upper value at an edge; pair production by a natural',
    '  cubic spline of ln(κ/(1 − 2mc²/E)³) over ln E, zero at and below 2mc².',
    '- Interpolation error, off the nodes, 5 to 800 keV, against xraylib 4.0.0: coherent and incoherent',
    '  below 0.04 % (0.1 % above 650 keV); total median 0.02 %, below 0.3 % for Z ≤ 20 and 1 % otherwise',
    '  (test/materials/xraylib.test.ts, which also names the exceptions below 5 keV).',
    '- Uncertainty of the data themselves: 1 to 2 % from 5 keV upward away from edges, more near edges',
    '  (NBSIR 87-3597; recalled).',
    '',
    '### Absorption edges',
    '',
    '- Energies and photoelectric coefficients on both sides from the cross sections above; the shell is',
    '  the one whose EADL97 binding energy is nearest.',
    '',
    '### Relaxation',
    '',
    '- Source: D. E. Cullen et al., Tables and Graphs of Atomic Subshell and Relaxation Data Derived from',
    '  the LLNL Evaluated Atomic Data Library (EADL), Z = 1–100, Lawrence Livermore National Laboratory,',
    '  UCRL-50400, Vol. 30, October 1991.',
    '- Inputs: EADL97 files of python-fisx-common 1.2.0',
    ...eadlFiles.map((name) => `  - \`${name}\` SHA-256 \`${hash(name)}\``),
    '- Licence: redistribution permitted by the author while the credit above is kept.',
    '- Provenance: published, read from the files. Kept: binding energies; K and L fluorescence yields;',
    '  Coster–Kronig probabilities; radiative rates above 1e-4 of their shell; from the nonradiative K',
    '  rates only the mean number of L1, L2 and L3 vacancies they leave.',
    '- Interpolation: none.',
    '',
    '### Form factor and incoherent scattering function',
    '',
    '- Source: J. H. Hubbell et al., J. Phys. Chem. Ref. Data 4 (1975) 471, as in EPDL97 (D. E. Cullen,',
    '  J. H. Hubbell, L. Kissel, UCRL-50400, Vol. 6, Rev. 5, 1997), through xraylib 4.0.0 (T. Schoonjans',
    '  et al., Spectrochim. Acta B 66 (2011) 776).',
    `- Input: \`${scatteringInput}\` by materials/generate/scattering-functions.py, five digits`,
    `  SHA-256 \`${hash(scatteringInput)}\``,
    '- Licence: xraylib is under the 3-clause BSD licence; the tables are public data.',
    '- Provenance: published, read through the library.',
    `- Range: ${momentumTransfers_per_angstrom.length} values of q = sin(θ/2)/λ, ${firstNode} to ${momentumTransfers_per_angstrom.at(-1)} 1/Å.`,
    '- Interpolation: natural cubic spline, log-log. Difference from the interpolation of xraylib between',
    '  the nodes: below 0.12 % for 0.01 < q < 2 1/Å, below 0.8 % up to 12 1/Å.',
    '',
    '## element-facts.ts',
    '',
    '- Atomic weights: T. Prohaska et al., Pure Appl. Chem. 94 (2022) 573 (IUPAC 2021). Densities: J. H.',
    '  Hubbell and S. M. Seltzer, NISTIR 5632, Table 1. Both facts without licence; provenance: recalled,',
    '  held against xraylib 4.0.0 by test/materials/elements.test.ts.',
    '',
    '## compositions.ts',
    '',
    '- ICRU Report 44 (1989), ICRU Report 46 (1992), ICRP Publication 110 (2009): recalled. ICRP',
    '  Publication 23 (1975) and ICRU compositions as tabulated by NIST STAR: published. The source stands',
    '  beside each row; compared with test/reference/compositions.csv by test/materials/compositions.test.ts.',
  ];
}

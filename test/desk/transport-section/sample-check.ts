import type { CheckState } from '../../../components/desk/transport-section/check-state.js';
import { checkBasis } from '../../../components/desk/transport-section/check-state.js';
import {
  type CheckReport,
  type CheckRow,
  judge,
  photonsToDecide,
} from '../../../physics/check-by-transport/index.js';
import { sampleCase } from '../sample/case.js';

/** An invented row: estimate, transport and its standard error. */
const row = (
  quantity: CheckRow['quantity'],
  name: string,
  estimate: number | null,
  value: number,
  standardError: number,
  tolerance_percent: number | null,
  layer: string | null = null,
): CheckRow => {
  const transport = { value, standardError };
  const compared = estimate !== null && tolerance_percent !== null;
  return {
    quantity,
    layer,
    name,
    unit: layer ? 'mGy' : '',
    estimate,
    transport,
    tolerance_percent,
    ...(compared
      ? judge(estimate, transport, tolerance_percent)
      : { difference_percent: null, z: null, verdict: null }),
    photonsToDecide: compared
      ? photonsToDecide(estimate, transport, tolerance_percent, 400_000)
      : null,
  };
};

const rows: readonly CheckRow[] = [
  row('spr', 'Scatter to primary, no grid', 3.1, 3.15, 0.02, 10),
  row('sprBehindGrid', 'Scatter to primary, behind grid', 0.62, 0.61, 0.09, 13),
  row('backscatterFactor', 'Backscatter factor', 1.52, 1.4, 0.004, 3),
  row('energyImparted', 'Energy imparted', 11.9, 11.8, 0.02, 4),
  row('layerAbsorbedDose', 'Absorbed dose', 1.9, 1.91, 0.01, 6, 'front'),
  row('layerAbsorbedDose', 'Absorbed dose', 0.9, 0.89, 0.01, 6, 'abdomen'),
  row('columnAbsorbedDose', 'Absorbed dose, central column', null, 1.7, 0.02, null, 'front'),
  row('columnAbsorbedDose', 'Absorbed dose, central column', null, 0.7, 0.02, null, 'abdomen'),
];

const spr = { value: 3.15, standardError: 0.02 };

/** Invented results of a run that has come to 400 000 of a million photons. */
export const sampleReport: CheckReport = {
  technique: 'Current',
  size: 'median',
  setting: '80 kV, no filter, grid in',
  photons: 400_000,
  ofPhotons: 1_000_000,
  seed: 1,
  isComplete: false,
  spr,
  sprBehindGrid: { value: 0.61, standardError: 0.09 },
  scatterFraction: 0.76,
  components: { firstCompton: spr, firstRayleigh: spr, multiple: spr },
  energyBalance: {
    absorbed: 0.77,
    escapedEntrance: 0.215,
    escapedSide: 0,
    transmittedPrimary: 0.003,
    transmittedScatter: 0.012,
    sum: 1,
  },
  backscatterFactor: { value: 1.4, standardError: 0.004 },
  layers: [],
  estimate: {
    spr: 3.1,
    sprBehindGrid: 0.62,
    scatterFraction: 0.756,
    backscatterFactor: 1.52,
    energyImparted_mJ: 11.9,
    layerAbsorbedDose_mGy: [1.9, 0.9],
    layerAbsorbedFraction: [0.2, 0.5],
  },
  photonsPerSecond: 250_000,
  rows,
  isBalanced: true,
  findings: [
    {
      code: 'checkSides',
      severity: 'note',
      message: 'The estimate takes its layers without sides.',
    },
  ],
};

const request = { technique: 'Current', size: 'median', photons: 1_000_000, seed: 1 };

/** A run under way on the invented case. */
export const sampleCheck: CheckState = {
  request,
  basis: checkBasis(sampleCase, 'Current'),
  phase: 'flying',
  report: sampleReport,
  history: [25_000, 100_000, 400_000].map((photons) => ({
    photons,
    values: rows.map(({ transport: { value, standardError } }) => ({
      value,
      standardError: (standardError ?? 0) * Math.sqrt(400_000 / photons),
    })),
  })),
  tracks: [
    {
      points: Float32Array.from([0, 0, -76, 60, 1, 0, 4, 0]),
      kinds: Uint8Array.of(0, 1),
      isDetected: false,
    },
  ],
  fates: {
    unscattered: 1,
    scattered: 2,
    absorbed: 222,
    absorbedOutside: 14,
    turnedBack: 61,
    leftSide: 0,
  },
  message: '',
};

import type {
  Comparison,
  Evaluation,
  Finding,
  HoldConstant,
  Ratios,
  Weighing,
} from '../../../physics/results.js';
import { sampleCase } from './case.js';

/** Invented results with the shape of real ones, for component tests: nothing here was computed. */
const evaluation = (
  technique: string,
  size: string,
  thickness_mm: number,
  own: Own,
): Evaluation => ({
  technique,
  size,
  thickness_mm,
  setting: { potential_kV: own.potential_kV, filter: own.filter, grid: 'in' },
  beam: {
    potential_kV: own.potential_kV,
    halfValueLayers: [
      {
        material: 'aluminium',
        first_mm: own.hvl_mm,
        second_mm: own.hvl_mm * 1.4,
        tenth_mm: own.hvl_mm * 4.1,
      },
      {
        material: 'copper',
        first_mm: own.hvl_mm / 28,
        second_mm: own.hvl_mm / 19,
        tenth_mm: own.hvl_mm / 6,
      },
    ],
    homogeneityCoefficient: 0.71,
    meanEnergy_keV: own.meanEnergy_keV,
    effectiveEnergy_keV: own.meanEnergy_keV - 9,
    airKerma_uGy_per_mAs: own.output,
    fluence_per_mm2_per_mAs: own.output * 30000,
  },
  transmission: {
    primary: own.transmission,
    exitMeanEnergy_keV: own.meanEnergy_keV + 7,
    layers: [
      {
        layer: 'front',
        own: 0.58,
        cumulative: 0.58,
        meanEnergy_keV: own.meanEnergy_keV + 1,
        effectiveEnergy_keV: null,
        cumulativeByNumber: 0.6,
        cumulativeByEnergyFluence: 0.61,
      },
      {
        layer: 'abdomen',
        own: 0.021,
        cumulative: 0.0122,
        meanEnergy_keV: own.meanEnergy_keV + 6,
        effectiveEnergy_keV: null,
        cumulativeByNumber: 0.02,
        cumulativeByEnergyFluence: 0.022,
      },
      {
        layer: 'spine',
        own: 0.4,
        cumulative: own.transmission,
        meanEnergy_keV: own.meanEnergy_keV + 7,
        effectiveEnergy_keV: null,
        cumulativeByNumber: 0.009,
        cumulativeByEnergyFluence: 0.01,
      },
    ],
  },
  scatter: {
    spr: own.spr,
    scatterFraction: own.spr / (1 + own.spr),
    sprBehindGrid: own.spr / 5.6,
    method: 'estimate',
  },
  grid: {
    primaryTransmission: 0.69,
    scatterTransmission: 0.12,
    totalTransmission: 0.25,
    selectivity: 5.6,
    buckyFactor: own.bucky,
    contrastImprovement: 2.7,
    snrImprovement: 1.37,
  },
  contrast: {
    subject: own.subject,
    logarithmic: own.subject * 1.08,
    detected: own.subject * 0.6,
    degradationFactor: 0.6,
    iodineEquivalent_mg_per_cm2: 72,
  },
  noise: { quantum: 0.0082, electronic: 0.0004, structure: 0.001, background: 0, total: 0.0084 },
  sdnr: own.sdnr,
  dose: {
    incidentAirKerma_mGy: own.kerma_mGy,
    backscatterFactor: 1.5,
    entranceSurfaceAirKerma_mGy: own.kerma_mGy * 1.5,
    kermaAreaProduct_Gycm2: own.kerma_mGy * 0.31,
    referenceAirKerma_mGy: own.kerma_mGy * 1.6,
    energyImparted_mJ: own.kerma_mGy * 3.1,
    meanAbsorbedDose_mGy: own.kerma_mGy * 0.34,
    layerAbsorbedDose_mGy: [],
    skinAbsorbedDose_mGy: own.kerma_mGy * 1.46,
    incidentAirKermaRate_mGy_per_min: own.kerma_mGy * 180,
    perRun: {
      incidentAirKerma_mGy: own.kerma_mGy * 13,
      referenceAirKerma_mGy: own.kerma_mGy * 20.8,
      kermaAreaProduct_Gycm2: own.kerma_mGy * 4.03,
      energyImparted_mJ: own.kerma_mGy * 40.3,
    },
  },
  detector: { airKerma_uGy: 2.5, absorbedFraction: 0.71, signal_keV_per_mm2: 1.9e6 },
  unsharpness: { focalSpot_mm: 0.2, pixel_mm: 0.15, motion_mm: 0, total_mm: 0.25 },
  exposure: {
    tubeLoad_mAs: own.load_mAs,
    tubeCurrent_mA: own.load_mAs / 0.08,
    exposureTime_ms: 80,
    power_kW: ((own.load_mAs / 0.08) * own.potential_kV) / 1000,
  },
  figureOfMerit: {
    perIncidentAirKerma_per_mGy: own.sdnr ** 2 / own.kerma_mGy,
    perKermaAreaProduct_per_Gycm2: own.sdnr ** 2 / own.kerma_mGy / 0.31,
    perEnergyImparted_per_mJ: null,
    perMeanAbsorbedDose_per_mGy: null,
    perTubeEnergy_per_kJ: 50,
    perElementMass_per_g: null,
  },
  findings: own.findings,
});

interface Own {
  potential_kV: number;
  filter: string;
  hvl_mm: number;
  meanEnergy_keV: number;
  output: number;
  transmission: number;
  spr: number;
  bucky: number;
  subject: number;
  sdnr: number;
  kerma_mGy: number;
  load_mAs: number;
  findings: Finding[];
}

const later: Finding = {
  code: 'lateralInfinite',
  severity: 'note',
  message: 'Layers are laterally infinite.',
};
const current: Own = {
  potential_kV: 80,
  filter: 'none',
  hvl_mm: 2.95,
  meanEnergy_keV: 44.1,
  output: 62,
  transmission: 0.0051,
  spr: 3.5,
  bucky: 4.02,
  subject: 0.148,
  sdnr: 9.8,
  kerma_mGy: 1.42,
  load_mAs: 21,
  findings: [later],
};
const proposed: Own = {
  potential_kV: 70,
  filter: '0.2 Cu',
  hvl_mm: 4.41,
  meanEnergy_keV: 48.6,
  output: 21,
  transmission: 0.0074,
  spr: 3.4,
  bucky: 3.94,
  subject: 0.163,
  sdnr: 8.9,
  kerma_mGy: 0.58,
  load_mAs: 40,
  findings: [later],
};
const power: Finding = {
  code: 'tubePower',
  severity: 'limit',
  value: 96,
  bound: 80,
  nearest: '73 kV, 0.1 Cu',
  path: 'room.tube.power_kW',
  message:
    'Proposed at size large needs 96 kW; the room has 80 kW. Nearest allowed: 73 kV with 0.1 Cu.',
};

const ratio = (incident: number, load: number, sdnr: number): Ratios => ({
  incidentAirKerma: incident,
  entranceSurfaceAirKerma: null,
  kermaAreaProduct: incident,
  energyImparted: null,
  meanAbsorbedDose: null,
  tubeLoad: load,
  power: (load * 70) / 80,
  sdnr,
  subjectContrast: 1.1,
  detectedContrast: 1.11,
});
const row = (holdConstant: HoldConstant, ratios: Ratios, findings: Finding[] = []) => ({
  holdConstant,
  ratio: ratios,
  findings,
});
const comparison = (size: string): Comparison => ({
  size,
  from: 'Current',
  to: 'Proposed',
  rows: [
    row('asSet', ratio(0.41, 1.9, 0.91)),
    row('sdnr', ratio(0.5, 2.3, 1)),
    row('detectorAirKerma', ratio(0.41, 1.9, 0.91), [
      {
        code: 'sdnrNotEqual',
        severity: 'caution',
        message: 'At equal detector air kerma the saving looks larger because SdNR falls by 9 %.',
      },
    ]),
    row('detectorSignal', ratio(0.42, 1.95, 0.92)),
    row('incidentAirKerma', ratio(1, 4.6, 1.42)),
    row('tubeLoad', ratio(0.22, 1, 0.66)),
  ],
});

export const sampleWeighing: Weighing = {
  case: { hash: '0'.repeat(64), title: sampleCase.title },
  version: 'sample',
  assumed: ['room.detector.opticalSwank', 'room.tube.anodeAngle_deg'],
  calibration: {
    outputFactor: 0.84,
    outputExponent: 0.02,
    inherentFilter_mmAl: 2.61,
    findings: [],
    residuals: [
      {
        path: 'room.readings[0]',
        potential_kV: 60,
        quantity: 'halfValueLayer_mmAl',
        measured: 2.24,
        model: 2.26,
        relative_percent: 0.9,
      },
      {
        path: 'room.readings[0]',
        potential_kV: 60,
        quantity: 'airKerma_uGy_per_mAs',
        measured: 33.1,
        model: 32.9,
        relative_percent: -0.6,
      },
    ],
  },
  evaluations: [
    evaluation('Current', 'median', 202, current),
    evaluation('Current', 'large', 290, { ...current, kerma_mGy: 9.1, load_mAs: 78, sdnr: 7.1 }),
    evaluation('Proposed', 'median', 202, proposed),
    evaluation('Proposed', 'large', 290, {
      ...proposed,
      kerma_mGy: 4.2,
      load_mAs: 110,
      sdnr: 6.2,
      findings: [power],
    }),
  ],
  comparisons: [comparison('median'), comparison('large')],
  findings: [],
};

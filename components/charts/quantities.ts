import type { Evaluation, Ratios } from '../../physics/results.js';

/** Stations along the beam, in their order. */
export const quantityGroups = [
  'beam',
  'exposure',
  'dose',
  'detail',
  'scatter and grid',
  'detector',
  'merit',
] as const;
export type QuantityGroup = (typeof quantityGroups)[number];

/**
 * Every number the desk and the dossier show: its name, unit, what it is per, how it is computed in
 * words, and where it stands in an evaluation. One entry here is one row anywhere.
 */
export interface Quantity {
  readonly id: string;
  readonly name: string;
  readonly unit: string;
  /** Where it acts along the beam; tables set groups apart. */
  readonly group: QuantityGroup;
  /** Per frame or per run where that must be said, else empty. */
  readonly per: '' | 'per frame' | 'per run' | 'per minute';
  /** The computation in words, for someone who wants to check it. */
  readonly words: string;
  readonly of: (evaluation: Evaluation) => number | null;
}

const q = (
  group: QuantityGroup,
  id: string,
  name: string,
  unit: string,
  per: Quantity['per'],
  of: Quantity['of'],
  words: string,
): Quantity => ({ group, id, name, unit, per, of, words });

const halfValue = (evaluation: Evaluation, material: string) =>
  evaluation.beam.halfValueLayers.find((row) => row.material === material) ?? null;

export const quantities = [
  q(
    'beam',
    'halfValueLayer',
    'Half-value layer',
    'mm Al',
    '',
    (e) => halfValue(e, 'aluminium')?.first_mm ?? null,
    'Aluminium that halves the air kerma of the beam leaving tube and filter, in narrow beam.',
  ),
  q(
    'beam',
    'meanEnergy',
    'Mean energy of the beam',
    'keV',
    '',
    (e) => e.beam.meanEnergy_keV,
    'Mean photon energy of the beam leaving tube and filter, weighted by photon number.',
  ),
  q(
    'beam',
    'exitMeanEnergy',
    'Mean energy behind the patient',
    'keV',
    '',
    (e) => e.transmission.exitMeanEnergy_keV,
    'Mean photon energy of the primary beam at the exit face, after all layers have hardened it.',
  ),
  q(
    'beam',
    'primaryTransmission',
    'Primary transmission',
    '',
    '',
    (e) => e.transmission.primary,
    'Air kerma at the exit face over air kerma at the skin, primary photons only, inverse square removed.',
  ),
  q(
    'exposure',
    'tubeLoad',
    'Tube load',
    'mAs',
    'per frame',
    (e) => e.exposure.tubeLoad_mAs,
    'Tube current times exposure time that the control needs to reach what it holds.',
  ),
  q(
    'exposure',
    'tubeCurrent',
    'Tube current',
    'mA',
    '',
    (e) => e.exposure.tubeCurrent_mA,
    'Tube load divided by exposure time, as the acquisition fixes one of the two.',
  ),
  q(
    'exposure',
    'exposureTime',
    'Exposure time',
    'ms',
    'per frame',
    (e) => e.exposure.exposureTime_ms,
    'Tube load divided by tube current, as the acquisition fixes one of the two.',
  ),
  q(
    'exposure',
    'power',
    'Power',
    'kW',
    '',
    (e) => e.exposure.power_kW,
    'Tube current times potential.',
  ),
  q(
    'dose',
    'incidentAirKerma',
    'Incident air kerma',
    'mGy',
    'per frame',
    (e) => e.dose.incidentAirKerma_mGy,
    'Air kerma on the axis at the skin, behind the support, without backscatter.',
  ),
  q(
    'dose',
    'entranceSurfaceAirKerma',
    'Entrance surface air kerma',
    'mGy',
    'per frame',
    (e) => e.dose.entranceSurfaceAirKerma_mGy,
    'Incident air kerma times the backscatter factor of this beam, field and stack.',
  ),
  q(
    'dose',
    'backscatterFactor',
    'Backscatter factor',
    '',
    '',
    (e) => e.dose.backscatterFactor,
    'Entrance surface air kerma over incident air kerma.',
  ),
  q(
    'dose',
    'referenceAirKerma',
    'Reference air kerma',
    'mGy',
    'per frame',
    (e) => e.dose.referenceAirKerma_mGy,
    'Air kerma at the room’s reference point, without backscatter.',
  ),
  q(
    'dose',
    'kermaAreaProduct',
    'Kerma-area product',
    'Gy cm²',
    'per frame',
    (e) => e.dose.kermaAreaProduct_Gycm2,
    'Incident air kerma times the area of the field at the skin.',
  ),
  q(
    'dose',
    'energyImparted',
    'Energy imparted',
    'mJ',
    'per frame',
    (e) => e.dose.energyImparted_mJ,
    'Energy of the beam that stays in the patient, primary and scattered.',
  ),
  q(
    'dose',
    'meanAbsorbedDose',
    'Mean absorbed dose',
    'mGy',
    'per frame',
    (e) => e.dose.meanAbsorbedDose_mGy,
    'Energy imparted over the mass of the irradiated stack.',
  ),
  q(
    'dose',
    'skinAbsorbedDose',
    'Skin absorbed dose',
    'mGy',
    'per frame',
    (e) => e.dose.skinAbsorbedDose_mGy,
    'Entrance surface air kerma times the ratio of mass energy absorption, skin over air.',
  ),
  q(
    'dose',
    'incidentAirKermaRate',
    'Incident air kerma rate',
    'mGy/min',
    'per minute',
    (e) => e.dose.incidentAirKermaRate_mGy_per_min,
    'Incident air kerma per frame times the frame rate.',
  ),
  q(
    'dose',
    'runIncidentAirKerma',
    'Incident air kerma',
    'mGy',
    'per run',
    (e) => e.dose.perRun.incidentAirKerma_mGy,
    'Incident air kerma per frame times all frames of the run, masks counted.',
  ),
  q(
    'dose',
    'runKermaAreaProduct',
    'Kerma-area product',
    'Gy cm²',
    'per run',
    (e) => e.dose.perRun.kermaAreaProduct_Gycm2,
    'Kerma-area product per frame times all frames of the run, masks counted.',
  ),
  q(
    'detail',
    'subjectContrast',
    'Subject contrast',
    '',
    '',
    (e) => e.contrast.subject,
    'Primary signal without the detail less with it, over without; negative when the detail is more transparent.',
  ),
  q(
    'detail',
    'detectedContrast',
    'Detected contrast',
    '',
    '',
    (e) => e.contrast.detected,
    'Subject contrast after scatter behind the grid and glare have diluted it.',
  ),
  q(
    'detail',
    'contrastDegradation',
    'Contrast degradation factor',
    '',
    '',
    (e) => e.contrast.degradationFactor,
    'Detected over subject contrast.',
  ),
  q(
    'detail',
    'iodineEquivalent',
    'Iodine equivalent',
    'mg/cm²',
    '',
    (e) => e.contrast.iodineEquivalent_mg_per_cm2,
    'Areal density of iodine that gives the same subject contrast in this beam behind this stack.',
  ),
  q(
    'scatter and grid',
    'spr',
    'Scatter to primary',
    '',
    '',
    (e) => e.scatter.spr,
    'Detector signal from scattered photons over that from primary ones at the field centre, no grid.',
  ),
  q(
    'scatter and grid',
    'sprBehindGrid',
    'Scatter to primary, behind grid',
    '',
    '',
    (e) => e.scatter.sprBehindGrid,
    'The same behind the grid where it is in.',
  ),
  q(
    'scatter and grid',
    'buckyFactor',
    'Bucky factor',
    '',
    '',
    (e) => e.grid?.buckyFactor ?? null,
    'One over the grid’s total transmission in this beam behind this stack.',
  ),
  q(
    'scatter and grid',
    'selectivity',
    'Grid selectivity',
    '',
    '',
    (e) => e.grid?.selectivity ?? null,
    'Transmission of primary over transmission of scatter.',
  ),
  q(
    'scatter and grid',
    'snrImprovement',
    'SNR improvement factor',
    '',
    '',
    (e) => e.grid?.snrImprovement ?? null,
    'Primary transmission over the square root of total transmission; below 1 the grid costs more than it gives.',
  ),
  q(
    'detector',
    'detectorAirKerma',
    'Detector air kerma',
    'µGy',
    'per frame',
    (e) => e.detector.airKerma_uGy,
    'Primary and scatter behind the grid, before the detector cover, at the field centre.',
  ),
  q(
    'detector',
    'absorbedFraction',
    'Absorbed in the detector',
    '',
    '',
    (e) => e.detector.absorbedFraction,
    'Share of the primary photons’ energy that the detector absorbs.',
  ),
  q(
    'detector',
    'noise',
    'Noise',
    '',
    '',
    (e) => e.noise.total,
    'Relative standard deviation of the signal over the detail: quantum, electronic, structure and background together.',
  ),
  q(
    'detector',
    'sdnr',
    'SdNR',
    '',
    '',
    (e) => e.sdnr,
    'Signal difference to noise ratio of the detail over its own area.',
  ),
  q(
    'merit',
    'meritKerma',
    'SdNR² per incident air kerma',
    '/mGy',
    '',
    (e) => e.figureOfMerit.perIncidentAirKerma_per_mGy,
    'SdNR squared over incident air kerma per frame: does not change with load while noise is quantum noise.',
  ),
  q(
    'merit',
    'meritKap',
    'SdNR² per kerma-area product',
    '/(Gy cm²)',
    '',
    (e) => e.figureOfMerit.perKermaAreaProduct_per_Gycm2,
    'SdNR squared over kerma-area product per frame.',
  ),
  q(
    'merit',
    'meritTube',
    'SdNR² per tube energy',
    '/kJ',
    '',
    (e) => e.figureOfMerit.perTubeEnergy_per_kJ,
    'SdNR squared over the electrical energy put into the tube per frame.',
  ),
] as const;

/** The quantity called `id`; asking for one that is not there is a programming error. */
export function quantity(id: string): Quantity {
  const found = quantities.find((entry) => entry.id === id);
  if (!found) throw new Error(`no quantity called ${id}`);
  return found;
}

/** Names of the ratios in a comparison, in the order they are set. */
export const ratioNames: readonly (readonly [keyof Ratios, string])[] = [
  ['incidentAirKerma', 'incident air kerma'],
  ['entranceSurfaceAirKerma', 'entrance surface air kerma'],
  ['kermaAreaProduct', 'kerma-area product'],
  ['energyImparted', 'energy imparted'],
  ['meanAbsorbedDose', 'mean absorbed dose'],
  ['tubeLoad', 'tube load'],
  ['power', 'power'],
  ['subjectContrast', 'subject contrast'],
  ['detectedContrast', 'detected contrast'],
  ['sdnr', 'SdNR'],
];

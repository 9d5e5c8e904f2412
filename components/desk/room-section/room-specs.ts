import { materialNames } from '../../../materials/index.js';
import { choiceSpec, type FieldSpec, numberSpec } from '../fields/field-specs.js';
import type { PairSpec } from '../fields/pair-fields.js';

/** A group of fields under one heading. */
export interface FieldGroup {
  readonly heading: string;
  readonly fields: readonly FieldSpec[];
}

const tube = 'room.tube';
const geometry = 'room.geometry';
const grid = 'room.grid';
const detector = 'room.detector';

export const tubeGroup: FieldGroup = {
  heading: 'Tube and generator',
  fields: [
    numberSpec(`${tube}.anodeAngle_deg`, 'Anode angle', '°'),
    numberSpec(`${tube}.ripple_percent`, 'Ripple', '%'),
    numberSpec(`${tube}.outputFactor`, 'Output factor, uncalibrated', '', 0.01),
    numberSpec(`${tube}.focalSpot_mm`, 'Focal spot', 'mm', 0.1),
    numberSpec(`${tube}.potential_kV.min`, 'Least potential', 'kV'),
    numberSpec(`${tube}.potential_kV.max`, 'Greatest potential', 'kV'),
    numberSpec(`${tube}.potential_kV.step`, 'Potential step', 'kV'),
    numberSpec(`${tube}.power_kW`, 'Greatest power', 'kW'),
    numberSpec(`${tube}.current_mA.min`, 'Least current', 'mA', 10),
    numberSpec(`${tube}.current_mA.max`, 'Greatest current', 'mA', 10),
    numberSpec(`${tube}.exposureTime_ms.min`, 'Least exposure time', 'ms'),
    numberSpec(`${tube}.exposureTime_ms.max`, 'Greatest exposure time', 'ms', 10),
    numberSpec(`${tube}.heatPerRun_kJ`, 'Anode heat per run', 'kJ', 10, 'not entered'),
  ],
};

export const geometryGroup: FieldGroup = {
  heading: 'Geometry',
  fields: [
    choiceSpec(`${geometry}.beam`, 'Beam', ['point', 'parallel']),
    numberSpec(`${geometry}.sourceToDetector_mm`, 'Source to detector', 'mm', 10),
    numberSpec(`${geometry}.exitToDetector_mm`, 'Exit face to detector', 'mm', 10),
    numberSpec(`${geometry}.minSourceToSkin_mm`, 'Least source to skin', 'mm', 10),
    numberSpec(`${geometry}.referencePoint_mm`, 'Reference point from source', 'mm', 10),
    choiceSpec(`${geometry}.anchor`, 'Thicker patients grow away from', [
      'detector',
      'table',
      'isocentre',
    ]),
    numberSpec(`${geometry}.field_mm[0]`, 'Field width at detector', 'mm', 10),
    numberSpec(`${geometry}.field_mm[1]`, 'Field height at detector', 'mm', 10),
  ],
};

export const gridGroup: FieldGroup = {
  heading: 'Grid',
  fields: [
    numberSpec(`${grid}.ratio`, 'Ratio', ': 1'),
    numberSpec(`${grid}.strips_per_cm`, 'Strips', 'per cm'),
    choiceSpec(`${grid}.strip.material`, 'Strip', materialNames),
    numberSpec(`${grid}.strip.thickness_um`, 'Strip thickness', 'µm'),
    choiceSpec(`${grid}.interspace.material`, 'Interspace', materialNames),
  ],
};

/** Transmissions the user measured, which stand in for the model's: both or neither. */
export const measuredGrid: PairSpec = {
  path: `${grid}.measured`,
  keys: ['primaryTransmission', 'scatterTransmission'],
  labels: ['Primary transmission', 'Scatter transmission'],
  unit: '',
  step: 0.01,
  empty: 'not measured',
};

export const detectorGroup: FieldGroup = {
  heading: 'Detector',
  fields: [
    choiceSpec(`${detector}.material`, 'Material', ['ideal', ...materialNames]),
    numberSpec(`${detector}.arealDensity_mg_per_cm2`, 'Areal density', 'mg/cm²', 5),
    choiceSpec(`${detector}.response`, 'Response', ['energy-integrating', 'counting']),
    numberSpec(`${detector}.countingThreshold_keV`, 'Counting threshold', 'keV'),
    numberSpec(`${detector}.opticalSwank`, 'Optical Swank factor', '', 0.01),
    numberSpec(`${detector}.electronicNoiseKerma_uGy`, 'Electronic noise equals', 'µGy', 0.001),
    choiceSpec(`${detector}.electronicNoiseBeam`, 'measured in beam', [
      'RQA2',
      'RQA3',
      'RQA4',
      'RQA5',
      'RQA6',
      'RQA7',
      'RQA8',
      'RQA9',
      'RQA10',
    ]),
    numberSpec(`${detector}.structureNoise_fraction`, 'Structure noise', 'of signal', 0.001),
    numberSpec(`${detector}.glare_fraction`, 'Glare', 'of signal', 0.01),
    numberSpec(`${detector}.pixel_mm`, 'Pixel', 'mm', 0.01),
    numberSpec(`${detector}.airKerma_uGy.min`, 'Least air kerma', 'µGy', 0.01),
    numberSpec(`${detector}.airKerma_uGy.max`, 'Greatest air kerma', 'µGy'),
  ],
};

import type { Evaluation } from '../../physics/results.js';

/** A quantity of an evaluation: its name, no other's, its unit, and where it stands in the JSON. */
export interface Quantity {
  readonly name: string;
  readonly unit: string;
  /** Path in the evaluation, also the column heading of the CSV table. */
  readonly path: string;
}

type Row = readonly [name: string, unit: string, path: string];

const sections: readonly (readonly [heading: string, rows: readonly Row[]])[] = [
  [
    'Beam behind tube and filter',
    [
      ['first half-value layer, in vacuum', 'mm Al', 'beam.halfValueLayers.0.first_mm'],
      ['homogeneity coefficient', '', 'beam.homogeneityCoefficient'],
      ['mean energy', 'keV', 'beam.meanEnergy_keV'],
      ['effective energy', 'keV', 'beam.effectiveEnergy_keV'],
      ['air kerma at 1 m, in vacuum', 'µGy/mAs', 'beam.airKerma_uGy_per_mAs'],
      ['fluence at 1 m, in vacuum', '1/(mm² mAs)', 'beam.fluence_per_mm2_per_mAs'],
    ],
  ],
  [
    'Patient',
    [
      ['patient, primary transmission', '', 'transmission.primary'],
      ['mean energy at exit', 'keV', 'transmission.exitMeanEnergy_keV'],
      ['scatter-to-primary ratio', '', 'scatter.spr'],
      ['scatter fraction', '', 'scatter.scatterFraction'],
    ],
  ],
  [
    'Grid',
    [
      ['grid, primary transmission', '', 'grid.primaryTransmission'],
      ['grid, scatter transmission', '', 'grid.scatterTransmission'],
      ['grid, total transmission', '', 'grid.totalTransmission'],
      ['grid, selectivity', '', 'grid.selectivity'],
      ['grid, Bucky factor', '', 'grid.buckyFactor'],
      ['grid, contrast improvement', '', 'grid.contrastImprovement'],
      ['grid, SNR improvement', '', 'grid.snrImprovement'],
      ['scatter-to-primary ratio behind grid', '', 'scatter.sprBehindGrid'],
    ],
  ],
  [
    'Detector, per frame',
    [
      ['detector air kerma', 'µGy', 'detector.airKerma_uGy'],
      ['absorbed fraction', '', 'detector.absorbedFraction'],
      ['detector signal', 'keV/mm²', 'detector.signal_keV_per_mm2'],
    ],
  ],
  [
    'What it shows',
    [
      ['subject contrast', '', 'contrast.subject'],
      ['contrast degradation factor', '', 'contrast.degradationFactor'],
      ['detected contrast', '', 'contrast.detected'],
      ['iodine equivalent', 'mg/cm²', 'contrast.iodineEquivalent_mg_per_cm2'],
      ['relative noise, quantum', '', 'noise.quantum'],
      ['relative noise, electronic', '', 'noise.electronic'],
      ['relative noise, structure', '', 'noise.structure'],
      ['relative noise, background', '', 'noise.background'],
      ['relative noise, total', '', 'noise.total'],
      ['SdNR', '', 'sdnr'],
    ],
  ],
  [
    'What it costs, per frame',
    [
      ['incident air kerma', 'mGy', 'dose.incidentAirKerma_mGy'],
      ['backscatter factor', '', 'dose.backscatterFactor'],
      ['entrance surface air kerma', 'mGy', 'dose.entranceSurfaceAirKerma_mGy'],
      ['skin absorbed dose', 'mGy', 'dose.skinAbsorbedDose_mGy'],
      ['kerma–area product', 'Gy cm²', 'dose.kermaAreaProduct_Gycm2'],
      ['reference air kerma', 'mGy', 'dose.referenceAirKerma_mGy'],
      ['energy imparted', 'mJ', 'dose.energyImparted_mJ'],
      ['mean absorbed dose', 'mGy', 'dose.meanAbsorbedDose_mGy'],
      ['tube load', 'mAs', 'exposure.tubeLoad_mAs'],
      ['tube current', 'mA', 'exposure.tubeCurrent_mA'],
      ['exposure time', 'ms', 'exposure.exposureTime_ms'],
      ['tube power', 'kW', 'exposure.power_kW'],
    ],
  ],
  [
    'Rate and run',
    [
      ['incident air kerma rate', 'mGy/min', 'dose.incidentAirKermaRate_mGy_per_min'],
      ['incident air kerma per run', 'mGy', 'dose.perRun.incidentAirKerma_mGy'],
      ['reference air kerma per run', 'mGy', 'dose.perRun.referenceAirKerma_mGy'],
      ['kerma–area product per run', 'Gy cm²', 'dose.perRun.kermaAreaProduct_Gycm2'],
      ['energy imparted per run', 'mJ', 'dose.perRun.energyImparted_mJ'],
    ],
  ],
  [
    'SdNR² over cost, per frame',
    [
      ['SdNR² per incident air kerma', '1/mGy', 'figureOfMerit.perIncidentAirKerma_per_mGy'],
      ['SdNR² per kerma–area product', '1/(Gy cm²)', 'figureOfMerit.perKermaAreaProduct_per_Gycm2'],
      ['SdNR² per energy imparted', '1/mJ', 'figureOfMerit.perEnergyImparted_per_mJ'],
      ['SdNR² per mean absorbed dose', '1/mGy', 'figureOfMerit.perMeanAbsorbedDose_per_mGy'],
      ['SdNR² per tube energy', '1/kJ', 'figureOfMerit.perTubeEnergy_per_kJ'],
      ['SdNR² per element mass', '1/g', 'figureOfMerit.perElementMass_per_g'],
    ],
  ],
];

/** The quantities of one technique at one size, in the order of the beam path. */
export const quantitySections: readonly {
  readonly heading: string;
  readonly quantities: readonly Quantity[];
}[] = sections.map(([heading, rows]) => ({
  heading,
  quantities: rows.map(([name, unit, path]) => ({ name, unit, path })),
}));

/** A quantity's value in an evaluation, null where it has none. */
export const quantityOf = ({ path }: Quantity, evaluation: Evaluation): number | null => {
  const found = path
    .split('.')
    .reduce<unknown>((part, key) => (part as Record<string, unknown> | null)?.[key], evaluation);
  return typeof found === 'number' ? found : null;
};

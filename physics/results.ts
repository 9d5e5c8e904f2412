/**
 * What Stratabeam answers with: plain frozen objects, the same in the page, on the command line
 * (`--json`) and in the dossier. A value that cannot be had is `null` and a finding says why;
 * nothing is ever NaN. Kerma and tube load are per frame unless they stand in `perRun`.
 */

/** `limit` forbids a setting; `caution` must be read before signing; `note` explains. */
export type Severity = 'limit' | 'caution' | 'note';

/** A sentence about a result, naming limit, value, bound and the nearest setting allowed. */
export interface Finding {
  readonly code: string;
  readonly severity: Severity;
  /** A sentence that stands without its technique's and size's names; `findingWords` adds them. */
  readonly message: string;
  readonly technique?: string;
  readonly size?: string;
  readonly path?: string;
  readonly value?: number | string | null;
  readonly bound?: number | string | null;
  readonly nearest?: string | null;
}

export interface HalfValueLayers {
  readonly material: string;
  readonly first_mm: number | null;
  readonly second_mm: number | null;
  readonly tenth_mm: number | null;
}

export interface BeamQuality {
  readonly potential_kV: number | null;
  readonly halfValueLayers: readonly HalfValueLayers[];
  readonly homogeneityCoefficient: number;
  readonly meanEnergy_keV: number;
  readonly effectiveEnergy_keV: number | null;
  readonly airKerma_uGy_per_mAs: number;
  readonly fluence_per_mm2_per_mAs: number;
}

export interface LayerTransmission {
  readonly layer: string;
  /** Air-kerma transmission of this layer alone, in the beam that reaches it. */
  readonly own: number;
  /** Air-kerma transmission from the skin to this layer's exit face. */
  readonly cumulative: number;
  readonly meanEnergy_keV: number;
  readonly effectiveEnergy_keV: number | null;
  /** The same product by photon number and by energy fluence. */
  readonly cumulativeByNumber: number;
  readonly cumulativeByEnergyFluence: number;
}

export interface Transmission {
  /** Skin to exit face, by air kerma, narrow beam, inverse square removed. */
  readonly primary: number;
  readonly layers: readonly LayerTransmission[];
  readonly exitMeanEnergy_keV: number;
}

/** How scatter was had: first order exact, multiple scatter by adjoint discrete ordinates. */
export type ScatterMethod = 'estimate';

export interface Scatter {
  /** Scatter-to-primary ratio of detector signal at the field centre, without grid. */
  readonly spr: number;
  readonly scatterFraction: number;
  /** The same behind the grid when it is in; otherwise equal to `spr`. */
  readonly sprBehindGrid: number;
  readonly method: ScatterMethod;
}

/** IEC 60627 quantities of the grid in this beam behind this stack. */
export interface GridPerformance {
  readonly primaryTransmission: number;
  readonly scatterTransmission: number;
  readonly totalTransmission: number;
  readonly selectivity: number;
  readonly buckyFactor: number;
  readonly contrastImprovement: number;
  readonly snrImprovement: number;
}

export interface Contrast {
  /** Of detected primary signal; negative for an agent more transparent than its reference. */
  readonly subject: number;
  readonly logarithmic: number;
  readonly detected: number;
  readonly degradationFactor: number;
  readonly iodineEquivalent_mg_per_cm2: number | null;
}

/** Each term as relative standard deviation of the signal over the detail's effective area. */
export interface Noise {
  readonly quantum: number;
  readonly electronic: number;
  readonly structure: number;
  readonly background: number;
  readonly total: number;
}

export interface LayerAbsorbedDose {
  readonly layer: string;
  readonly value: number;
}

export interface RunTotals {
  readonly incidentAirKerma_mGy: number;
  readonly referenceAirKerma_mGy: number;
  readonly kermaAreaProduct_Gycm2: number;
  readonly energyImparted_mJ: number;
}

export interface DoseQuantities {
  readonly incidentAirKerma_mGy: number;
  readonly backscatterFactor: number;
  readonly entranceSurfaceAirKerma_mGy: number;
  readonly kermaAreaProduct_Gycm2: number;
  readonly referenceAirKerma_mGy: number;
  readonly energyImparted_mJ: number;
  readonly meanAbsorbedDose_mGy: number;
  readonly layerAbsorbedDose_mGy: readonly LayerAbsorbedDose[];
  readonly skinAbsorbedDose_mGy: number;
  readonly incidentAirKermaRate_mGy_per_min: number | null;
  readonly perRun: RunTotals;
}

export interface Exposure {
  readonly tubeLoad_mAs: number;
  readonly tubeCurrent_mA: number | null;
  readonly exposureTime_ms: number | null;
  readonly power_kW: number | null;
}

/** Blur in the plane of the detail; not part of SdNR. */
export interface Unsharpness {
  readonly focalSpot_mm: number;
  readonly pixel_mm: number;
  readonly motion_mm: number;
  /** Root sum square of the three. */
  readonly total_mm: number;
}

/** SdNR² per named cost; null where that cost is nothing or there is none. */
export interface FigureOfMerit {
  readonly perIncidentAirKerma_per_mGy: number | null;
  readonly perKermaAreaProduct_per_Gycm2: number | null;
  readonly perEnergyImparted_per_mJ: number | null;
  readonly perMeanAbsorbedDose_per_mGy: number | null;
  readonly perTubeEnergy_per_kJ: number | null;
  readonly perElementMass_per_g: number | null;
}

/** All results of one technique at one size. */
export interface Evaluation {
  readonly technique: string;
  readonly size: string;
  readonly thickness_mm: number;
  /** The setting in force: as written, or where the control curve leads at this size. */
  readonly setting: {
    readonly potential_kV: number;
    readonly filter: string;
    readonly grid: 'in' | 'out';
  };
  readonly beam: BeamQuality;
  readonly transmission: Transmission;
  readonly scatter: Scatter;
  readonly grid: GridPerformance | null;
  readonly contrast: Contrast;
  readonly noise: Noise;
  readonly sdnr: number;
  readonly dose: DoseQuantities;
  readonly detector: {
    readonly airKerma_uGy: number;
    readonly absorbedFraction: number;
    readonly signal_keV_per_mm2: number;
  };
  readonly exposure: Exposure;
  readonly unsharpness: Unsharpness;
  readonly figureOfMerit: FigureOfMerit;
  readonly findings: readonly Finding[];
}

export type HoldConstant =
  | 'asSet'
  | 'sdnr'
  | 'detectorAirKerma'
  | 'detectorSignal'
  | 'incidentAirKerma'
  | 'tubeLoad';

/** Proposed over Current; `null` where the equality cannot be reached or a value is not computed. */
export interface Ratios {
  readonly incidentAirKerma: number | null;
  readonly entranceSurfaceAirKerma: number | null;
  readonly kermaAreaProduct: number | null;
  readonly energyImparted: number | null;
  readonly meanAbsorbedDose: number | null;
  readonly tubeLoad: number | null;
  readonly power: number | null;
  readonly sdnr: number | null;
  readonly subjectContrast: number | null;
  readonly detectedContrast: number | null;
}

export interface ComparisonRow {
  readonly holdConstant: HoldConstant;
  readonly ratio: Ratios;
  readonly findings: readonly Finding[];
}

/** Two techniques weighed at one size under every equality. */
export interface Comparison {
  readonly size: string;
  readonly from: string;
  readonly to: string;
  readonly rows: readonly ComparisonRow[];
}

export interface Residual {
  readonly path: string;
  readonly potential_kV: number;
  readonly quantity: 'halfValueLayer_mmAl' | 'airKerma_uGy_per_mAs';
  readonly measured: number;
  readonly model: number;
  readonly relative_percent: number;
}

export interface Calibration {
  /** g in ln g = ln outputFactor + outputExponent · ln(kV/80). */
  readonly outputFactor: number;
  readonly outputExponent: number;
  readonly inherentFilter_mmAl: number;
  readonly residuals: readonly Residual[];
  readonly findings: readonly Finding[];
}

export interface CaseStamp {
  readonly hash: string;
  readonly title: string;
}

/** The answer to `weigh`. */
export interface Weighing {
  readonly case: CaseStamp;
  readonly version: string;
  readonly assumed: readonly string[];
  readonly calibration: Calibration | null;
  readonly evaluations: readonly Evaluation[];
  readonly comparisons: readonly Comparison[];
  readonly findings: readonly Finding[];
}

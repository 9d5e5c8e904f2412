import { isAllowed } from '../limits.js';
import type { Comparison, Evaluation } from '../results.js';
import type { AtSize } from './across-sizes.js';

/** A row of the technique table the room would need: one technique at one size, one frame, as set. */
export interface TechniqueRow {
  readonly size: string;
  readonly thickness_mm: number;
  readonly share: number;
  readonly technique: string;
  readonly potential_kV: number;
  readonly filter: string;
  readonly grid: 'in' | 'out';
  readonly tubeCurrent_mA: number | null;
  readonly exposureTime_ms: number | null;
  readonly tubeLoad_mAs: number;
  readonly detectorAirKerma_uGy: number;
  /** What the control would have to hold for Current's SdNR at this size; null for Current itself. */
  readonly detectorAirKermaAtEqualSdnr_uGy: number | null;
  readonly sdnr: number;
  readonly incidentAirKerma_mGy: number;
  readonly isAllowed: boolean;
  /** Codes of the limits that forbid it. */
  readonly limits: readonly string[];
}

/** The rows of one size, technique by technique; techniques that cannot be computed are left out. */
export const techniqueRows = ({ size, share, evaluations, comparisons }: AtSize): TechniqueRow[] =>
  evaluations.flatMap((evaluation, i) =>
    evaluation
      ? [
          {
            size: size.name,
            thickness_mm: size.thickness_mm,
            share,
            technique: evaluation.technique,
            ...evaluation.setting,
            tubeCurrent_mA: evaluation.exposure.tubeCurrent_mA,
            exposureTime_ms: evaluation.exposure.exposureTime_ms,
            tubeLoad_mAs: evaluation.exposure.tubeLoad_mAs,
            detectorAirKerma_uGy: evaluation.detector.airKerma_uGy,
            detectorAirKermaAtEqualSdnr_uGy: kermaAtEqualSdnr_uGy(evaluation, comparisons[i]),
            sdnr: evaluation.sdnr,
            incidentAirKerma_mGy: evaluation.dose.incidentAirKerma_mGy,
            isAllowed: isAllowed(evaluation.findings),
            limits: evaluation.findings
              .filter(({ severity }) => severity === 'limit')
              .map(({ code }) => code),
          },
        ]
      : [],
  );

/** Detector air kerma goes with the load: as set, times the load of equal SdNR over that as set. */
const kermaAtEqualSdnr_uGy = (
  { detector }: Evaluation,
  comparison: Comparison | null,
): number | null => {
  const load = (hold: 'asSet' | 'sdnr') =>
    comparison?.rows.find(({ holdConstant }) => holdConstant === hold)?.ratio.tubeLoad ?? null;
  const [asSet, equal] = [load('asSet'), load('sdnr')];
  return asSet !== null && equal !== null ? (detector.airKerma_uGy * equal) / asSet : null;
};

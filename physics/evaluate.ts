import { doseAt, exposureAt, figureOfMeritAt } from './at-load.js';
import { beamQuality } from './beam/index.js';
import type { Case } from './case/schema.js';
import { findingsOf } from './findings.js';
import { framesPerRun } from './frames.js';
import { nearestAllowedWords } from './limits/nearest-allowed.js';
import { isAllowedBySetting, isOfSetting, limitFindings } from './limits.js';
import { numberText } from './number-text.js';
import type { OperatingPoint } from './operating-point.js';
import { iodineEquivalent_mg_per_cm2, noiseAt, readoutWeights, sdnrAt } from './readout/index.js';
import type { Evaluation, Finding } from './results.js';
import { layerTransmission } from './stack/layer-transmission.js';
import { unsharpnessFindings, unsharpnessOf } from './unsharpness.js';

/**
 * All results of one technique at one size, from its operating point: what the beam is, what the
 * patient passes, what scatter adds, what the detector shows, and what it costs.
 *
 * @param index place of the technique among the case's, for the paths of findings.
 */
export const evaluate = (c: Case, point: OperatingPoint, index: number): Evaluation => {
  const { technique, size, made, tubeLoad_mAs } = point;
  const { acquisition } = technique;
  const { setting, placement, output, skin, primary, readout, chain } = made;
  const { stack } = placement;

  const beam = beamQuality(output, c.room.source ? null : setting.potential_kV);
  const dose = doseAt(made, acquisition, tubeLoad_mAs);
  const exposure = exposureAt(c, acquisition, setting.potential_kV, tubeLoad_mAs);
  const sdnr = sdnrAt(readout, tubeLoad_mAs);
  const unsharpness = unsharpnessOf(c, placement.detail, exposure.exposureTime_ms);
  const detectorAirKerma_uGy = readout.detectorAirKerma_uGy_per_mAs * tubeLoad_mAs;
  const path = `techniques[${index}]`;
  return {
    technique: technique.name,
    size: size.name,
    thickness_mm: size.thickness_mm,
    setting,
    beam,
    transmission: layerTransmission(stack, skin),
    scatter: {
      spr: readout.spr,
      scatterFraction: readout.spr / (1 + readout.spr),
      sprBehindGrid: readout.sprBehindGrid,
      method: 'estimate',
    },
    grid: readout.grid,
    contrast: {
      subject: readout.contrast.subject,
      logarithmic: readout.contrast.logarithmic,
      detected: readout.contrast.detected,
      degradationFactor: readout.contrast.degradationFactor,
      iodineEquivalent_mg_per_cm2: iodineEquivalent_mg_per_cm2(
        readoutWeights(chain, output.energies_keV),
        output.energies_keV,
        primary.fluence_per_mm2,
        readout.contrast.subject,
      ),
    },
    noise: noiseAt(readout, tubeLoad_mAs),
    sdnr,
    dose,
    detector: {
      airKerma_uGy: detectorAirKerma_uGy,
      absorbedFraction: readout.absorbedFraction,
      signal_keV_per_mm2: readout.signalTotal_per_mm2_per_mAs * tubeLoad_mAs,
    },
    exposure,
    unsharpness,
    figureOfMerit: figureOfMeritAt(c, made, dose, tubeLoad_mAs),
    findings: findingsOf(
      withNearest(c, point, [
        ...point.findings,
        ...placement.findings,
        ...belowRose(c, sdnr),
        ...unsharpnessFindings(c, unsharpness),
        ...limitFindings({
          case: c,
          setting,
          mode: acquisition.mode,
          framesPerRun: framesPerRun(acquisition),
          exposure,
          halfValueLayer_mmAl: beam.halfValueLayers[0].first_mm,
          sourceToSkin_mm: stack.sourceToSkin_mm,
          detectorAirKerma_uGy,
          incidentAirKermaRate_mGy_per_min: dose.incidentAirKermaRate_mGy_per_min,
          path,
        }),
      ]),
      technique.name,
      size.name,
    ),
  };
};

/** A detail below the Rose threshold is not seen with confidence, whatever it costs. */
const belowRose = ({ task }: Case, sdnr: number): Finding[] =>
  sdnr >= task.roseThreshold
    ? []
    : [
        {
          code: 'belowRose',
          severity: 'caution',
          message: `SdNR ${numberText(sdnr)} is below the Rose threshold of ${numberText(task.roseThreshold)}: the detail is not seen with confidence.`,
          path: 'task.roseThreshold',
          value: sdnr,
          bound: task.roseThreshold,
        },
      ];

/** A limit without a remedy of its own names the nearest setting of the room that is allowed. */
const withNearest = (c: Case, point: OperatingPoint, findings: Finding[]): Finding[] => {
  if (isAllowedBySetting(findings)) return findings;
  const { nearest, sentence } = nearestAllowedWords(c, point);
  return findings.map((finding) =>
    isOfSetting(finding)
      ? { ...finding, nearest, message: `${finding.message} ${sentence}` }
      : finding,
  );
};

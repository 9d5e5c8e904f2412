import { levenbergMarquardt } from 'ml-levenberg-marquardt';
import { meanEnergy_keV } from './fluence.js';
import {
  inherentFor,
  type ModelledReading,
  modelledHalfValueLayer_mmAl,
  modelledOutput_uGy_per_mAs,
} from './reading-model.js';

/** Potential at which the output scale is anchored: ln g = ln outputFactor + b ln(kV/80). */
export const anchorPotential_kV = 80;

/** What a calibration finds. */
export interface TubeFit {
  readonly inherentFilter_mmAl: number;
  readonly outputFactor: number;
  readonly outputExponent: number;
}

/** Readings at as many potentials as this are fitted together instead of met at one. */
const potentialsForFit = 3;
const greatestInherent_mmAl = 50;
// From the start above, five steps settle synthetic rooms to the last printed digit.
const maxIterations = 10;

/**
 * Inherent filter t, output scale g and its exponent b from readings.
 *
 * At one or two potentials t meets the half-value layer, and g the output, of the reading nearest
 * 80 kV (b = 0). From three potentials on, t (where half-value layers exist at three) and
 * ln g = a + b ln(kV/80) (where outputs do) minimise the sum of squared logarithmic residuals, each
 * over its stated uncertainty (Levenberg–Marquardt). What no reading tells stays as in `start`.
 */
export function fitTube(modelled: readonly ModelledReading[], start: TubeFit): TubeFit {
  const layers = modelled.filter(({ reading }) => reading.halfValueLayer_mmAl !== null);
  const outputs = modelled.filter(({ reading }) => reading.airKerma_uGy_per_mAs !== null);
  const atAnchor = meetAtAnchor(layers, outputs, start);
  const fitsLayers = potentialCount(layers) >= potentialsForFit;
  const fitsOutputs = potentialCount(outputs) >= potentialsForFit;
  if (!fitsLayers && !fitsOutputs) return atAnchor;

  const points = [
    ...(fitsLayers ? layers.map((m) => layerPoint(m)) : []),
    ...(fitsOutputs ? outputs.map((m) => outputPoint(m)) : []),
  ];
  const unpack = (parameters: readonly number[]): TubeFit => {
    const [inherent, ...line] = fitsLayers
      ? parameters
      : [atAnchor.inherentFilter_mmAl, ...parameters];
    return fitsOutputs
      ? { inherentFilter_mmAl: inherent, outputFactor: Math.exp(line[0]), outputExponent: line[1] }
      : { ...atAnchor, inherentFilter_mmAl: inherent };
  };
  const initial = [
    ...(fitsLayers
      ? [{ value: atAnchor.inherentFilter_mmAl, min: 0, max: greatestInherent_mmAl }]
      : []),
    ...(fitsOutputs
      ? [
          { value: Math.log(atAnchor.outputFactor), min: -10, max: 10 },
          { value: 0, min: -10, max: 10 },
        ]
      : []),
  ];
  const { parameterValues } = levenbergMarquardt(
    { x: points.map((_, i) => i), y: points.map(({ measured }) => measured) },
    (parameters) => {
      const fit = unpack(parameters);
      return (i) => points[i].model(fit);
    },
    {
      initialValues: initial.map(({ value }) => value),
      minValues: initial.map(({ min }) => min),
      maxValues: initial.map(({ max }) => max),
      gradientDifference: 1e-4,
      maxIterations,
    },
  );
  const fitted = unpack(parameterValues);
  if (fitsOutputs) return fitted;
  return {
    ...fitted,
    outputFactor: outputFactorAtAnchor(outputs, fitted.inherentFilter_mmAl, start),
  };
}

/** Output scale at a potential. */
export const outputFactorAt_kV = (
  fit: Pick<TubeFit, 'outputFactor' | 'outputExponent'>,
  potential_kV: number,
): number => fit.outputFactor * (potential_kV / anchorPotential_kV) ** fit.outputExponent;

const potentialCount = (readings: readonly ModelledReading[]): number =>
  new Set(readings.map(({ reading }) => reading.potential_kV)).size;

/** The reading nearest 80 kV; of several the softest beam, which shows the inherent filter best. */
function nearestAnchor(readings: readonly ModelledReading[]): ModelledReading | undefined {
  const away = ({ reading }: ModelledReading) =>
    Math.abs(reading.potential_kV - anchorPotential_kV);
  return readings.toSorted(
    (a, b) => away(a) - away(b) || meanEnergy_keV(a.beam) - meanEnergy_keV(b.beam),
  )[0];
}

function meetAtAnchor(
  layers: readonly ModelledReading[],
  outputs: readonly ModelledReading[],
  start: TubeFit,
): TubeFit {
  const nearest = nearestAnchor(layers);
  const inherent = (nearest && inherentFor(nearest)) ?? start.inherentFilter_mmAl;
  return {
    inherentFilter_mmAl: inherent,
    outputFactor: outputFactorAtAnchor(outputs, inherent, start),
    outputExponent: 0,
  };
}

function outputFactorAtAnchor(
  outputs: readonly ModelledReading[],
  inherent_mmAl: number,
  start: TubeFit,
): number {
  const nearest = nearestAnchor(outputs);
  const measured = nearest?.reading.airKerma_uGy_per_mAs;
  if (!nearest || !measured) return start.outputFactor;
  return measured / modelledOutput_uGy_per_mAs(nearest, inherent_mmAl);
}

/** A logarithm measured and modelled, both over the reading's relative uncertainty. */
interface FitPoint {
  readonly measured: number;
  readonly model: (fit: TubeFit) => number;
}

// Residuals are divided by their uncertainty here: the library's own weights scale the step and the
// gradient differently.
function layerPoint(modelled: ModelledReading): FitPoint {
  const perUncertainty = 100 / modelled.reading.relativeUncertainty_percent;
  return {
    measured: perUncertainty * Math.log(modelled.reading.halfValueLayer_mmAl ?? 1),
    model: (fit) =>
      perUncertainty * Math.log(modelledHalfValueLayer_mmAl(modelled, fit.inherentFilter_mmAl)),
  };
}

function outputPoint(modelled: ModelledReading): FitPoint {
  const { relativeUncertainty_percent, airKerma_uGy_per_mAs, potential_kV } = modelled.reading;
  const perUncertainty = 100 / relativeUncertainty_percent;
  return {
    measured: perUncertainty * Math.log(airKerma_uGy_per_mAs ?? 1),
    model: (fit) =>
      perUncertainty *
      Math.log(
        outputFactorAt_kV(fit, potential_kV) *
          modelledOutput_uGy_per_mAs(modelled, fit.inherentFilter_mmAl),
      ),
  };
}

import { numberText } from '../number-text.js';
import type { Finding, Residual } from '../results.js';
import type { TubeFit } from './calibration-fit.js';

/** Ranges a diagnostic tube's calibration is expected in (Stratabeam tube model). */
const expected = {
  inherentFilter_mmAl: [1.5, 6],
  outputFactor: [0.5, 1.3],
  outputExponent: [-0.3, 0.3],
} as const;

/** A residual beyond this, and beyond twice the reading's own uncertainty, must be looked into. */
const residualBound_percent = 4;

const named = {
  inherentFilter_mmAl: {
    code: 'inherentFilterUnusual',
    says: (value: string) => `the readings ask for ${value} mm Al of inherent filter`,
    check: 'check the half-value layers, the anode angle and the ripple',
  },
  outputFactor: {
    code: 'outputUnusual',
    says: (value: string) => `the readings ask for ${value} times the modelled output`,
    check: 'check the unit and the distance of the output readings',
  },
  outputExponent: {
    code: 'outputSlopeUnusual',
    says: (value: string) => `the output departs from the model as (kV/80)^${value}`,
    check: 'check the potentials of the output readings',
  },
} as const;

/** A residual beyond this contradicts the model: no kerma rests on such a calibration. */
const contradiction_percent = 20;

/** Cautions about a calibration: parameters outside what tubes show, readings not met. */
export function calibrationFindings(
  fit: TubeFit,
  residuals: readonly Residual[],
  uncertaintyOf_percent: (residual: Residual) => number,
): Finding[] {
  return [...parameterFindings(fit), ...residualFindings(residuals, uncertaintyOf_percent)];
}

function parameterFindings(fit: TubeFit): Finding[] {
  return (Object.keys(expected) as (keyof typeof expected)[]).flatMap((key) => {
    const [least, most] = expected[key];
    const value = fit[key];
    if (value >= least && value <= most) return [];
    const { code, says, check } = named[key];
    return [
      {
        code,
        severity: 'caution' as const,
        message: `room.readings: ${says(numberText(value))}, outside ${least} to ${most}; ${check}.`,
        path: 'room.readings',
        value,
        bound: value < least ? least : most,
      },
    ];
  });
}

function residualFindings(
  residuals: readonly Residual[],
  uncertaintyOf_percent: (residual: Residual) => number,
): Finding[] {
  return residuals.flatMap((residual) => {
    const bound = Math.max(residualBound_percent, 2 * uncertaintyOf_percent(residual));
    if (Math.abs(residual.relative_percent) <= bound) return [];
    const { path, measured, model, relative_percent } = residual;
    return [
      {
        code: 'readingNotMet',
        severity:
          Math.abs(relative_percent) > contradiction_percent
            ? ('limit' as const)
            : ('caution' as const),
        message: `${path}: measured ${numberText(measured)}, the calibrated model says ${numberText(model)} (${numberText(relative_percent)} %, beyond ${numberText(bound)} %); repeat the reading or check its potential and filter.`,
        path,
        value: relative_percent,
        bound,
      },
    ];
  });
}

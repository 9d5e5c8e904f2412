import { elementTableOf, momentumTransferNodes } from './element-tables.js';
import { evaluate, type HermiteCurve, naturalSpline } from './interpolation.js';
import { kept } from './kept.js';

interface ScatteringCurves {
  readonly logFormFactor: HermiteCurve;
  readonly logIncoherent: HermiteCurve;
}

const curves = new Map<number, ScatteringCurves>();

/**
 * Atomic form factor F(q,Z), electrons, at momentum transfer q = sin(θ/2)/λ in 1/Å (any q ≥ 0).
 * Natural cubic spline in log-log; Z below the first node. Hubbell et al. 1975 as in EPDL97.
 */
export function formFactor(z: number, q_per_angstrom: number): number {
  const nodes = momentumTransferNodes();
  if (!(q_per_angstrom > nodes[0])) return z;
  return Math.exp(evaluate(curvesOf(z).logFormFactor, Math.log(q_per_angstrom)));
}

/**
 * Incoherent scattering function S(q,Z), electrons, at q = sin(θ/2)/λ in 1/Å (any q ≥ 0).
 * Natural cubic spline in log-log; a power of q below the first node, Z above the last.
 */
export function incoherentScatteringFunction(z: number, q_per_angstrom: number): number {
  if (!(q_per_angstrom > 0)) return 0;
  return Math.min(z, Math.exp(evaluate(curvesOf(z).logIncoherent, Math.log(q_per_angstrom))));
}

function curvesOf(z: number): ScatteringCurves {
  return kept(curves, z, () => buildCurves(z));
}

function buildCurves(z: number): ScatteringCurves {
  const table = elementTableOf(z);
  const logQ = momentumTransferNodes().map(Math.log);
  return {
    logFormFactor: naturalSpline(logQ, table.formFactor.map(Math.log)),
    logIncoherent: naturalSpline(logQ, table.incoherentScattering.map(Math.log)),
  };
}

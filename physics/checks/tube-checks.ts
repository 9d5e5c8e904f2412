import { bremsstrahlung, electronRange_g_per_cm2 } from '../beam/bremsstrahlung.js';
import { characteristicLine } from '../beam/characteristic-lines.js';
import {
  airKerma_uGy,
  attenuate,
  beamQuality,
  halfValueLayer_mm,
  type Spectrum,
  tungstenSpectrum,
} from '../beam/index.js';
import { kLines } from '../beam/tungsten-coefficients.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { numberAfter, type ReferenceRow, referenceRows } from './reference-rows.js';

/** The tube model's beams and point values against a separate evaluation of the closed form. */
export const tubeChecks = (): CheckRow[] =>
  referenceRows('tube_model').map((row) => {
    if (row.set === 'tube beam') return beamCheck(row);
    return row.set === 'tube ripple' ? rippleCheck(row) : pointCheck(row);
  });

/** `100 kV, 12 deg, 2.5 mm Al + 0.1 mm Cu`. */
const filteredBeam = ({ conditions }: ReferenceRow, ripple_percent = 0): Spectrum => {
  const layer = (name: string, thickness_mm: number) => ({
    material: materialOf(name),
    thickness_mm: Number.isFinite(thickness_mm) ? thickness_mm : 0,
  });
  return attenuate(tungstenSpectrum({ ...potentialAndAngle(conditions), ripple_percent }), [
    layer('aluminium', Number(/([\d.]+) mm Al/.exec(conditions)?.[1])),
    layer('copper', Number(/([\d.]+) mm Cu/.exec(conditions)?.[1])),
  ]);
};

const potentialAndAngle = (conditions: string) => ({
  potential_kV: Number(/([\d.]+) kV/.exec(conditions)?.[1]),
  anodeAngle_deg: Number(/([\d.]+) deg/.exec(conditions)?.[1]),
});

const beamCheck = (row: ReferenceRow): CheckRow => {
  const quality = beamQuality(filteredBeam(row));
  const [aluminium] = quality.halfValueLayers;
  const computed: Readonly<Record<string, number | null>> = {
    HVL1: aluminium.first_mm,
    HVL2: aluminium.second_mm,
    'mean energy': quality.meanEnergy_keV,
    'air kerma': quality.airKerma_uGy_per_mAs,
    fluence: quality.fluence_per_mm2_per_mAs,
  };
  // Another attenuation table may move a half-value layer by 0.3 % and kerma by 0.5 %.
  return checkRow(row, computed[row.item] ?? null, {
    relative: ['air kerma', 'fluence'].includes(row.item) ? 0.005 : 0.003,
  });
};

/** Change against constant potential, printed in percent with one decimal. */
const rippleCheck = (row: ReferenceRow): CheckRow => {
  const quantityOf = (beam: Spectrum): number =>
    row.item === 'output change'
      ? airKerma_uGy(beam)
      : (halfValueLayer_mm(beam, materialOf('aluminium')) ?? Number.NaN);
  const rippling = quantityOf(filteredBeam(row, numberAfter(row.conditions)));
  const change_percent = 100 * (rippling / quantityOf(filteredBeam(row)) - 1);
  return checkRow(row, change_percent, { absolute: 0, rounding: true });
};

const pointCheck = (row: ReferenceRow): CheckRow => {
  const { potential_kV, anodeAngle_deg } = potentialAndAngle(row.conditions);
  const energy_keV = numberAfter(row.conditions, 'deg,');
  const m = numberAfter(row.conditions, 'm=');
  const terms = bremsstrahlung(potential_kV, anodeAngle_deg)(energy_keV, m);
  const computed: Readonly<Record<string, number>> = {
    'bremsstrahlung N': terms.photons_per_keV_sr_electron,
    R0: electronRange_g_per_cm2(potential_kV),
    Y: terms.yieldFactor,
    zeta: terms.depth_g_per_cm2,
    kappa: terms.shape,
    escape: terms.escapeProbability,
    'K-alpha-1 line': characteristicLine(potential_kV, anodeAngle_deg)(kLines[0].share, m),
  };
  return checkRow(row, computed[row.item] ?? null, { absolute: 0, rounding: true });
};

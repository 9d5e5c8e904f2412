import { agent, elementConcentration_mg_per_mL, massAttenuationOn } from '../../materials/index.js';
import { attenuate, kEdges_keV, tungstenSpectrum } from '../beam/index.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { numberAfter, referenceRows } from './reference-rows.js';

/** Behind this much water, in this much caesium iodide. */
const water_mm = 200;
const detector_g_per_cm2 = 0.2;

/**
 * Iodine concentration whose iodine gives the thin-detail signal that 0.5 mol/L of gadolinium gives
 * by its gadolinium: 12° anode, 2.5 mm aluminium, 20 cm water, energy-integrating caesium iodide of
 * 200 mg/cm². The abstract does not state its conditions: less water lowers, copper raises the values
 * by 10 to 20 %, and counting the chelate and its carrier raises them by 5 to 10 %.
 */
export const gadoliniumChecks = (): CheckRow[] =>
  referenceRows('gadolinium_equivalence').map((row) =>
    checkRow(row, equalIodine_mg_per_mL(numberAfter(row.conditions)), { relative: 0.1, note }),
  );

const note =
  'the abstract states no conditions; here 20 cm water, caesium iodide, 2.5 mm aluminium';

const equalIodine_mg_per_mL = (potential_kV: number): number => {
  const chelate = agent('gadolinium chelate');
  if (!chelate) return Number.NaN;
  const halfMolar = { value: 0.5, unit: 'mmol/mL' } as const;
  return (
    (elementConcentration_mg_per_mL(chelate, halfMolar) *
      weightedAttenuation('gadolinium', potential_kV)) /
    weightedAttenuation('iodine', potential_kV)
  );
};

/** Mass attenuation of an element weighted by the energy absorbed in the detector (any scale). */
const weightedAttenuation = (element: string, potential_kV: number): number => {
  const absorber = materialOf('caesium iodide');
  const extraEdges_keV = kEdges_keV(
    ['gadolinium', 'iodine', 'caesium iodide'].map((name) => materialOf(name)),
  );
  const { energies_keV, fluence_per_mm2 } = attenuate(
    tungstenSpectrum({ potential_kV, anodeAngle_deg: 12, extraEdges_keV }),
    [
      { material: materialOf('aluminium'), thickness_mm: 2.5 },
      { material: materialOf('water'), thickness_mm: water_mm },
    ],
  );
  const attenuation = massAttenuationOn(materialOf(element), energies_keV);
  const inDetector = massAttenuationOn(absorber, energies_keV);
  return energies_keV.reduce((sum, energy, i) => {
    const absorbed = 1 - Math.exp(-inDetector[i] * detector_g_per_cm2);
    return sum + fluence_per_mm2[i] * energy * absorbed * attenuation[i];
  }, 0);
};

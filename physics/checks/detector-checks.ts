import { massAttenuation } from '../../materials/index.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { numberAfter, referenceRows } from './reference-rows.js';

const ourNames: readonly (readonly [start: string, name: string])[] = [
  ['CsI', 'caesium iodide'],
  ['Gd2O2S', 'gadolinium oxysulfide'],
  ['a-Se', 'selenium'],
  ['CdTe', 'cadmium telluride'],
];

/** Fraction of photons that interact in detectors, normal incidence. */
export const detectorChecks = (): CheckRow[] =>
  referenceRows('detectors')
    .filter(({ set }) => set === 'absorption')
    .map((row) => {
      const [, name] = ourNames.find(([start]) => row.item.startsWith(start)) ?? ['', ''];
      const energy_keV = numberAfter(row.item, 'fraction');
      const areal_g_per_cm2 = numberAfter(row.conditions, 'areal density') / 1000;
      const optical = massAttenuation(materialOf(name), energy_keV) * areal_g_per_cm2;
      return checkRow(row, 1 - Math.exp(-optical), { relative: 0.03 });
    });

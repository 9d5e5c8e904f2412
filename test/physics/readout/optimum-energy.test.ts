/**
 * Huda, Kissi, Ogden & Boone 2002 (Proc SPIE 4682): the single photon energy that needs least energy
 * imparted for a given SdNR behind 15 cm of water, with a detector that counts every photon and no
 * scatter in the image. Quantum noise only; `optimum_energy.csv`.
 */
import { describe, expect, it } from 'vitest';
import { massAttenuation } from '../../../materials/index.js';
import { scatterResponses } from '../../../physics/scatter/index.js';
import { readReference } from '../../reference/read-reference.js';
import { idealDetector, material, stackOf } from '../scatter/stacks.js';

const water = material('water');
const iodineEdge_keV = 33.169;
const { energies_keV, layerAbsorbedFraction } = scatterResponses(
  stackOf([[water, 15]]),
  idealDetector(iodineEdge_keV),
  null,
);

/** SdNR² per energy imparted of a thin signal of `contrast_cm2_per_g`, up to a constant. */
const merit = (contrast: (energy_keV: number) => number): number[] =>
  Array.from(energies_keV, (energy, i) => {
    const transmitted = Math.exp(-massAttenuation(water, energy) * water.density_g_per_cm3 * 15);
    const imparted_keV = energy * (layerAbsorbedFraction?.[0][i] ?? Number.NaN);
    return (contrast(energy) ** 2 * transmitted) / imparted_keV;
  });

const optimum_keV = (contrast: (energy_keV: number) => number): number => {
  const values = merit(contrast);
  return energies_keV[values.indexOf(Math.max(...values))];
};

const published = (item: string): number =>
  Number(readReference('optimum_energy.csv').find((row) => row.item.includes(item))?.value);

describe('the best single energy behind 15 cm of water (Huda et al. 2002)', () => {
  it('for iodine is 34 ± 2.5 keV: just above its K edge', () => {
    const iodine = material('iodine');
    const own = optimum_keV((energy) => massAttenuation(iodine, energy));
    expect(Math.abs(own - published('iodine'))).toBeLessThanOrEqual(2.5);
    expect(own).toBeGreaterThanOrEqual(iodineEdge_keV);
  });

  it('for a lesion of low atomic number is 62 ± 6 keV', () => {
    const own = optimum_keV((energy) => massAttenuation(water, energy));
    expect(Math.abs(own - published('low Z'))).toBeLessThanOrEqual(6);
  });
});

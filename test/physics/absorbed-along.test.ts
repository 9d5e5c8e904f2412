import { describe, expect, it } from 'vitest';
import { massEnergyAbsorption, namedMaterial } from '../../materials/index.js';
import { absorbedAlong } from '../../physics/absorbed-along.js';
import { fieldArea_cm2 } from '../../physics/dose/field-area.js';
import { operatingPoint } from '../../physics/operating-point.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { sampleCase } from './sample-case.js';

const layers = [
  { name: 'fat', material: 'adipose', thickness_mm: 20 },
  { name: 'water', material: 'water', thickness_mm: 150 },
  { name: 'bone', material: 'cortical bone', thickness_mm: 10 },
];
const { case: c } = sampleCase({ patient: { layers } });
const [size] = sizesOf(c.patient);
const pointOf = (index: number) => {
  const point = operatingPoint(c, c.techniques[index], size);
  if (!('made' in point)) throw new Error('no point');
  return point;
};
const point = pointOf(0);
const along = absorbedAlong(point);
if (!along) throw new Error('no deposition');
const thickness = (k: number) => along.faces_mm[k + 1] - along.faces_mm[k];
const sum = (values: readonly number[]) =>
  values.reduce((total, value, k) => total + value * thickness(k), 0);

describe('absorbed energy along the depth', () => {
  it('adds up to the energy imparted, and to what each layer gets', () => {
    const imparted = point.made.dose.energyImparted_mJ_per_mAs * point.tubeLoad_mAs;
    expect(sum(along.energy_mJ_per_mm) / imparted).toBeCloseTo(1, 3);
    const { stack } = point.made.placement;
    stack.layers.forEach(({ material, thickness_mm }, layer) => {
      const own = along.energy_mJ_per_mm.map((value, k) => (along.layers[k] === layer ? value : 0));
      const middle_mm = along.faces_mm[along.layers.indexOf(layer)] + thickness_mm / 2;
      const area_cm2 = fieldArea_cm2(stack, stack.sourceToSkin_mm + middle_mm);
      const mass_g = (material.density_g_per_cm3 * thickness_mm * area_cm2) / 10;
      const dose_mGy = point.made.dose.layerAbsorbedDose_mGy_per_mAs[layer] * point.tubeLoad_mAs;
      // 1 mJ/g is 1000 mGy.
      expect((sum(own) / mass_g) * 1000).toBeCloseTo(dose_mGy, 3);
    });
  });

  it('reaches from skin to exit, cut at every face of a layer', () => {
    expect(along.faces_mm[0]).toBe(0);
    expect(along.faces_mm.at(-1)).toBeCloseTo(180, 9);
    for (const face of [20, 170]) {
      expect(along.faces_mm.some((depth) => Math.abs(depth - face) < 1e-9)).toBe(true);
    }
    expect(along.layers).toHaveLength(along.faces_mm.length - 1);
  });

  it('owes more and more of it to scattered photons on the way through water', () => {
    const share = along.energy_mJ_per_mm.map((all, k) => along.fromScattered_mJ_per_mm[k] / all);
    const inWater = share.filter((_, k) => along.layers[k] === 1);
    expect(Math.min(...share)).toBeGreaterThan(0.2);
    expect(Math.max(...share)).toBeLessThan(1);
    // The last piece before bone receives less from behind.
    const rising = inWater.slice(0, -1);
    expect(rising).toEqual([...rising].sort((a, b) => a - b));
  });

  it('leaves to primary photons in a thin first piece what μen says', () => {
    const thin = sampleCase({
      patient: {
        layers: [
          { name: 'film', material: 'water', thickness_mm: 0.1 },
          { name: 'water', material: 'water', thickness_mm: 199.9 },
        ],
      },
    }).case;
    const operating = operatingPoint(thin, thin.techniques[0], sizesOf(thin.patient)[0]);
    if (!('made' in operating)) throw new Error('no point');
    const cut = absorbedAlong(operating);
    const { skin, placement } = operating.made;
    const water = namedMaterial('water');
    if (!water || !cut) throw new Error('no water');
    const collisionKerma = skin.energies_keV.reduce(
      (total, energy, i) =>
        total + skin.fluence_per_mm2[i] * energy * (massEnergyAbsorption(water, energy) ?? 0),
      0,
    );
    const { sourceToSkin_mm, sourceToDetector_mm, field_mm } = placement.stack;
    const area_mm2 = field_mm[0] * field_mm[1] * (sourceToSkin_mm / sourceToDetector_mm) ** 2;
    const expected = 0.1 * collisionKerma * area_mm2 * 1.602176634e-13 * operating.tubeLoad_mAs;
    const primary = cut.energy_mJ_per_mm[0] - cut.fromScattered_mJ_per_mm[0];
    expect(primary / expected).toBeCloseTo(1, 2);
  });
});

import { describe, expect, it } from 'vitest';
import { firstScatterAlong } from '../../physics/first-scatter-along.js';
import { operatingPoint } from '../../physics/operating-point.js';
import { prepare } from '../../physics/prepare.js';
import { firstOrderResponses, toChannels } from '../../physics/scatter/index.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { sampleCase } from './sample-case.js';

const layers = [
  { name: 'fat', material: 'adipose', thickness_mm: 20 },
  { name: 'water', material: 'water', thickness_mm: 160 },
  { name: 'bone', material: 'cortical bone', thickness_mm: 10 },
];
const pointOf = (grid: 'in' | 'out') => {
  const base = sampleCase({ patient: { layers }, room: { support: [] } }).case;
  const [current, proposed] = base.techniques;
  const c = { ...base, techniques: [{ ...current, grid }, proposed] };
  const point = operatingPoint(c, c.techniques[0], sizesOf(c.patient)[0]);
  if (!('made' in point)) throw new Error('no point');
  return { c, point };
};
const sum = ({ faces_mm, scatterToPrimary_per_cm }: ReturnType<typeof firstScatterAlong>) =>
  scatterToPrimary_per_cm.reduce(
    (total, value, k) => total + (value * (faces_mm[k + 1] - faces_mm[k])) / 10,
    0,
  );

describe('first scatter along the depth', () => {
  it.each(['in', 'out'] as const)(
    'adds up to the first order of the whole stack, grid %s',
    (grid) => {
      const { c, point } = pointOf(grid);
      const { made } = point;
      const { energies_keV } = made.output;
      const table = made.chain.grid?.table ?? null;
      const whole = firstOrderResponses(made.placement.stack, prepare(c).detector, table);
      const { signal } = (table ? whole.behindGrid : whole.withoutGrid) ?? whole.withoutGrid;
      const ratio = toChannels(whole.energies_keV, energies_keV)(signal);
      const { epsilon } = made.chain.detector.on(energies_keV);
      const passed = table?.primaryOn(energies_keV) ?? energies_keV.map(() => 1);
      let scatter = 0;
      let primary = 0;
      made.primary.fluence_per_mm2.forEach((photons, i) => {
        const signal = photons * energies_keV[i] * epsilon[i] * passed[i];
        primary += signal;
        scatter += signal * ratio[i];
      });
      expect(sum(firstScatterAlong(point)) / (scatter / primary)).toBeCloseTo(1, 2);
    },
  );

  it('reaches from skin to exit', () => {
    const { faces_mm } = firstScatterAlong(pointOf('out').point);
    expect(faces_mm[0]).toBe(0);
    expect(faces_mm.at(-1)).toBeCloseTo(190, 9);
  });

  it('comes more from behind the deeper it lies in one material, without grid', () => {
    const { faces_mm, scatterToPrimary_per_cm } = firstScatterAlong(pointOf('out').point);
    const inWater = scatterToPrimary_per_cm.filter(
      (_, k) => faces_mm[k] >= 19.9 && faces_mm[k + 1] <= 180.1,
    );
    expect(inWater.length).toBeGreaterThan(10);
    expect(inWater).toEqual([...inWater].sort((a, b) => a - b));
  });
});

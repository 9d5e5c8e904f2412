import { describe, expect, it } from 'vitest';
import { agentMixture, type Material } from '../../../materials/index.js';
import {
  cosines,
  ordinates,
  ordinateWeights,
  rows,
} from '../../../physics/scatter/adjoint/directions.js';
import { blockLength, type Kernel, kernelOf } from '../../../physics/scatter/adjoint/kernel.js';
import { meshOf } from '../../../physics/scatter/adjoint/mesh.js';
import { solveAdjoint } from '../../../physics/scatter/adjoint/solve.js';
import { emptySources } from '../../../physics/scatter/adjoint/sources.js';
import { nodesFor } from '../../../physics/scatter/scatter-responses.js';
import { slabsOf } from '../../../physics/scatter/slabs.js';
import { idealDetector, material, stackOf } from './stacks.js';

const withoutFluorescence = (kernel: Kernel): Kernel => ({
  ...kernel,
  fluorescence: kernel.fluorescence.map(() => []),
});

/** Energy through the exit, back out of the entrance and left in each layer, per incident photon. */
function energyShares(
  layers: readonly (readonly [Material, number])[],
  { energies = [60], fluorescence = true } = {},
) {
  const slabs = slabsOf(stackOf(layers));
  const nodes = nodesFor(slabs, idealDetector(...energies), null).energies_keV;
  const width = 2 + slabs.length;
  const sources = emptySources(nodes.length, width);
  nodes.forEach((energy, i) => {
    for (let d = 0; d < rows; d++) sources.exit[i * width * rows + d] = energy;
    for (let d = 0; d < ordinates; d++) sources.skin[(i * width + 1) * rows + d] = energy;
  });
  slabs.forEach((_, k) => {
    sources.slab[2 + k] = k;
  });
  const kernels = slabs.map((slab) => kernelOf(slab.material, nodes));
  const used = fluorescence ? kernels : kernels.map(withoutFluorescence);
  const { total } = solveAdjoint(meshOf(slabs), used, nodes, sources);
  return { nodes, at: (i: number) => [...total.subarray(i * width, (i + 1) * width)] };
}

const sum = (values: readonly number[]) => values.reduce((a, b) => a + b, 0);
const water = material('water');

// Each value with the standard error of the separate Monte Carlo it comes from; four of these, plus
// 0.2 % for the discretisation, is what is allowed.
const allowed = (value: number, standardError: number) => 4 * standardError + 0.002 * value;

describe('energy imparted to water by a broad parallel beam', () => {
  it.each([
    [10, 40, 26.62, 0.011],
    [10, 60, 27.397, 0.012],
    [20, 60, 40.896, 0.024],
    [20, 80, 49.723, 0.024],
  ])('of %d cm at %d keV is %d keV per photon', (thickness_cm, energy, expected, standardError) => {
    const { nodes, at } = energyShares([[water, thickness_cm]], { energies: [energy] });
    const [, , imparted] = at(nodes.indexOf(energy));
    expect(Math.abs(imparted - expected)).toBeLessThan(allowed(expected, standardError));
  });
});

describe('a trunk with 10 mg/mL iodine in blood at 60 keV', () => {
  const carrier = material('blood');
  const amount = { value: 10, unit: 'mg element/mL' } as const;
  const iodine = agentMixture({ agent: 'iodine', amount, carrier }).material;
  const layers = [
    [material('adipose'), 2],
    [material('muscle'), 3],
    [material('soft tissue'), 7],
    [iodine, 1],
    [material('soft tissue'), 5],
    [material('muscle'), 1],
    [material('adipose'), 2],
  ] as const;

  it('takes up per layer, without fluorescence, what separate transport finds', () => {
    const { nodes, at } = energyShares(layers, { fluorescence: false });
    const found = at(nodes.indexOf(60)).slice(2);
    const expected = [5.368, 11.341, 16.391, 3.75, 3.85, 0.463, 0.424];
    const errors = [0.012, 0.018, 0.02, 0.007, 0.006, 0.002, 0.001];
    const outside = expected.flatMap((value, k) =>
      Math.abs(found[k] - value) > allowed(value, errors[k]) ? [[k, found[k], value]] : [],
    );
    expect(outside).toEqual([]);
  });

  it('takes up 3.000 keV in the iodine layer once K fluorescence may leave it', () => {
    const { nodes, at } = energyShares(layers);
    expect(Math.abs(at(nodes.indexOf(60))[5] - 3.0)).toBeLessThan(allowed(3, 0.007));
  });
});

describe('energy', () => {
  const bone = material('cortical bone');
  const barium = agentMixture({
    agent: 'barium sulfate',
    amount: { value: 300, unit: 'mg element/mL' },
    carrier: water,
  }).material;
  it.each([
    ['20 cm of water', [[water, 20]]],
    [
      'bone between tissue',
      [
        [material('soft tissue'), 5],
        [bone, 1],
        [material('soft tissue'), 5],
      ],
    ],
    [
      'lung',
      [
        [material('muscle'), 2],
        [material('lung'), 16],
        [material('muscle'), 2],
      ],
    ],
    [
      'opaque barium',
      [
        [material('soft tissue'), 10],
        [barium, 2],
        [material('soft tissue'), 8],
      ],
    ],
  ] as const)(
    'absorbed, transmitted and returned by %s adds up to what came in, to 1e-4',
    (_, layers) => {
      const { nodes, at } = energyShares(layers);
      const worst = Math.max(...[...nodes].map((energy, i) => Math.abs(sum(at(i)) / energy - 1)));
      expect(worst).toBeLessThan(1e-4);
    },
  );
});

describe('the scattering kernel', () => {
  const nodes = nodesFor(slabsOf(stackOf([[water, 1]])), idealDetector(), null).energies_keV;
  const kernel = kernelOf(water, nodes);

  it('loses energy only, and as much in every direction as Compton scattering takes', () => {
    nodes.forEach((energy, i) => {
      for (let row = 0; row < rows; row++) {
        const scattered = kernel.scatteredEnergy[i * rows + row];
        expect(scattered).toBeGreaterThan(0);
        expect(scattered).toBeLessThan(kernel.attenuation[i] * energy);
      }
    });
  });

  it('is positive towards both hemispheres and sums to the scattering coefficient', () => {
    const i = nodes.length - 1;
    const levels = i - kernel.lowest[i] + 1;
    for (let row = 0; row < rows; row++) {
      let coefficient = 0;
      for (let level = 0; level < levels; level++) {
        for (let to = 0; to < ordinates; to++) {
          const even = kernel.blocks[i][level * 2 * blockLength + row * ordinates + to];
          const odd = kernel.blocks[i][(2 * level + 1) * blockLength + row * ordinates + to];
          expect(Math.abs(odd)).toBeLessThanOrEqual(even * (1 + 1e-12));
          coefficient += 2 * even;
        }
      }
      // Water at 150 keV: 0.1505 cm²/g in all, of which photoelectric 0.0003.
      expect(coefficient / kernel.attenuation[i]).toBeCloseTo(0.998, 2);
    }
  });
});

describe('the directions', () => {
  it('weigh 1 per hemisphere and average μ to one half', () => {
    expect(sum([...ordinateWeights])).toBeCloseTo(1, 14);
    expect(sum([...ordinateWeights].map((weight, d) => weight * cosines[d]))).toBeCloseTo(0.5, 14);
  });
});

describe('the cells', () => {
  it('fill every slab and are finest at its faces', () => {
    const mesh = meshOf(
      slabsOf(
        stackOf([
          [water, 20],
          [material('cortical bone'), 2],
        ]),
      ),
    );
    for (const { slab, from, to } of mesh.slabs) {
      const widths = [...mesh.width_cm.subarray(from, to)];
      expect(sum(widths)).toBeCloseTo(slab.thickness_cm, 12);
      expect(Math.min(...widths)).toBeCloseTo(widths[0], 12);
      expect(widths.at(-1)).toBeCloseTo(widths[0], 12);
    }
  });
});

import { agentMixture } from '../../../materials/index.js';
import {
  type Estimated,
  impartedEnergy_keV,
  layerEnergy_keV,
  scatterToPrimary,
} from '../../../physics/transport/index.js';
import { flyThrough, named, slabStack } from './slab-runs.js';

/** A published unit-test number of photon transport beside what a run gives. */
export interface UnitNumber {
  readonly name: string;
  readonly expected: number;
  readonly expectedError: number;
  readonly found: Estimated;
}

const source = { gaps_mm: [0, 100, 200], fieldWidths_mm: [200, 300] };

/** Thickness cm, energy keV, then value and standard error by column. */
const waterSlabs = [
  [10, 40, [1.3017, 0.001], [1.3632, 0.0011], [1.0043, 0.001], [0.6473, 0.0007], [26.62, 0.011]],
  [10, 60, [1.2802, 0.0011], [1.3888, 0.0011], [0.9579, 0.0009], [0.5863, 0.0007], [27.397, 0.012]],
  [20, 60, [2.7012, 0.0039], [3.2708, 0.0046], [2.2205, 0.0032], [1.3971, 0.0023], [40.896, 0.024]],
  // biome-ignore lint/suspicious/noApproximativeNumericConstant: a scatter-to-primary ratio, not π
  [20, 80, [2.5275, 0.0034], [3.142, 0.0036], [2.0897, 0.0028], [1.3018, 0.0021], [49.723, 0.024]],
] as const;

/**
 * Water, parallel beam, energy-weighted SPR on the axis, ideal detector, no fluorescence: values of
 * a separately written photon Monte Carlo (computed, not published).
 */
export function waterNumbers(photons: number, seed: number): UnitNumber[] {
  return waterSlabs.flatMap(([thickness_cm, energy_keV, ...columns], i) => {
    const stack = slabStack([[named('water'), thickness_cm]]);
    const run = { photons, seed: seed + i };
    const { input, scores } = flyThrough(stack, energy_keV, run, source);
    const spr = (gap: number, field: number) => scatterToPrimary(input, scores, { gap, field });
    const found = [spr(0, 0), spr(0, 1), spr(1, 1), spr(2, 1), impartedEnergy_keV(input, scores)];
    const names = [
      'SPR gap 0, 20x20',
      'SPR gap 0, 30x30',
      'SPR gap 10, 30x30',
      'SPR gap 20, 30x30',
      'imparted keV per photon',
    ];
    const numbers = columns.map(([expected, expectedError], column) => ({
      name: `water ${thickness_cm} cm, ${energy_keV} keV: ${names[column]}`,
      expected,
      expectedError,
      found: found[column],
    }));
    if (thickness_cm !== 20 || energy_keV !== 60) return numbers;
    // The last printed digit is all that is known of the error of these two.
    const first = (component: 'firstCompton' | 'firstRayleigh', expected: number) => ({
      name: `water 20 cm, 60 keV: ${component}, gap 0, 30x30`,
      expected,
      expectedError: 0.0005,
      found: scatterToPrimary(input, scores, { field: 1, component }),
    });
    return [...numbers, first('firstCompton', 0.6964), first('firstRayleigh', 0.2272)];
  });
}

const layerNumbers = [
  [5.368, 0.012],
  [11.341, 0.018],
  [16.391, 0.02],
  [3.75, 0.007],
  [3.85, 0.006],
  [0.463, 0.002],
  [0.424, 0.001],
] as const;
const iodineLayer = 3;

/** Seven layers, the fourth blood with 10 mg I/mL, 60 keV, contact, 30×30; same source. */
export function stackNumbers(photons: number, seed: number): UnitNumber[] {
  const stack = sevenLayers();
  const run = flyThrough(stack, 60, { photons, seed });
  const withK = flyThrough(stack, 60, { photons, seed: seed + 1 }, { fluorescence: true });
  return [
    {
      name: 'seven layers: SPR gap 0, 30x30',
      expected: 3.4947,
      expectedError: 0.0067,
      found: scatterToPrimary(run.input, run.scores),
    },
    ...layerNumbers.map(([expected, expectedError], layer) => ({
      name: `seven layers: keV per photon in layer ${layer + 1}`,
      expected,
      expectedError,
      found: layerEnergy_keV(run.input, run.scores, layer),
    })),
    {
      name: 'seven layers with fluorescence: keV per photon in layer 4',
      expected: 3,
      expectedError: 0.007,
      found: layerEnergy_keV(withK.input, withK.scores, iodineLayer),
    },
  ];
}

export function sevenLayers() {
  const opacified = agentMixture({
    agent: 'iodine',
    amount: { value: 10, unit: 'mg element/mL' },
    carrier: named('blood'),
  }).material;
  const [adipose, muscle, soft] = ['adipose', 'muscle', 'soft tissue'].map(named);
  return slabStack([
    [adipose, 2],
    [muscle, 3],
    [soft, 7],
    [opacified, 1],
    [soft, 5],
    [muscle, 1],
    [adipose, 2],
  ]);
}

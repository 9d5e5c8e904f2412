import { transportBatch } from '../../physics/transport/batch.js';
import {
  buildTransportInput,
  idealDetector,
  type TransportInput,
} from '../../physics/transport/index.js';
import { nextUniform, randomStream } from '../../physics/transport/random.js';
import { monoenergetic, named, slabStack } from '../physics/transport/slab-runs.js';
import { sevenLayers } from '../physics/transport/unit-numbers.js';
import type { Contest } from './bench.js';

const photons = 10_000;

const randomLogarithms = (): number => {
  const stream = randomStream(1, 0);
  let sum = 0;
  for (let i = 0; i < photons; i++) sum += Math.log(nextUniform(stream));
  return sum;
};

const fly = (input: TransportInput) => () => transportBatch(input, { index: 0, photons });
const run = { photons, seed: 1 };
const water = slabStack([[named('water'), 20]]);
const build = (stack: typeof water, energy_keV: number, options = {}): TransportInput =>
  buildTransportInput(stack, monoenergetic(energy_keV), idealDetector, null, run, options);
const cone = { ...water, beam: 'point', sourceToSkin_mm: 700, exitToDetector_mm: 100 } as const;

/**
 * Photons per second of a core = 10⁴ / time per call. Against the bare loop a photon through 20 cm of
 * water takes as long as some twenty random numbers with their logarithms.
 */
export const contests: readonly Contest[] = [
  {
    title: `transport of ${photons} photons`,
    contenders: [
      { name: `the bare loop: ${photons} random numbers and logarithms`, run: randomLogarithms },
      { name: 'pencil, 20 cm water, 80 keV', run: fly(build(water, 80)) },
      { name: 'pencil, seven layers with iodine, 60 keV', run: fly(build(sevenLayers(), 60)) },
      { name: 'cone, 10 cm gap, 20 cm water, 80 keV', run: fly(build(cone, 80)) },
      {
        name: 'finite body in air, energy only, 60 keV',
        run: fly(build(cone, 60, { air: true, lateral_mm: [300, 300], scatter: false })),
      },
    ],
  },
];

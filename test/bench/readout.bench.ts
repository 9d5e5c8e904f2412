import { readBeam } from '../../physics/readout/index.js';
import { evenScatter, readAbdomen } from '../physics/readout/read-abdomen.js';
import type { Contest } from './bench.js';

const { weights, atDetector } = readAbdomen({}, { scatterOn: evenScatter(2) });
const { energies_keV, fluence_per_mm2 } = atDetector;

const exponentials = (): number => {
  let sum = 0;
  for (const energy of energies_keV) sum += Math.exp(-0.01 * energy);
  return sum;
};

export const contests: readonly Contest[] = [
  {
    title: `reading a vessel behind an abdomen on ${energies_keV.length} channels`,
    contenders: [
      { name: 'the bare loop of its exponentials', run: exponentials },
      { name: 'readBeam', run: () => readBeam(weights, fluence_per_mm2) },
    ],
  },
];

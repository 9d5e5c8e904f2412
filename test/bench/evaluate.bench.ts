import { operatingPoint } from '../../physics/operating-point.js';
import { outputBeam } from '../../physics/output-beam.js';
import { prepare } from '../../physics/prepare.js';
import { sdnrAt } from '../../physics/readout/index.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { yieldOf } from '../../physics/yield.js';
import { sampleCase } from '../physics/sample-case.js';
import type { Contest } from './bench.js';

const c = sampleCase().case;
const size = sizesOf(c.patient)[0];
const technique = c.techniques[1];
const point = operatingPoint(c, technique, size);
if (!('made' in point)) throw new Error('the sample case cannot be placed');
const { made } = point;
const { spectrum } = outputBeam(prepare(c), technique.potential_kV, technique.filter);
if (!spectrum) throw new Error('the sample case has no beam');

/** One each to the skin, to the reference point and through the patient to the detector. */
const exponentialsPerChannel = 3;

/** The exponentials an evaluation cannot do without, and nothing else. */
const exponentials = (): number => {
  let sum = 0;
  for (let k = 1; k <= exponentialsPerChannel; k++) {
    for (const energy of spectrum.energies_keV) sum += Math.exp(-0.01 * k * energy);
  }
  return sum;
};

/** From the spectrum behind the filter to SdNR and every dose quantity. */
const evaluation = (): number =>
  sdnrAt(yieldOf(c, made.placement, made.setting, technique.acquisition, spectrum).readout, 10);

export const contests: readonly Contest[] = [
  {
    title: `one evaluation, spectrum to SdNR and every dose quantity, ${spectrum.energies_keV.length} channels`,
    contenders: [
      {
        name: `the bare loop of its ${exponentialsPerChannel} exponentials a channel`,
        run: exponentials,
      },
      { name: 'yieldOf and sdnrAt', run: evaluation },
    ],
  },
];

import { namedMaterial } from '../../materials/index.js';
import {
  airKerma_uGy,
  attenuate,
  beamQuality,
  halfValueLayer_mm,
  type MaterialLayer,
  tungstenSpectrum,
} from '../../physics/beam/index.js';
import type { Contest } from './bench.js';

const layer = (name: string, thickness_mm: number): MaterialLayer => {
  const material = namedMaterial(name);
  if (!material) throw new Error(`${name}: no such material`);
  return { material, thickness_mm };
};
const layers = [layer('aluminium', 2.5), layer('copper', 0.2)];
const setting = { potential_kV: 80, anodeAngle_deg: 12 };
const beam = attenuate(tungstenSpectrum(setting), layers);

const exponentials = (): number => {
  let sum = 0;
  for (const energy of beam.energies_keV) sum += Math.exp(-0.01 * energy);
  return sum;
};

export const contests: readonly Contest[] = [
  {
    title: `a tube beam of ${beam.energies_keV.length} channels`,
    contenders: [
      { name: 'the bare loop of its exponentials', run: exponentials },
      { name: 'tungstenSpectrum', run: () => tungstenSpectrum(setting) },
      {
        name: 'tungstenSpectrum, attenuate, airKerma_uGy',
        run: () => airKerma_uGy(attenuate(tungstenSpectrum(setting), layers)),
      },
      { name: 'halfValueLayer_mm', run: () => halfValueLayer_mm(beam, layers[0].material) },
      { name: 'beamQuality', run: () => beamQuality(beam, 80) },
    ],
  },
];

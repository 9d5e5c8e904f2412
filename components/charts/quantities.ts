import type { Ratios } from '../../physics/results.js';
import { beamQuantities } from './quantities/beam.js';
import { detailQuantities } from './quantities/detail.js';
import { detectorQuantities } from './quantities/detector.js';
import { doseQuantities } from './quantities/dose.js';
import { exposureQuantities } from './quantities/exposure.js';
import { meritQuantities } from './quantities/merit.js';
import type { Quantity } from './quantities/quantity.js';
import { scatterQuantities } from './quantities/scatter.js';

export { type Quantity, type QuantityGroup, quantityGroups } from './quantities/quantity.js';

/** Every number the desk and the dossier show, down the beam. One entry here is one row anywhere. */
export const quantities: readonly Quantity[] = [
  ...beamQuantities,
  ...exposureQuantities,
  ...doseQuantities,
  ...detailQuantities,
  ...scatterQuantities,
  ...detectorQuantities,
  ...meritQuantities,
];

/** The quantity called `id`; asking for one that is not there is a programming error. */
export function quantity(id: string): Quantity {
  const found = quantities.find((entry) => entry.id === id);
  if (!found) throw new Error(`no quantity called ${id}`);
  return found;
}

/** Names of the ratios in a comparison, in the order they are set. */
export const ratioNames: readonly (readonly [keyof Ratios, string])[] = [
  ['incidentAirKerma', 'incident air kerma'],
  ['entranceSurfaceAirKerma', 'entrance surface air kerma'],
  ['kermaAreaProduct', 'kerma–area product'],
  ['energyImparted', 'energy imparted'],
  ['meanAbsorbedDose', 'mean absorbed dose'],
  ['tubeLoad', 'tube load'],
  ['power', 'power'],
  ['subjectContrast', 'subject contrast'],
  ['detectedContrast', 'detected contrast'],
  ['sdnr', 'SdNR'],
];

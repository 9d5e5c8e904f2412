import type { Evaluation } from '../../../physics/results.js';
import { inGroup } from './quantity.js';

const halfValue = (evaluation: Evaluation, material: string) =>
  evaluation.beam.halfValueLayers.find((row) => row.material === material) ?? null;

/** What leaves the tube and what the patient makes of it. */
export const beamQuantities = inGroup('beam', [
  {
    id: 'halfValueLayer',
    name: 'Half-value layer',
    unit: 'mm Al',
    of: (e) => halfValue(e, 'aluminium')?.first_mm ?? null,
    words:
      'Aluminium that halves the air kerma of the narrow beam behind tube and filter, in vacuum; a reading in air comes out a little higher.',
  },
  {
    id: 'meanEnergy',
    name: 'Mean energy of the beam',
    unit: 'keV',
    of: (e) => e.beam.meanEnergy_keV,
    words:
      'Mean photon energy of the beam behind tube and filter, in vacuum, weighted by photon number.',
  },
  {
    id: 'exitMeanEnergy',
    name: 'Mean energy behind the patient',
    unit: 'keV',
    of: (e) => e.transmission.exitMeanEnergy_keV,
    words:
      'Mean photon energy of the primary beam at the exit face, after all layers have hardened it, weighted by photon number.',
  },
  {
    id: 'primaryTransmission',
    name: 'Primary transmission',
    unit: '',
    of: (e) => e.transmission.primary,
    words:
      'Air kerma at the exit face over air kerma at the skin, primary photons only, no detail in the way, inverse square removed.',
  },
]);

import type { AlongBeam } from '../../../physics/along-beam.js';

/** An invented beam with the shape of a real one: exponential in the patient, inverse square outside. */
const along = (technique: string, photons: number, peak_keV: number): AlongBeam => {
  const distances_mm = [848, ...Array.from({ length: 20 }, (_, i) => 848 + 10.1 * (i + 1)), 1150];
  const energies_keV = Array.from({ length: 60 }, (_, i) => 15.5 + i);
  return {
    technique,
    size: 'median',
    distances_mm,
    primaryFluence_per_mm2: distances_mm.map(
      (d) => photons * (848 / d) ** 2 * Math.exp(-0.022 * Math.min(202, d - 848)),
    ),
    atDetail: {
      energies_keV,
      fluence_per_mm2_per_keV: energies_keV.map(
        (e) => (photons / 300) * Math.exp(-(((e - peak_keV) / 12) ** 2)),
      ),
      lines: [{ energy_keV: 59.3, fluence_per_mm2: photons / 90 }],
    },
    kEdges: [{ element: 'I', energy_keV: 33.17 }],
  };
};

export const sampleAlong: AlongBeam[] = [along('Current', 2.1e7, 48), along('Proposed', 1.1e7, 52)];

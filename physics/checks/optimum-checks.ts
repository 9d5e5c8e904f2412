import { massAttenuation, massAttenuationOn } from '../../materials/index.js';
import { defaults } from '../case/defaults.js';
import type { Detector } from '../case/schema.js';
import { detectorResponse } from '../readout/index.js';
import { scatterResponses } from '../scatter/index.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { referenceRows } from './reference-rows.js';

const depth_cm = 15;
const water = () => materialOf('water');

/**
 * Best single photon energy behind 15 cm of water: least energy imparted for a signal difference to
 * noise that an ideal counter would see, without scatter (Huda et al. 2002). A thin detail's signal
 * difference is N·T·Δμ·t and its noise √(N·T), so SdNR² per energy imparted goes as
 * T(E)·Δμ(E)²/(E·f(E)), f being the share of the incident energy absorbed. The low-Z detail is taken
 * as water of higher density: Δμ as water's μ.
 */
export const optimumChecks = (): CheckRow[] => {
  const { energies_keV, absorbedFraction } = waterSlab();
  const attenuation = massAttenuationOn(water(), energies_keV);
  const bestEnergy_keV = (contrastOf: (energy_keV: number) => number): number => {
    const merit = energies_keV.map(
      (energy, i) =>
        (Math.exp(-attenuation[i] * depth_cm) * contrastOf(energy) ** 2) /
        (energy * absorbedFraction[i]),
    );
    return energies_keV[merit.indexOf(Math.max(...merit))];
  };
  return referenceRows('optimum_energy').map((row) =>
    row.item.includes('iodine')
      ? checkRow(
          row,
          bestEnergy_keV((energy) => massAttenuation(materialOf('iodine'), energy)),
          {
            absolute: 2.5,
          },
        )
      : checkRow(
          row,
          bestEnergy_keV((energy) => massAttenuation(water(), energy)),
          {
            absolute: 6,
          },
        ),
  );
};

/** Share of incident energy that 15 cm of water absorb in a broad beam, with iodine's edge a node. */
const waterSlab = () => {
  const detector: Detector = {
    ...defaults.room.detector,
    airKerma_uGy: { ...defaults.room.detector.airKerma_uGy },
    material: 'ideal',
  };
  const { energies_keV, layerAbsorbedFraction } = scatterResponses(
    {
      sizeName: '',
      thickness_mm: 10 * depth_cm,
      layers: [{ name: 'water', material: water(), thickness_mm: 10 * depth_cm }],
      supportEntrance: [],
      supportExit: [],
      beam: 'parallel',
      sourceToDetector_mm: 1000,
      sourceToSkin_mm: 750,
      exitToDetector_mm: 100,
      field_mm: [300, 300],
      air: false,
    },
    { ...detectorResponse(detector, materialOf), edges_keV: [iodineEdge_keV] },
    null,
  );
  const absorbedFraction = layerAbsorbedFraction?.[0] ?? new Float64Array(energies_keV.length);
  return { energies_keV, absorbedFraction };
};

const iodineEdge_keV = 33.169;

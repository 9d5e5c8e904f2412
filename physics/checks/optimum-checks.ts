import { absorptionEdges, massAttenuation, massAttenuationOn } from '../../materials/index.js';
import { scatterResponses } from '../scatter/index.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { type ReferenceRow, referenceRows } from './reference-rows.js';
import { idealDetector, slabStack } from './slab.js';

const depth_cm = 15;

/**
 * Best single photon energy behind 15 cm of water: least energy imparted for a signal difference to
 * noise that an ideal counter would see, without scatter (Huda et al. 2002). A thin detail's signal
 * difference is N·T·Δμ·t and its noise √(N·T), so SdNR² per energy imparted goes as
 * T(E)·Δμ(E)²/(E·f(E)), f being the share of the incident energy absorbed. The low-Z detail is taken
 * as water of higher density: Δμ as water's μ.
 */
export const optimumChecks = (): CheckRow[] => {
  const bestEnergy_keV = meritByEnergy();
  return referenceRows('optimum_energy').map((row: ReferenceRow) => {
    const isIodine = row.item.includes('iodine');
    const detail = materialOf(isIodine ? 'iodine' : 'water');
    return checkRow(
      row,
      bestEnergy_keV((energy) => massAttenuation(detail, energy)),
      {
        absolute: isIodine ? 2.5 : 6,
      },
    );
  });
};

const meritByEnergy = () => {
  const water = materialOf('water');
  const edges_keV = absorptionEdges(materialOf('iodine'), 30, 40).map((edge) => edge.energy_keV);
  const stack = slabStack('water', 10 * depth_cm, 300);
  const responses = scatterResponses(stack, idealDetector(edges_keV), null);
  const { energies_keV, layerAbsorbedFraction } = responses;
  const attenuation = massAttenuationOn(water, energies_keV);
  return (contrastOf: (energy_keV: number) => number): number => {
    const merit = energies_keV.map(
      (energy, i) =>
        (Math.exp(-attenuation[i] * depth_cm) * contrastOf(energy) ** 2) /
        (energy * (layerAbsorbedFraction?.[0][i] ?? Number.NaN)),
    );
    return energies_keV[merit.indexOf(Math.max(...merit))];
  };
};

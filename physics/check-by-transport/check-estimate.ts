import type { OperatingPoint } from '../operating-point.js';
import { responsesOn } from '../scatter/index.js';
import type { TransportEstimate } from '../transport/index.js';

/** What the estimate says of the quantities a check compares; dose is per frame as set. */
export interface CheckEstimate extends TransportEstimate {
  readonly spr: number;
  readonly sprBehindGrid: number | null;
  readonly scatterFraction: number;
  readonly energyImparted_mJ: number;
  readonly layerAbsorbedDose_mGy: readonly number[];
}

/** The values `weigh` prints for an operating point. */
export const checkEstimate = ({ made, tubeLoad_mAs }: OperatingPoint): CheckEstimate => {
  const { readout, dose, chain } = made;
  const perFrame = (value: number): number => value * tubeLoad_mAs;
  return {
    spr: readout.spr,
    sprBehindGrid: chain.grid ? readout.sprBehindGrid : null,
    scatterFraction: readout.spr / (1 + readout.spr),
    backscatterFactor: dose.backscatterFactor,
    energyImparted_mJ: perFrame(dose.energyImparted_mJ_per_mAs),
    layerAbsorbedDose_mGy: [...dose.layerAbsorbedDose_mGy_per_mAs].map(perFrame),
    layerAbsorbedFraction: layerAbsorbedFractions(made),
  };
};

/** Energy absorbed by each layer over the energy incident on the skin. */
const layerAbsorbedFractions = ({ placement, skin }: OperatingPoint['made']): number[] => {
  const { layerAbsorbedFraction } = responsesOn(placement.responses, skin.energies_keV);
  const energies = skin.fluence_per_mm2.map((photons, i) => photons * skin.energies_keV[i]);
  const incident = energies.reduce((sum, energy) => sum + energy, 0);
  return layerAbsorbedFraction.map(
    (fraction) => energies.reduce((sum, energy, i) => sum + energy * fraction[i], 0) / incident,
  );
};

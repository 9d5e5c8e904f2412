import { comptonEnergyRatio } from '../../materials/index.js';
import { kept } from '../../materials/kept.js';
import { quantileCount, rowCount, rowPositions } from './angle-quantiles.js';
import { nodeEnergies_keV, tableStride } from './energy-nodes.js';
import { angleStride, type MatterTables } from './matter-tables.js';

/**
 * Energy left by a collision on average, keV, per material and energy node: photoelectric events
 * leave all but their K fluorescence, Compton scattering the recoil energy. Taken from the tables
 * the photons fly by, so that it is their exact expectation.
 */
export const meanDeposits_keV = (matter: MatterTables): Float32Array =>
  kept(known, matter, () => tabulate(matter));

const known = new WeakMap<MatterTables, Float32Array>();

function tabulate(matter: MatterTables): Float32Array {
  const { comptonShare, scatterShare } = matter;
  return comptonShare.map((compton, at) => {
    const substance = Math.floor(at / tableStride);
    const node = at - substance * tableStride;
    const energy_keV = nodeEnergies_keV[node];
    const recoil =
      compton === 0 ? 0 : compton * energy_keV * recoilFraction(matter, substance, node);
    const absorbed = 1 - scatterShare[at];
    return recoil + absorbed * (energy_keV - fluorescence_keV(matter, substance, node));
  });
}

function recoilFraction(matter: MatterTables, substance: number, node: number): number {
  const row = Math.min(rowCount - 2, Math.floor(rowPositions[node]));
  const above = rowPositions[node] - row;
  const at = substance * angleStride + row * quantileCount;
  const energy_keV = nodeEnergies_keV[node];
  return (
    (1 - above) * rowRecoil(matter.comptonCosines, at, energy_keV) +
    above * rowRecoil(matter.comptonCosines, at + quantileCount, energy_keV)
  );
}

// Trapezoids over the quantiles, each as likely as the next.
function rowRecoil(cosines: Float32Array, at: number, energy_keV: number): number {
  let sum = 0;
  for (let k = 0; k < quantileCount; k++) {
    const isEnd = k === 0 || k === quantileCount - 1;
    sum += (isEnd ? 0.5 : 1) * (1 - comptonEnergyRatio(energy_keV, cosines[at + k]));
  }
  return sum / (quantileCount - 1);
}

function fluorescence_keV({ fluorescence }: MatterTables, substance: number, node: number): number {
  const { emission, firstEmitter, firstLine, lineCumulative, lineEnergies_keV } = fluorescence;
  let mean_keV = 0;
  let before = 0;
  for (let e = firstEmitter[substance]; e < firstEmitter[substance + 1]; e++) {
    const upTo = emission[e * tableStride + node];
    for (let line = firstLine[e]; line < firstLine[e + 1]; line++) {
      const share = lineCumulative[line] - (line > firstLine[e] ? lineCumulative[line - 1] : 0);
      mean_keV += (upTo - before) * share * lineEnergies_keV[line];
    }
    before = upTo;
  }
  return mean_keV;
}

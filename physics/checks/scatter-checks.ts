import {
  aluminiumForHalfValueLayer_mm,
  attenuate,
  type Spectrum,
  tungstenSpectrum,
} from '../beam/index.js';
import { backscatterFactor } from '../dose/backscatter.js';
import { responsesOn, type ScatterResponses, scatterResponses } from '../scatter/index.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { type ReferenceRow, referenceRows } from './reference-rows.js';
import { idealDetector, slabStack } from './slab.js';

const energies_keV = [30, 40, 50, 60, 80, 100, 120];

/** Scatter over primary behind water and PMMA slabs, against a separate Monte Carlo. */
export const scatterChecks = (): CheckRow[] => {
  const known = new Map<string, ScatterResponses>();
  return referenceRows('scatter_spr').flatMap((row) => {
    const slab = /SPR (\w+) (\d+) cm, (\d+)x\d+ cm, gap (\d+) cm, (\d+) keV/.exec(row.item);
    if (row.set !== 'SPR computed' || !slab) return [];
    const [thickness_cm, field_cm, gap_cm, energy_keV] = slab.slice(2).map(Number);
    const key = slab.slice(1, 5).join();
    const responses =
      known.get(key) ??
      scatterResponses(
        slabStack(slab[1], 10 * thickness_cm, 10 * field_cm, { exitToDetector_mm: 10 * gap_cm }),
        idealDetector(energies_keV),
        null,
      );
    known.set(key, responses);
    const at = responses.energies_keV.indexOf(energy_keV);
    return [checkRow(row, responses.withoutGrid.signal[at] ?? null, { relative: 0.03 })];
  });
};

const phantoms: Readonly<Record<string, string>> = {
  water: 'water',
  'ICRU tissue': 'soft tissue ICRU four-component',
  PMMA: 'pmma',
};

/** Backscatter factors of 15 cm phantoms at 100 cm, against Petoussi-Henss et al. 1998. */
export const backscatterChecks = (): CheckRow[] =>
  referenceRows('backscatter').map((row) => {
    const [, phantom, field_cm] = /^B (.+) (\d+)x\d+ cm$/.exec(row.item) ?? [];
    const beam = beamOf(row);
    // 15 cm of phantom behind 100 cm: the field is stated at the skin, 1.15 times as wide behind it.
    const stack = slabStack(phantoms[phantom], 150, 11.5 * Number(field_cm), { beam: 'point' });
    const { backscatter } = responsesOn(
      scatterResponses(stack, idealDetector(), null),
      beam.energies_keV,
    );
    return checkRow(row, backscatter && backscatterFactor(beam, backscatter), { relative: 0.03 });
  });

/** `50 kV, 2.5 Al mm, HVL 1.74 mm Al`: filtered until the half-value layer is reached. */
const beamOf = ({ conditions }: ReferenceRow): Spectrum => {
  const [, potential_kV, hvl_mmAl] = /^(\d+) kV, .*HVL ([\d.]+) mm Al/.exec(conditions) ?? [];
  const tube = tungstenSpectrum({ potential_kV: Number(potential_kV), anodeAngle_deg: 12 });
  const thickness_mm = aluminiumForHalfValueLayer_mm(tube, Number(hvl_mmAl)) ?? 0;
  return attenuate(tube, [{ material: materialOf('aluminium'), thickness_mm }]);
};

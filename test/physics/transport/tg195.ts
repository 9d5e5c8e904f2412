import {
  boxEnergies_keV,
  type Estimated,
  impartedEnergy_keV,
} from '../../../physics/transport/index.js';
import { readReference } from '../../reference/read-reference.js';
import { flyThrough, named, type Run, slabStack } from './slab-runs.js';

/** A value of AAPM Report 195 case 2 beside ours, eV per emitted photon. */
export interface Case2Value {
  readonly item: string;
  readonly expected_eV: number;
  readonly tolerance: number;
  readonly found_eV: Estimated;
}

/** Cube centres from the body's centre, cm: 1–5 in the mid plane, 6–9 along the axis. */
const cubes = [
  [0, -15, 0],
  [-15, 0, 0],
  [0, 0, 0],
  [15, 0, 0],
  [0, 15, 0],
  [0, 0, -6],
  [0, 0, -3],
  [0, 0, 3],
  [0, 0, 6],
] as const;

/**
 * AAPM Report 195 (Sechopoulos et al. 2015), case 2 at 0°, 56.4 keV: a 39 × 39 × 20 cm body of soft
 * tissue in air, source at 180 cm from a 39 × 39 cm detector, 5 cm behind it.
 */
export function flyCase2(photons: number, seed: number): Run {
  const body = slabStack([[named('soft tissue ICRU 46'), 20]], {
    beam: 'point',
    sourceToDetector_mm: 1800,
    exitToDetector_mm: 50,
    field_mm: [390, 390],
    air: true,
  });
  const boxes = cubes.map(([x, y, z], i) => ({
    name: `VOI ${i + 1}`,
    centre_cm: [x, y, 10 + z] as const,
    half_cm: [1.5, 1.5, 1.5] as const,
  }));
  const options = { lateral_mm: [390, 390] as const, boxes, scatter: false };
  return flyThrough(body, 56.4, { photons, seed }, options);
}

const in_eV = ({ value, standardError }: Estimated): Estimated => ({
  value: value * 1000,
  standardError: standardError === null ? null : standardError * 1000,
});

/** The run beside the report's values (recalled; tolerances as in the file). */
export function case2Values({ input, scores }: Run): Case2Value[] {
  const rows = readReference('tg195.csv').filter(({ set }) => set === 'TG195 case2');
  const read = (start: string, found: Estimated): Case2Value => {
    const row = rows.find(({ item }) => item.startsWith(start));
    if (!row) throw new Error(`tg195.csv: no row ${start}`);
    return {
      item: row.item,
      expected_eV: Number(row.value),
      tolerance: Number.parseFloat(row.tolerance) / 100,
      found_eV: in_eV(found),
    };
  };
  const energies = boxEnergies_keV(input, scores);
  return [
    read('energy imparted', impartedEnergy_keV(input, scores)),
    ...energies.map((energy, i) => read(`VOI ${i + 1} energy`, energy)),
  ];
}

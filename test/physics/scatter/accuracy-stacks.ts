import { agentMixture, type Material } from '../../../materials/index.js';
import { attenuate, type Spectrum, tungstenSpectrum } from '../../../physics/beam/index.js';
import { defaults } from '../../../physics/case/defaults.js';
import { detectorResponse, gridGeometry, gridTable } from '../../../physics/readout/index.js';
import type { Stack } from '../../../physics/stack/stack.js';
import { material, stackOf } from './stacks.js';

/** Stacks (all invented) on which the scatter estimate is held against photon transport. */
export interface AccuracyStack {
  readonly name: string;
  /**
   * `tried`: used while the estimate was made. `unseen`: not used for a choice, but looked at again after
   * each. `opaque`: next to no primary. `untouched`: chosen and run once, on 2026-12-01, when every
   * constant stood; no constant may be changed for them.
   */
  readonly role: 'tried' | 'unseen' | 'opaque' | 'untouched';
  readonly layers: readonly (readonly [Material, number])[];
}

const iodine = (mg_per_mL: number): Material =>
  agentMixture({
    agent: 'iodine',
    amount: { value: mg_per_mL, unit: 'mg element/mL' },
    carrier: material('blood'),
  }).material;
const barium = agentMixture({
  agent: 'barium sulfate',
  amount: { value: 400, unit: 'mg element/mL' },
  carrier: material('water'),
}).material;
const soft = material('soft tissue');
const adipose = material('adipose');
const muscle = material('muscle');
const bone = material('cortical bone');
const skin = material('skin');

export const accuracyStacks: readonly AccuracyStack[] = [
  { name: 'water', role: 'tried', layers: [[material('water'), 20]] },
  {
    name: 'iodine at entrance',
    role: 'tried',
    layers: [
      [soft, 2],
      [iodine(10), 2],
      [soft, 16],
    ],
  },
  {
    name: 'iodine in centre',
    role: 'tried',
    layers: [
      [soft, 10],
      [iodine(100), 0.5],
      [soft, 10],
    ],
  },
  {
    name: 'iodine at exit',
    role: 'tried',
    layers: [
      [soft, 18],
      [iodine(300), 0.3],
      [soft, 1.5],
    ],
  },
  {
    name: 'chest',
    role: 'tried',
    layers: [
      [adipose, 1],
      [muscle, 2],
      [material('lung'), 16],
      [muscle, 2],
      [adipose, 1],
    ],
  },
  {
    name: 'skull',
    role: 'tried',
    layers: [
      [skin, 0.4],
      [bone, 0.6],
      [material('brain'), 14],
      [bone, 0.6],
      [skin, 0.4],
    ],
  },
  {
    name: 'extremity',
    role: 'tried',
    layers: [
      [muscle, 3],
      [bone, 1.5],
      [muscle, 3],
    ],
  },
  {
    name: 'pelvis',
    role: 'tried',
    layers: [
      [adipose, 3],
      [muscle, 5],
      [bone, 1.5],
      [soft, 7],
      [bone, 1],
      [muscle, 4],
      [adipose, 2],
    ],
  },
  {
    name: 'breast',
    role: 'tried',
    layers: [
      [skin, 0.2],
      [material('breast'), 5],
      [skin, 0.2],
    ],
  },
  {
    name: 'large abdomen',
    role: 'unseen',
    layers: [
      [adipose, 5],
      [muscle, 2],
      [soft, 17],
      [bone, 2],
      [muscle, 3],
      [adipose, 1],
    ],
  },
  {
    name: 'heart',
    role: 'unseen',
    layers: [
      [muscle, 3],
      [material('lung'), 5],
      [iodine(60), 3],
      [material('lung'), 6],
      [muscle, 3],
    ],
  },
  {
    name: 'opaque barium',
    role: 'opaque',
    layers: [
      [soft, 10],
      [barium, 3],
      [soft, 8],
    ],
  },
  {
    name: 'newborn chest',
    role: 'untouched',
    layers: [
      [muscle, 1],
      [material('lung'), 5],
      [soft, 2],
    ],
  },
  {
    name: 'knee with iodine',
    role: 'untouched',
    layers: [
      [muscle, 3.5],
      [iodine(150), 0.5],
      [bone, 1.5],
      [soft, 3],
      [bone, 1],
      [muscle, 2.5],
    ],
  },
];

export const accuracyPotentials_kV = [60, 80, 120] as const;

/** Gap and field of each stack, cm; stacks take the two lists in turn. */
const geometries = [
  [
    [5, 20],
    [10, 30],
    [15, 20],
  ],
  [
    [5, 30],
    [10, 20],
    [15, 30],
  ],
] as const;

/** A stack as a point source 110 cm from the detector sees it. */
export function accuracyGeometries(
  index: number,
): { gap_cm: number; field_cm: number; stack: Stack }[] {
  return geometries[index % 2].map(([gap_cm, field_cm]) => ({
    gap_cm,
    field_cm,
    stack: stackOf(accuracyStacks[index].layers, {
      beam: 'point',
      sourceToDetector_mm: 1100,
      exitToDetector_mm: gap_cm * 10,
      field_mm: [field_cm * 10, field_cm * 10],
    }),
  }));
}

const { detector: assumedDetector } = defaults.room;

/** 200 mg/cm² caesium iodide. */
export const accuracyDetector = detectorResponse(
  { ...assumedDetector, response: 'energy-integrating' } as Parameters<typeof detectorResponse>[0],
  material,
);

/** 10:1, 40 lead strips per cm, aluminium between. */
export const accuracyGrid = gridTable(
  gridGeometry(
    {
      ratio: 10,
      strips_per_cm: 40,
      strip: { material: 'lead', thickness_um: 36 },
      interspace: { material: 'aluminium' },
      cover: [{ material: 'carbon fibre', thickness_mm: 0.5 }],
      measured: null,
    },
    material,
  ),
);

/** The beam at the skin: tungsten, 12°, 3 mm aluminium; edges of the stack are channel boundaries. */
export function accuracyBeam(potential_kV: number, edges_keV: readonly number[]): Spectrum {
  const tube = tungstenSpectrum({
    potential_kV,
    anodeAngle_deg: 12,
    ripple_percent: 0,
    outputFactor: 1,
    extraEdges_keV: edges_keV,
  });
  return attenuate(tube, [{ material: material('aluminium'), thickness_mm: 3 }]);
}

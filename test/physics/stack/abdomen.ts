import { type Case, caseSchema } from '../../../physics/case/schema.js';
import type { Finding } from '../../../physics/results.js';
import {
  type PlacedDetail,
  placeDetail,
  placeStack,
  type Stack,
  sizesOf,
  type Unplaceable,
} from '../../../physics/stack/index.js';

/** What a test changes of the abdomen; each part replaces the whole part. */
export interface Changes {
  readonly materials?: object[];
  readonly room?: object;
  readonly layers?: object[];
  readonly sizes?: object[];
  readonly detail?: object;
  readonly task?: object;
  readonly acquisition?: object;
}

const layers = [
  { name: 'front', material: 'adipose', thickness_mm: 20, growthShare: 0.3 },
  { name: 'abdomen', material: 'soft tissue', thickness_mm: 170, growthShare: 0.7 },
  { name: 'spine', material: 'cortical bone', thickness_mm: 12, growthShare: 0 },
];

export const iodine = (mg_per_mL: number, carrier: string | null = 'blood'): object => ({
  name: 'iodine',
  amount: { value: mg_per_mL, unit: 'mg element/mL' },
  carrier,
});

export const vessel = {
  shape: 'vessel',
  inLayer: 'abdomen',
  depthInLayer_mm: 85,
  size_mm: 6,
  length_mm: 10,
  reference: 'blood',
  agent: iodine(120),
};

/** An invented abdomen with a vessel in it, in an invented room. */
export const abdomen = (changes: Changes = {}): Case =>
  caseSchema.parse({
    format: 'stratabeam.case',
    version: 1,
    materials: changes.materials,
    room: { geometry: { sourceToDetector_mm: 1150 }, ...changes.room },
    patient: { layers: changes.layers ?? layers, sizes: changes.sizes },
    task: { detail: changes.detail ?? vessel, ...changes.task },
    techniques: [
      {
        name: 'Current',
        potential_kV: 80,
        acquisition: changes.acquisition,
        control: { detectorAirKerma_uGy: 2.5 },
      },
    ],
  });

const isPlaced = <T extends object>(placed: T | Unplaceable, key: string): placed is T =>
  key in placed;

const sentences = (findings: readonly Finding[]): string =>
  findings.map(({ message }) => message).join(' ');

/** The stack of a case at its first size, or at a thickness. */
export const stackIn = (c: Case, thickness_mm?: number): Stack => {
  const size = sizesOf(c.patient)[0];
  const placed = placeStack(c, { ...size, thickness_mm: thickness_mm ?? size.thickness_mm });
  if (!isPlaced<Stack>(placed, 'layers')) throw new Error(sentences(placed.findings));
  return placed;
};

/** The findings that keep a stack or detail from being placed. */
export const refusals = (placed: object): readonly Finding[] =>
  'layers' in placed || 'paths' in placed ? [] : (placed as Unplaceable).findings;

export const detailIn = (c: Case, stack: Stack = stackIn(c)): PlacedDetail => {
  const placed = placeDetail(c, stack);
  if (!isPlaced<PlacedDetail>(placed, 'paths')) throw new Error(sentences(placed.findings));
  return placed;
};

import { kept } from '../materials/kept.js';
import type { Acquisition, Case, Size } from './case/schema.js';
import { KeptBy, nothing } from './numeric/kept-by.js';
import { prepare } from './prepare.js';
import { noiseTerms, type ReadoutChain } from './readout/index.js';
import type { Finding } from './results.js';
import { responsesOn, type ScatterResponses, scatterResponses } from './scatter/index.js';
import { type PlacedDetail, placeDetail } from './stack/place-detail.js';
import { placeStack, type Unplaceable } from './stack/place-stack.js';
import type { Stack } from './stack/stack.js';

/** The patient at one size with the detail in place, and the scatter of that stack. */
export interface Placement {
  readonly stack: Stack;
  readonly detail: PlacedDetail;
  /** With the room's grid, so that it serves techniques with the grid in and out. */
  readonly responses: ScatterResponses;
  readonly findings: readonly Finding[];
}

const placements = new KeptBy<Placement | Unplaceable>();
const responses = new KeptBy<ScatterResponses>();
const chains = new KeptBy<Map<string, ReadoutChain>>();

/**
 * Places the patient at a size in the room once: stack, detail and scatter responses are shared by
 * every technique and setting. Kept by identity of the parts of the case it depends on.
 */
export const placementOf = (c: Case, size: Size): Placement | Unplaceable =>
  placements.get([c.room, c.patient, c.task, c.materials, size], () => place(c, size));

const place = (c: Case, size: Size): Placement | Unplaceable => {
  const stack = placeStack(c, size, prepare(c).material);
  if (!('layers' in stack)) return stack;
  const detail = placeDetail(c, stack);
  if (!('matter' in detail)) return detail;
  return { stack, detail, responses: responsesOf(c, size, stack), findings: detail.findings };
};

/** Scatter does not see the task, nor tube, filters and rules: it outlives edits of those. */
const responsesOf = (c: Case, size: Size, stack: Stack): ScatterResponses => {
  const { geometry, support, detector, grid } = c.room;
  const keys = [geometry, support, detector, grid ?? nothing, c.patient, c.materials, size];
  return responses.get(keys, () => {
    const prepared = prepare(c);
    return scatterResponses(stack, prepared.detector, prepared.grid?.table ?? null);
  });
};

/** What stands behind the patient for one acquisition, with the grid in or out. */
export const chainOf = (
  c: Case,
  placement: Placement,
  gridPosition: 'in' | 'out',
  acquisition: Acquisition,
): ReadoutChain => {
  const { detector, grid } = prepare(c);
  const made = chains.get([placement], () => new Map<string, ReadoutChain>());
  return kept(made, `${gridPosition}:${acquisition.mode}:${acquisition.maskFrames}`, () => ({
    detector,
    grid: gridPosition === 'in' ? grid : null,
    scatterOn: (energies_keV: Float64Array) => responsesOn(placement.responses, energies_keV),
    detail: placement.detail,
    noise: noiseTerms(c, acquisition, detector),
  }));
};

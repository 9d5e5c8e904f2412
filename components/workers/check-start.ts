import type { Case } from '../../physics/case/schema.js';
import {
  type CheckRequest,
  type CheckSetup,
  type Fate,
  type NoCheck,
  setUpCheck,
  trackFates,
} from '../../physics/check-by-transport/index.js';
import { transportBatches } from '../../physics/jobs/index.js';
import { recordTracks, type Track } from '../../physics/transport/index.js';

/** A run made ready, and what its first photons do. */
export interface CheckStart {
  readonly setup: CheckSetup;
  readonly tracks: readonly Track[];
  readonly fates: Readonly<Record<Fate, number>>;
}

/** Enough to see where photons go, few enough to follow one. */
const tracksShown = 300;

/** Makes a run ready; the tracks are photons of the run, so no more than its first batch holds. */
export function startCheck(c: Case, request: CheckRequest): CheckStart | NoCheck {
  const setup = setUpCheck(c, request);
  if (!('input' in setup)) return setup;
  const { input } = setup;
  const [first] = transportBatches(input);
  const tracks = recordTracks(input, Math.min(tracksShown, first.photons));
  return { setup, tracks, fates: trackFates(input, tracks) };
}

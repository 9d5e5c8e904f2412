import { type Track, type TransportInput, trackPoints } from '../transport/index.js';

/** How the way of a photon can end, in the order it is told. */
export const fates = [
  'unscattered',
  'scattered',
  'absorbed',
  'absorbedOutside',
  'turnedBack',
  'leftSide',
] as const;
export type Fate = (typeof fates)[number];

/** Each fate in words. */
export const fateWords: Readonly<Record<Fate, string>> = {
  unscattered: 'reached the detector unscattered',
  scattered: 'reached the detector after scatter',
  absorbed: 'absorbed in the patient',
  absorbedOutside: 'absorbed before or behind the patient',
  turnedBack: 'left towards the source',
  leftSide: 'left by the side',
};

/** How many tracks ended in each way. */
export const trackFates = (
  input: TransportInput,
  tracks: readonly Track[],
): Readonly<Record<Fate, number>> => {
  const counts = Object.fromEntries(fates.map((fate) => [fate, 0])) as Record<Fate, number>;
  for (const track of tracks) counts[fateOf(input, track)] += 1;
  return counts;
};

const hair_cm = 1e-4;

const fateOf = ({ geometry, layers }: TransportInput, track: Track): Fate => {
  const { points, kinds, isDetected } = track;
  if (isDetected) return kinds.length === 2 ? 'unscattered' : 'scattered';
  const z = points[points.length - 2];
  const { planes_cm, skinPlane } = geometry;
  if (trackPoints[kinds[kinds.length - 1]] === 'left') {
    return z <= planes_cm[0] + hair_cm ? 'turnedBack' : 'leftSide';
  }
  const exit_cm = planes_cm[skinPlane + layers.length];
  return z >= -hair_cm && z <= exit_cm + hair_cm ? 'absorbed' : 'absorbedOutside';
};

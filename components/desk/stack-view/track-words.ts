import { type StackScene, type Tracks, trackKinds } from '../../../scenes/stack-scene-data.js';

/** How many pieces of each kind the tracks hold, in the order of `trackKinds`. */
export const trackCounts = ({ kinds }: Tracks): number[] =>
  trackKinds.map((_, kind) => kinds.reduce((sum, each) => sum + (each === kind ? 1 : 0), 0));

/** The tracks in words, for those who do not see them. */
export function trackWords(scene: StackScene, tracks: Tracks): string {
  const [primary, compton, rayleigh, absorbed, fluorescence] = trackCounts(tracks);
  const name = scene.techniques[tracks.technique]?.name ?? '';
  const born = fluorescence > 0 ? `, ${fluorescence} of fluorescence (dashed)` : '';
  return `Photon paths of ${name}: ${primary} primary (thin line), ${compton} after Compton scatter (line), ${rayleigh} after Rayleigh scatter (dotted)${born}, ${absorbed} ends by absorption (dot).`;
}

/**
 * How a technique is drawn: hue, lightness, stroke and mark all differ, so that none of them has to
 * be seen alone. The first technique is Current (graphite, solid, filled disc); the others are
 * Proposed (madder, dashed, open diamond), further ones in lightness steps with their own dash.
 * Colours are custom properties set by the page or the dossier.
 */
export interface TechniqueInk {
  readonly color: string;
  /** `stroke-dasharray`; empty for a solid line. */
  readonly dash: string;
  readonly mark: 'disc' | 'diamond';
}

const proposedDashes = ['7 4', '2.5 3', '10 3 2.5 3', '10 3 2.5 3 2.5 3'];

/** The ink of technique number `index` of a case. */
export function techniqueInk(index: number): TechniqueInk {
  if (index === 0) return { color: 'var(--graphite)', dash: '', mark: 'disc' };
  const step = (index - 1) % proposedDashes.length;
  const share = 100 - 16 * step;
  const color =
    step === 0 ? 'var(--madder)' : `color-mix(in oklab, var(--madder) ${share}%, var(--paper))`;
  return { color, dash: proposedDashes[step], mark: 'diamond' };
}

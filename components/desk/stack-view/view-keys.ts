import { shifted, turned, type View, zoomed } from '../../../scenes/view.js';
import { type PresetName, presetNames } from '../../../scenes/view-presets.js';

const turn_deg = 5;
const step_px = 24;
const zoomStep = 1.2;

const arrows: Record<string, readonly [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

/** What a key asks for: a view under a number, a changed view, or nothing. */
export type KeyAnswer = { readonly preset: PresetName } | { readonly view: View } | null;

/**
 * Arrows turn, with Shift they shift; + and − zoom; 1 to 6 are the views in their order, 0 and Home
 * the first. With Ctrl, Alt or Meta a key belongs to the browser.
 */
export function keyAnswer(event: KeyboardEvent, view: View): KeyAnswer {
  if (event.ctrlKey || event.altKey || event.metaKey) return null;
  const arrow = arrows[event.key];
  if (arrow) {
    const [right, up] = arrow;
    return event.shiftKey
      ? { view: shifted(view, -right * step_px, up * step_px) }
      : { view: turned(view, right * turn_deg, up * turn_deg) };
  }
  if (event.key === '+' || event.key === '=') return { view: zoomed(view, zoomStep) };
  if (event.key === '-') return { view: zoomed(view, 1 / zoomStep) };
  if (event.key === '0' || event.key === 'Home') return { preset: 'section' };
  const preset = /^[1-6]$/.test(event.key) ? presetNames[Number(event.key) - 1] : undefined;
  return preset ? { preset } : null;
}

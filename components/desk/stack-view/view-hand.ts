import { type PresetName, presetNames, presetView } from '../../../scenes/view-presets.js';
import type { StackLayout } from '../../../scenes/stack-layout.js';
import { sectionView, shifted, turned, type View, zoomed } from '../../../scenes/view.js';

const turn_deg = 6;
const step_px = 24;

/**
 * The view a key asks for, or null when the key means nothing here: arrows turn, with Shift they
 * shift; plus and minus enlarge; 1 to 6 are the named views; 0 and Home go back to the section.
 */
export function viewForKey(event: KeyboardEvent, view: View, layout: StackLayout, detail_mm: number): View | null {
  if (event.ctrlKey || event.metaKey || event.altKey) return null;
  const [x, y] = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, -1], ArrowDown: [0, 1] }[event.key] ?? [0, 0];
  if (x !== 0 || y !== 0) {
    return event.shiftKey ? shifted(view, x * step_px, y * step_px) : turned(view, x * turn_deg, -y * turn_deg);
  }
  if (event.key === '+' || event.key === '=') return zoomed(view, 1.2);
  if (event.key === '-') return zoomed(view, 1 / 1.2);
  if (event.key === '0' || event.key === 'Home') return sectionView;
  const name: PresetName | undefined = presetNames[Number(event.key) - 1];
  return name ? presetView(name, layout, detail_mm) : null;
}

/** The view after the pointer was dragged by so many px: turned, or with Shift shifted. */
export const viewForDrag = (view: View, right_px: number, down_px: number, shift: boolean): View =>
  shift ? shifted(view, right_px, down_px) : turned(view, right_px * 0.4, down_px * 0.4);

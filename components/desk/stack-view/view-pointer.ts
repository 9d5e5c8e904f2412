import { shifted, turned, type View, zoomed } from '../../../scenes/view.js';

const turn_deg_per_px = 0.4;
const zoomPerWheel = 0.0015;

/** What the pointer works on. */
export interface PointerTarget {
  readonly stage: HTMLElement;
  readonly view: () => View;
  readonly change: (view: View) => void;
  /** The place the drawing turns about, px in the stage. */
  readonly pivot: () => readonly [number, number];
}

/** Turning by drag, shifting by drag with Shift or the middle button. */
function drag({ stage, view, change }: PointerTarget, signal: AbortSignal): void {
  let held: { id: number; x: number; y: number } | null = null;
  stage.addEventListener(
    'pointerdown',
    (event) => {
      if (
        event.button > 1 ||
        event.composedPath().some((node) => node instanceof HTMLButtonElement)
      )
        return;
      held = { id: event.pointerId, x: event.clientX, y: event.clientY };
      stage.setPointerCapture(event.pointerId);
    },
    { signal },
  );
  stage.addEventListener(
    'pointermove',
    (event) => {
      if (held?.id !== event.pointerId) return;
      const [right, down] = [event.clientX - held.x, event.clientY - held.y];
      held = { ...held, x: event.clientX, y: event.clientY };
      const shifts = event.shiftKey || (event.buttons & 4) > 0;
      change(
        shifts
          ? shifted(view(), right, down)
          : turned(view(), -right * turn_deg_per_px, down * turn_deg_per_px),
      );
    },
    { signal },
  );
  const release = () => {
    held = null;
  };
  stage.addEventListener('pointerup', release, { signal });
  stage.addEventListener('pointercancel', release, { signal });
}

/**
 * Zoom by wheel about the pointer, once the view has been clicked or with Ctrl: otherwise the wheel
 * scrolls the page.
 */
function wheel({ stage, view, change, pivot }: PointerTarget, signal: AbortSignal): void {
  stage.addEventListener(
    'wheel',
    (event) => {
      if (!event.ctrlKey && !stage.matches(':focus')) return;
      event.preventDefault();
      const box = stage.getBoundingClientRect();
      const [x, y] = pivot();
      const about: [number, number] = [event.clientX - box.left - x, event.clientY - box.top - y];
      change(zoomed(view(), Math.exp(-event.deltaY * zoomPerWheel), about));
    },
    { signal, passive: false },
  );
}

/** Lets the pointer turn, shift and zoom until `signal` says otherwise. */
export function followPointer(target: PointerTarget, signal: AbortSignal): void {
  drag(target, signal);
  wheel(target, signal);
}

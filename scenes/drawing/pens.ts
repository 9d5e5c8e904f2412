import type { Pen } from './drawing.js';

/** Outline of what is cut, edges seen behind it, edges hidden by it. */
export const cutPen: Pen = { ink: 'soft', width_px: 1.1, opacity: 0.95 };
export const edgePen: Pen = { ink: 'soft', width_px: 0.8, opacity: 0.55 };
export const hiddenPen: Pen = { ink: 'ink', width_px: 0.8, opacity: 0.55, over: true };
export const breakPen: Pen = { ink: 'soft', width_px: 0.9, opacity: 0.9 };

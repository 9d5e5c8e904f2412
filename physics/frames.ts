import type { Acquisition } from './case/schema.js';

/** Frames the patient pays for in one run: images, and masks where one is subtracted. */
export const framesPerRun = ({ frames, maskFrames, mode }: Acquisition): number =>
  frames + (mode === 'subtraction' ? maskFrames : 0);

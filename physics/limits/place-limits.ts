import type { Finding } from '../results.js';
import { apartTexts } from './apart-texts.js';
import type { LimitInputs } from './limit-inputs.js';

/** Where the patient stands: the skin no nearer to the focal spot than the room allows. */
export const placeLimits = ({ case: c, sourceToSkin_mm: value }: LimitInputs): Finding[] => {
  const { beam, minSourceToSkin_mm: bound } = c.room.geometry;
  if (beam === 'parallel' || value >= bound) return [];
  const [is, least] = apartTexts(value, bound);
  const [further] = apartTexts(bound - value, 0);
  return [
    {
      code: 'sourceToSkin',
      severity: 'limit',
      message: `The skin is ${is} mm from the focal spot; the room's least is ${least} mm. Nearest allowed: the focal spot ${further} mm further away; no other potential or filter helps.`,
      path: 'room.geometry.minSourceToSkin_mm',
      value,
      bound,
      nearest: `focal spot ${further} mm further away`,
    },
  ];
};

import { imageLimits } from './limits/image-limits.js';
import type { LimitInputs } from './limits/limit-inputs.js';
import { ruleLimits } from './limits/rule-limits.js';
import { loadLimits, potentialLimits } from './limits/tube-limits.js';
import type { Finding } from './results.js';

export type { LimitInputs } from './limits/limit-inputs.js';

/** Everything that forbids a setting, or must be read beside it, along the beam path. */
export const limitFindings = (inputs: LimitInputs): Finding[] => [
  ...potentialLimits(inputs),
  ...loadLimits(inputs),
  ...ruleLimits(inputs),
  ...imageLimits(inputs),
];

/** True when nothing forbids the setting. */
export const isAllowed = (findings: readonly Finding[]): boolean =>
  findings.every(({ severity }) => severity !== 'limit');

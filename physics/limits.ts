import { agentLimits } from './limits/agent-limits.js';
import { imageLimits } from './limits/image-limits.js';
import type { LimitInputs } from './limits/limit-inputs.js';
import { loadLimits } from './limits/load-limits.js';
import { placeLimits } from './limits/place-limits.js';
import { potentialLimits } from './limits/potential-limits.js';
import { ruleLimits } from './limits/rule-limits.js';
import type { Finding } from './results.js';

export type { LimitInputs } from './limits/limit-inputs.js';

/** Everything that forbids a setting, or must be read beside it, along the beam path. */
export const limitFindings = (inputs: LimitInputs): Finding[] => [
  ...potentialLimits(inputs),
  ...loadLimits(inputs),
  ...ruleLimits(inputs),
  ...placeLimits(inputs),
  ...agentLimits(inputs),
  ...imageLimits(inputs),
];

/** True when nothing forbids the setting. */
export const isAllowed = (findings: readonly Finding[]): boolean =>
  findings.every(({ severity }) => severity !== 'limit');

/** Limits that another potential or filter cannot meet; they name their own remedy. */
const settingsCannotMeet: readonly string[] = ['sourceToSkin', 'agentAmount'];

/** True for a limit that another setting of the room might meet. */
export const isOfSetting = ({ severity, code }: Finding): boolean =>
  severity === 'limit' && !settingsCannotMeet.includes(code);

/** True when nothing forbids the setting that another setting might meet. */
export const isAllowedBySetting = (findings: readonly Finding[]): boolean =>
  !findings.some(isOfSetting);

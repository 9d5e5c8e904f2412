// Every published value that can be checked, beside what Stratabeam computes.

import { agentChecks } from './agent-checks.js';
import { attenuationChecks } from './attenuation-checks.js';
import type { CheckRow } from './check-row.js';
import { compositionChecks } from './composition-checks.js';
import { detectorChecks } from './detector-checks.js';
import { edgeChecks } from './edge-checks.js';
import { gadoliniumChecks } from './gadolinium-checks.js';
import { monoChecks } from './mono-checks.js';
import { optimumChecks } from './optimum-checks.js';
import { qualityChecks } from './quality-checks.js';
import { ruleChecks } from './rule-checks.js';
import { backscatterChecks, scatterChecks } from './scatter-checks.js';
import { tradeChecks } from './trade-checks.js';
import { tubeChecks } from './tube-checks.js';

export type { CheckKind, CheckRow, Verdict } from './check-row.js';

let made: readonly CheckRow[] | undefined;

/**
 * Every check, in the order of the beam path, computed once. A check falls short when the computed
 * value is farther from the published one than its tolerance, which is the model's own and never
 * widened to fit.
 */
export const publishedChecks = (): readonly CheckRow[] => {
  made ??= [
    ...attenuationChecks(),
    ...edgeChecks(),
    ...compositionChecks(),
    ...agentChecks(),
    ...gadoliniumChecks(),
    ...tubeChecks(),
    ...qualityChecks(),
    ...monoChecks(),
    ...detectorChecks(),
    ...scatterChecks(),
    ...backscatterChecks(),
    ...optimumChecks(),
    ...tradeChecks(),
    ...ruleChecks(),
  ];
  return made;
};

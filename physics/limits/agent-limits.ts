import type { Finding } from '../results.js';
import { resolveAgent } from '../stack/resolve-material.js';
import { apartTexts } from './apart-texts.js';
import type { LimitInputs } from './limit-inputs.js';

/**
 * The amount of agent that can be delivered, in mg of its element per mL, where `agentsCompared`
 * states it for the detail's agent; null where the case is silent.
 */
export const deliverable_mg_per_mL = ({
  task,
  agentsCompared,
}: LimitInputs['case']): number | null => {
  const name = task.detail.agent?.name;
  return agentsCompared.find((agent) => agent.name === name)?.deliverable_mg_per_mL ?? null;
};

/** The detail holds no more of its agent than can be delivered. */
export const agentLimits = ({ case: c }: LimitInputs): Finding[] => {
  const { agent } = c.task.detail;
  const bound = deliverable_mg_per_mL(c);
  if (!agent || bound === null) return [];
  const value = resolveAgent(c, agent).elementConcentration_mg_per_mL;
  if (value <= bound * (1 + 1e-9)) return [];
  const [is, most] = apartTexts(value, bound);
  return [
    {
      code: 'agentAmount',
      severity: 'limit',
      message: `The detail holds ${is} mg of element per mL of ${agent.name}; no more than ${most} mg/mL can be delivered. Nearest allowed: ${most} mg element/mL; no other potential or filter helps.`,
      path: 'task.detail.agent.amount.value',
      value,
      bound,
      nearest: `${most} mg element/mL`,
    },
  ];
};

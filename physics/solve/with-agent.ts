import type { Case } from '../case/schema.js';

/** The case with another amount of the detail's agent; everything else keeps its identity. */
export const withAgentAmount = (c: Case, amount: number): Case => {
  const { detail } = c.task;
  if (!detail.agent) return c;
  const agent = { ...detail.agent, amount: { ...detail.agent.amount, value: amount } };
  return { ...c, task: { ...c.task, detail: { ...detail, agent } } };
};

import { agent, agentNames, elementConcentration_mg_per_mL } from '../../../materials/index.js';
import { type Fault, faultAt } from '../fault.js';
import type { Path } from '../printed.js';
import type { Agent, Case } from '../schema.js';
import { unknownNameFaults } from './known-name.js';
import { unknownMaterialFaults } from './material-rules.js';

/** An agent must be known, its carrier too, and its solute must fit into the volume. */
export const agentFaults = (
  path: Path,
  given: Agent | null,
  c: Pick<Case, 'materials'>,
): Fault[] => {
  if (given === null) return [];
  const { name, amount, carrier } = given;
  const known = agent(name);
  return [
    ...(known ? [] : unknownNameFaults([...path, 'name'], name, agentNames, 'a known agent')),
    ...(carrier === null ? [] : unknownMaterialFaults([...path, 'carrier'], carrier, c)),
    ...(known && known.kind !== 'gas'
      ? overfullFaults([...path, 'amount', 'value'], known, amount)
      : []),
  ];
};

const overfullFaults = (
  path: Path,
  known: NonNullable<ReturnType<typeof agent>>,
  amount: Agent['amount'],
): Fault[] => {
  const solute_g_per_mL =
    elementConcentration_mg_per_mL(known, amount) / known.elementMassFraction / 1000;
  const share = solute_g_per_mL * known.specificVolume_mL_per_g;
  if (share <= 1) return [];
  const most = Number((amount.value / share).toPrecision(3));
  const rule = `must leave the agent no more than the whole volume, ${most} ${amount.unit}`;
  return [faultAt(path, amount.value, rule, 'check value and unit as in the lumen')];
};

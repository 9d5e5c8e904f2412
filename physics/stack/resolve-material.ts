import {
  type AgentMixture,
  agent,
  agentMixture,
  elementBySymbol,
  type Material,
  materialFromFractions,
  namedMaterial,
} from '../../materials/index.js';
import { kept } from '../../materials/kept.js';
import type { Agent, Case, Layer } from '../case/schema.js';

type UserMaterials = Case['materials'];

/** What a case has been asked for so far; kept so that every material stays one object. */
interface Resolved {
  readonly materials: Map<string, Material>;
  readonly mixtures: Map<string, AgentMixture>;
}

/** More than any case holds at once; what a search for an amount leaves behind is let go. */
const mixturesKept = 64;

const known = new WeakMap<UserMaterials, Resolved>();

const resolvedIn = (entered: UserMaterials): Resolved =>
  kept(known, entered, () => ({ materials: new Map(), mixtures: new Map() }));

const findMaterial = (entered: UserMaterials, name: string): Material => {
  const own = entered.find((material) => material.name === name);
  if (own) return materialFromFractions(own);
  const material = namedMaterial(name) ?? namedMaterial(elementBySymbol(name)?.name ?? '');
  if (material) return material;
  throw new Error(
    `material "${name}": is not known; use a listed material or element, or enter it under materials`,
  );
};

/**
 * The material of a name in a case: the case's own materials first, then named materials, elements
 * by name and by symbol. Coefficients are kept by material identity, so one name in one case is
 * always the same object (also across copies of the case that share its `materials`).
 *
 * @throws Error on an unknown name; a parsed case holds none.
 */
export const resolveMaterial =
  (c: Pick<Case, 'materials'>) =>
  (name: string): Material =>
    kept(resolvedIn(c.materials).materials, name, () => findMaterial(c.materials, name));

/**
 * An agent as it is in the lumen, in its own carrier, the one named, or the agent's usual one.
 * The same request in one case is the same object while it is among the last few dozen.
 *
 * @throws Error on an unknown agent or carrier, or an amount that would overfill the volume.
 */
export const resolveAgent = (
  c: Pick<Case, 'materials'>,
  request: Agent,
  carrier?: string,
): AgentMixture => {
  const { name, amount } = request;
  const carrierName = request.carrier ?? carrier ?? agent(name)?.defaultCarrier ?? 'water';
  const key = JSON.stringify([name, amount.value, amount.unit, carrierName]);
  const { mixtures } = resolvedIn(c.materials);
  if (mixtures.size >= mixturesKept) mixtures.clear();
  return kept(mixtures, key, () =>
    agentMixture({ agent: name, amount, carrier: resolveMaterial(c)(carrierName) }),
  );
};

/** Matter of a layer as drawn: its material, or its agent carried by its material. */
export const layerMaterial = (c: Pick<Case, 'materials'>, layer: Layer): Material =>
  layer.agent
    ? resolveAgent(c, layer.agent, layer.material).material
    : resolveMaterial(c)(layer.material);

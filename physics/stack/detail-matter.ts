import type { AgentMixture, Material } from '../../materials/index.js';
import type { Case, Layer } from '../case/schema.js';
import type { Finding } from '../results.js';
import { resolveAgent, resolveMaterial } from './resolve-material.js';

/** What the detail is made of; `mixture` when that is an agent in a carrier. */
export interface DetailMatter {
  readonly material: Material;
  readonly mixture: AgentMixture | null;
}

const missing = (message: string, path: string): Finding => ({
  code: 'detailMatter',
  severity: 'limit',
  message,
  path,
});

/**
 * Matter of the task's detail. A defect is its layer without the layer's agent (or the material
 * named, such as a polyp's); every other shape is its agent where one is given, carried by the
 * agent's own carrier, else by the detail's material, else by the agent's usual one; else it is its
 * material.
 *
 * @returns the matter, or a finding that says what is missing.
 */
export const detailMatter = (c: Case, layer: Layer): DetailMatter | Finding => {
  const { detail } = c.task;
  const materials = resolveMaterial(c);
  if (detail.shape === 'defect') {
    return layer.agent
      ? { material: materials(detail.material ?? layer.material), mixture: null }
      : missing(
          `A defect is the absence of its layer's agent, and layer ${layer.name} holds none; give the layer an agent or choose another shape.`,
          'task.detail.inLayer',
        );
  }
  if (detail.agent) {
    const mixture = resolveAgent(c, detail.agent, detail.material ?? undefined);
    return { material: mixture.material, mixture };
  }
  return detail.material
    ? { material: materials(detail.material), mixture: null }
    : missing(
        'Nothing says what the detail is made of; give it an agent or a material.',
        'task.detail.agent',
      );
};

import { absorptionEdges } from '../../materials/index.js';
import type { Case } from '../../physics/case/schema.js';
import { operatingPoint } from '../../physics/operating-point.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { attenuate, type Spectrum } from '../../physics/beam/index.js';

/** The primary beam of every technique where it reaches the detail, and the agent's K edges. */
export interface DetailSpectra {
  readonly spectra: readonly {
    readonly technique: string;
    /** Photons per mm² and frame in every channel. */
    readonly spectrum: Spectrum;
  }[];
  readonly edges: readonly { readonly name: string; readonly energy_keV: number }[];
}

/** Every technique's spectrum at the depth of the detail's centre, per frame as set. */
export function detailSpectra(c: Case, sizeName: string): DetailSpectra {
  const size = sizesOf(c.patient).find((entry) => entry.name === sizeName);
  if (!size) return { spectra: [], edges: [] };
  const points = c.techniques.map((technique) => operatingPoint(c, technique, size));
  const spectra = points.flatMap((point) => {
    if (!('made' in point)) return [];
    const { skin, placement } = point.made;
    const { stack, detail } = placement;
    let left_mm = detail.centreDepth_mm;
    const above = stack.layers.map((layer) => {
      const thickness_mm = Math.max(0, Math.min(left_mm, layer.thickness_mm));
      left_mm -= thickness_mm;
      return { material: layer.material, thickness_mm };
    });
    const through = attenuate(skin, above);
    const spread = stack.beam === 'parallel' ? 1 : (stack.sourceToSkin_mm / (stack.sourceToSkin_mm + detail.centreDepth_mm)) ** 2;
    const fluence_per_mm2 = through.fluence_per_mm2.map((value) => value * spread * point.tubeLoad_mAs);
    return [{ technique: point.technique.name, spectrum: { ...through, fluence_per_mm2 } }];
  });
  const placed = points.find((point) => 'made' in point);
  const agent = placed && 'made' in placed ? placed.made.placement.detail.agent : null;
  const matter = placed && 'made' in placed ? placed.made.placement.detail.matter : null;
  const edges = agent && matter
    ? absorptionEdges(matter, 10, 150).filter((edge) => edge.shell === 'K' && edge.z === agent.z).map((edge) => ({ name: `${agent.element} K edge`, energy_keV: edge.energy_keV }))
    : [];
  return { spectra, edges };
}

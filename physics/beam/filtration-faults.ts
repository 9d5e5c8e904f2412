import { elementByZ } from '../../materials/index.js';
import type { Fault } from '../case/fault.js';
import { numberText } from '../number-text.js';
import { aluminiumEquivalent_mm } from './aluminium-equivalent.js';
import { attenuate, type MaterialLayer } from './attenuate.js';
import { halfValueLayer_mm } from './half-value-layer.js';
import { kEdges_keV } from './k-edges.js';
import { referenceMaterial } from './reference-materials.js';
import { type TubeSetting, tungstenSpectrum } from './tube-spectrum.js';

/** Less filtration than this lets tungsten L lines through, which the model does not have. */
const leastFiltration_mmAl = 1;

/** An element with its K edge in this range makes a K-edge filter; copper (9 keV) does not. */
const kEdgeFilterRange_keV = [15, 90] as const;

/** The bounds of the tube model, by path below the tube. */
const bounds = [
  { key: 'potential_kV', least: 20, most: 150, remedy: 'choose a potential the model covers' },
  { key: 'anodeAngle_deg', least: 6, most: 22, remedy: 'enter the nameplate angle' },
  { key: 'ripple_percent', least: 0, most: 100, remedy: 'enter the ripple of the supply' },
] as const;

/**
 * What forbids computing a tube's beam: a potential outside 20 to 150 kV, an anode angle outside 6 to
 * 22°, or less than 1 mm of aluminium-equivalent filtration (L lines are not modelled) unless a K-edge
 * filter is in the beam.
 *
 * @param layers everything between anode and patient that filters: inherent and added
 * @param path where the setting stands, as in `room.tube`
 */
export function beamFaults(
  setting: TubeSetting,
  layers: readonly MaterialLayer[],
  path = 'room.tube',
): Fault[] {
  const outside = bounds.flatMap(({ key, least, most, remedy }): Fault[] => {
    const value = setting[key] ?? least;
    if (value >= least && value <= most) return [];
    return [
      { path: `${path}.${key}`, value: String(value), rule: `must be ${least} to ${most}`, remedy },
    ];
  });
  return outside.length > 0 ? outside : filtrationFaults(setting, layers, path);
}

function filtrationFaults(
  setting: TubeSetting,
  layers: readonly MaterialLayer[],
  path: string,
): Fault[] {
  if (layers.some(isKEdgeFilter)) return [];
  const aluminium = referenceMaterial('aluminium');
  const bare = tungstenSpectrum(setting);
  const least = { material: aluminium, thickness_mm: leastFiltration_mmAl };
  const reached_mmAl = halfValueLayer_mm(attenuate(bare, layers), aluminium) ?? 0;
  const needed_mmAl = halfValueLayer_mm(attenuate(bare, [least]), aluminium) ?? 0;
  if (reached_mmAl >= needed_mmAl) return [];
  const equivalent = aluminiumEquivalent_mm(bare, layers) ?? 0;
  return [
    {
      path: `${path}.inherentFilter`,
      value: `${numberText(equivalent)} mm Al in all`,
      rule: `must be at least ${leastFiltration_mmAl} mm aluminium equivalent with the added filter`,
      remedy: 'enter the filtration of tube and housing',
    },
  ];
}

/** A foil of one element whose K edge lies inside the diagnostic range, such as molybdenum. */
export function isKEdgeFilter({ material, thickness_mm }: MaterialLayer): boolean {
  if (thickness_mm === 0 || material.massFractions.length !== 1) return false;
  if (material.name !== elementByZ(material.massFractions[0].z).name) return false;
  const [least, most] = kEdgeFilterRange_keV;
  return kEdges_keV([material]).some((edge) => edge >= least && edge <= most);
}

import type { Material } from '../../materials/index.js';
import { referenceMaterial } from '../beam/reference-materials.js';
import type { Spectrum } from '../beam/spectrum.js';
import { fieldArea_cm2 } from '../dose/field-area.js';
import type { Stack } from '../stack/stack.js';
import { airKermaTable } from './air-kerma.js';
import { angleDensity } from './angle-density.js';
import { type BuiltGeometry, buildGeometry, type Surroundings } from './build-geometry.js';
import { cutoffEnergy_keV, greatestEnergy_keV } from './energy-nodes.js';
import type { TransportGeometry } from './geometry.js';
import type { LayerRegion, TransportInput } from './input.js';
import { matterTables } from './matter-tables.js';
import { primaryScores } from './primary.js';
import { type DetectorFunctions, type GridFunction, responseTable } from './response-table.js';
import type { TallyBox } from './score-boxes.js';
import type { DisplacementScoring } from './score-displacement.js';
import type { ForcedScoring } from './score-forced.js';
import { energySampler, type Source } from './source.js';
import { worthTable } from './worth.js';

/** What a run may change; the defaults follow the stack. */
export interface TransportOptions extends Surroundings {
  /** Emit K photons (Z ≥ 30). */
  readonly fluorescence: boolean;
  /** Parallel beam without sides or insert: gaps and widths of the fields to score. */
  readonly gaps_mm: readonly number[];
  readonly fieldWidths_mm: readonly number[];
  readonly boxes: readonly TallyBox[];
  /** False scores absorbed energy alone, which is several times faster. */
  readonly scatter: boolean;
}

/**
 * Everything one run needs, built once and then only read.
 *
 * A parallel beam on laterally infinite layers flies as a pencil in vacuum and scores every field and
 * gap asked for; a point source, a patient with sides or an insert use forced detection at the
 * field centre.
 *
 * @param stack the patient in the room; its field and gap are the ones scored unless `options` says
 * @param spectrum the beam behind tube and filters; only its shape matters. 1–150 keV.
 * @param detector scores of a photon by energy and angle; `idealDetector` absorbs all
 * @param grid transmission by energy and angle; null without a grid
 * @throws Error when the spectrum is empty or has photons outside 1–150 keV, or the insert does not
 * fit into its layer
 */
export function buildTransportInput(
  stack: Stack,
  spectrum: Spectrum,
  detector: DetectorFunctions,
  grid: GridFunction | null,
  run: { readonly photons: number; readonly seed: number },
  options: Partial<TransportOptions> = {},
): TransportInput {
  const sampler = energySampler(spectrum.energies_keV, spectrum.fluence_per_mm2);
  const greatest_keV = Math.max(...sampler.energies_keV);
  refuseOutOfRange(Math.min(...sampler.energies_keV), greatest_keV);
  const { lateral_mm = null, insert = null } = options;
  const asPencil = stack.beam === 'parallel' && lateral_mm === null && insert === null;
  const built = buildGeometry(stack, {
    air: !asPencil && (options.air ?? stack.air),
    lateral_mm,
    insert,
  });
  const { geometry, materials } = built;
  const source = asPencil ? ({ kind: 'pencil' } as const) : fieldSource(stack);
  const air = referenceMaterial('air');
  const read = { detector, grid, air };
  const primary = primaryScores(sampler, source, geometry, materials, read);
  return {
    ...run,
    source,
    spectrum: sampler,
    geometry,
    matter: matterTables(materials, options.fluorescence ?? true),
    scoring:
      options.scatter === false
        ? null
        : asPencil
          ? displacementScoring(stack, options)
          : forcedScoring(stack, geometry, materials, primary.energy_keV),
    response: responseTable(detector, grid, air, greatest_keV),
    airKerma: airKermaTable(air),
    boxes: options.boxes ?? [],
    layers: layerRegions(stack, built, asPencil),
    primary,
  };
}

function refuseOutOfRange(least_keV: number, greatest_keV: number): void {
  if (least_keV < cutoffEnergy_keV || greatest_keV > greatestEnergy_keV) {
    throw new Error(
      `spectrum: ${least_keV} to ${greatest_keV} keV: transport covers ${cutoffEnergy_keV} to ${greatestEnergy_keV} keV; use the primary beam alone`,
    );
  }
}

function fieldSource(stack: Stack): Source {
  const halfField_cm = [stack.field_mm[0] / 20, stack.field_mm[1] / 20] as const;
  return stack.beam === 'parallel'
    ? { kind: 'parallel', halfField_cm }
    : {
        kind: 'point',
        z_cm: -stack.sourceToSkin_mm / 10,
        halfField_cm,
        distance_cm: stack.sourceToDetector_mm / 10,
      };
}

function displacementScoring(
  stack: Stack,
  options: Partial<TransportOptions>,
): DisplacementScoring {
  const behind_mm = stack.supportExit.reduce((sum, { thickness_mm }) => sum + thickness_mm, 0);
  const gaps_mm = options.gaps_mm ?? [stack.exitToDetector_mm - behind_mm];
  const widths_mm = [...(options.fieldWidths_mm ?? [stack.field_mm[0]])].sort((a, b) => a - b);
  return {
    kind: 'displacement',
    gaps_cm: Float64Array.from(gaps_mm, (gap) => gap / 10),
    halfFields_cm: Float64Array.from(widths_mm, (width) => width / 20),
    aspectRatio: stack.field_mm[0] / stack.field_mm[1],
  };
}

/**
 * Collisions nearer to the detector than this are not forced but followed into a square. Both are
 * small enough that the square's mean lies within 0.3 % of the centre's scatter (a 10 × 10 cm square
 * and 5 cm are 1 % low in a 30 cm field), and large enough not to waste photons.
 */
const near_cm = 3;
const halfRegion_cm = 3;
/** Greatest share of the field that a square spans. */
const regionShare = 1 / 5;
/**
 * The square at the skin spans a fifth of the field too: in a 16 cm field behind carbon fibre and 4 cm of
 * foam its mean backscatter factor lies 0.15 % below the centre's (a third of the field, 0.45 %).
 */
const halfSkinRegion_cm = 5;

function forcedScoring(
  stack: Stack,
  geometry: TransportGeometry,
  materials: readonly Material[],
  meanEnergy_keV: number,
): ForcedScoring {
  const halfField_cm = Math.min(...stack.field_mm) / 20;
  const atSkin = stack.beam === 'parallel' ? 1 : stack.sourceToSkin_mm / stack.sourceToDetector_mm;
  return {
    kind: 'forced',
    detector_cm: geometry.detector_cm,
    near_cm,
    halfRegion_cm: Math.min(halfRegion_cm, halfField_cm * regionShare),
    halfSkinRegion_cm: Math.min(halfSkinRegion_cm, halfField_cm * atSkin * regionShare),
    densities: materials.map(angleDensity),
    worth: worthTable(geometry, materials, meanEnergy_keV),
  };
}

function layerRegions(stack: Stack, built: BuiltGeometry, asPencil: boolean): LayerRegion[] {
  const { geometry, firstLayer } = built;
  const insertSlab = geometry.bounds?.insert?.slab ?? -1;
  let depth_mm = 0;
  return stack.layers.map(({ name, material, thickness_mm }, i) => {
    const middle_mm = stack.sourceToSkin_mm + depth_mm + thickness_mm / 2;
    depth_mm += thickness_mm;
    const slab = firstLayer + i;
    return {
      name,
      regions: slab === insertSlab ? [slab, geometry.slabMatter.length + 1] : [slab],
      mass_g_per_cm2: (material.density_g_per_cm3 * thickness_mm) / 10,
      area_cm2: asPencil ? 1 : fieldArea_cm2(stack, middle_mm),
    };
  });
}

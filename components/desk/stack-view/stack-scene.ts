import { namedMaterial } from '../../../materials/index.js';
import type { AlongBeam } from '../../../physics/along-beam.js';
import type { Detail } from '../../../physics/case/schema.js';
import type { Stack, StackLayer } from '../../../physics/stack/stack.js';
import type {
  DepthProfile,
  SceneSlab,
  SceneTechnique,
  StackScene,
} from '../../../scenes/stack-scene-data.js';
import { formatEntry } from '../../charts/format.js';
import { type DeskModel, placed } from '../model/desk-model.js';

const slab = ({ name, material, thickness_mm }: StackLayer): SceneSlab => ({
  name,
  material: material.name,
  family: material.family,
  thickness_mm,
});

/** Places above the skin, as shares of the way from the focal spot, where the free beam is given. */
const above = [0.02, 0.05, 0.1, 0.2, 0.35, 0.5, 0.7, 0.85];

/** Primary photons per mm² by depth; above the skin the beam of the skin spread back by distance. */
export function primaryProfile(
  { distances_mm, primaryFluence_per_mm2 }: AlongBeam,
  stack: Stack,
): DepthProfile {
  const toSkin = stack.sourceToSkin_mm;
  const spread = (share: number) => (stack.beam === 'parallel' ? 1 : 1 / share ** 2);
  return {
    depths_mm: [
      ...above.map((share) => (share - 1) * toSkin),
      ...distances_mm.map((distance) => distance - toSkin),
    ],
    values: [
      ...above.map((share) => primaryFluence_per_mm2[0] * spread(share)),
      ...primaryFluence_per_mm2,
    ],
  };
}

function techniqueOf({ draft }: DeskModel, index: number): SceneTechnique {
  const { name, filter, grid } = draft.case.techniques[index];
  const layers = draft.case.room.filters.find((entry) => entry.name === filter)?.layers ?? [];
  return { name, filter: layers.length > 0 ? { label: filter } : null, isGridIn: grid === 'in' };
}

/** `6 mm vessel, iodine 120 mg element/mL`. */
function detailLabel({ shape, agent }: Detail, height_mm: number): string {
  const filled = agent
    ? `, ${agent.name} ${formatEntry(agent.amount.value)} ${agent.amount.unit}`
    : '';
  return `${formatEntry(Number(height_mm.toPrecision(4)))} mm ${shape}${filled}`;
}

const made = new WeakMap<DeskModel, StackScene | null>();

/**
 * What the layer view draws of the desk; null where the patient has no place in the room. The same
 * object for the same model, so that nothing is drawn twice.
 */
export function stackSceneOf(model: DeskModel): StackScene | null {
  const known = made.get(model);
  if (known !== undefined) return known;
  const scene = sceneOf(model);
  made.set(model, scene);
  return scene;
}

function sceneOf(model: DeskModel): StackScene | null {
  const { stack, detail } = placed(model);
  if (!stack) return null;
  const { room, patient, task } = model.draft.case;
  const left = techniqueOf(model, model.left);
  const shown = model.right === null ? [model.left] : [model.left, model.right];
  const profiles = shown.map((index) => {
    const { name } = model.draft.case.techniques[index];
    const beam = model.along.find((entry) => entry.technique === name);
    return beam ? primaryProfile(beam, stack) : null;
  });
  return {
    beam: stack.beam,
    sourceToSkin_mm: stack.sourceToSkin_mm,
    sourceToDetector_mm: stack.sourceToDetector_mm,
    field_mm: stack.field_mm,
    lateral_mm: patient.lateral_mm,
    layers: stack.layers.map(slab),
    supportEntrance: stack.supportEntrance.map(slab),
    supportExit: stack.supportExit.map(slab),
    detail: detail && {
      form: detail.shape === 'vessel' ? 'cylinder' : 'box',
      centreDepth_mm: detail.centreDepth_mm,
      height_mm: detail.central.displaced_mm,
      breadth_mm: detail.shape === 'vessel' ? detail.central.displaced_mm : task.detail.length_mm,
      length_mm:
        detail.shape === 'vessel'
          ? task.detail.length_mm
          : (task.detail.width_mm ?? task.detail.length_mm),
      isAbsence: detail.shape === 'defect',
      label: detailLabel(task.detail, detail.central.displaced_mm),
    },
    grid: room.grid && { label: `grid ${formatEntry(room.grid.ratio)}:1` },
    detector: { label: namedMaterial(room.detector.material)?.name ?? room.detector.material },
    techniques: model.right === null ? [left] : [left, techniqueOf(model, model.right)],
    primary: {
      quantity: 'primary photons per mm²',
      unit: 'per frame',
      scale: 'log',
      extent: 'beam',
      perTechnique: profiles,
    },
  };
}

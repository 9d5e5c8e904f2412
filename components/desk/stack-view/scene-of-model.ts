import type { Case, Detail } from '../../../physics/case/schema.js';
import type { Evaluation } from '../../../physics/results.js';
import type { PlacedDetail } from '../../../physics/stack/place-detail.js';
import type { Stack, StackLayer } from '../../../physics/stack/stack.js';
import type {
  DepthProfile,
  SceneDetail,
  SceneSlab,
  SceneTechnique,
  StackScene,
} from '../../../scenes/stack-scene-data.js';
import { formatNumber } from '../../charts/format.js';
import { type DeskModel, evaluationOf, placed } from '../model/desk-model.js';

/** Points of a profile in the air above the skin and inside each layer: enough for an eye. */
const inAir = 24;
const inLayer = 6;

const slab = ({ name, material, thickness_mm }: StackLayer): SceneSlab => ({
  name,
  material: material.name,
  family: material.family,
  thickness_mm,
});

/**
 * Primary photons per mm² and frame from near the focal spot to the detector plane: at the skin
 * those that make up the incident air kerma, below it by the layers' transmissions by number (in
 * equal ratios inside a layer), all along by the inverse square law in a point beam.
 */
export function primaryAlong(evaluation: Evaluation, stack: Stack): DepthProfile {
  const { beam, dose, transmission } = evaluation;
  const atSkin =
    (beam.fluence_per_mm2_per_mAs * dose.incidentAirKerma_mGy * 1000) / beam.airKerma_uGy_per_mAs;
  const toSkin = stack.sourceToSkin_mm;
  const depths_mm: number[] = [];
  const values: number[] = [];
  const add = (depth_mm: number, share: number) => {
    const spread = stack.beam === 'parallel' ? 1 : (toSkin / (toSkin + depth_mm)) ** 2;
    depths_mm.push(depth_mm);
    values.push(atSkin * share * spread);
  };
  for (let i = 1; i < inAir; i += 1) add(toSkin * (i / inAir - 1), 1);
  let depth_mm = 0;
  let share = 1;
  add(0, 1);
  stack.layers.forEach((layer, k) => {
    const after = transmission.layers[k]?.cumulativeByNumber ?? share;
    for (let i = 1; i <= inLayer; i += 1) {
      const part = i / inLayer;
      const passed = share > 0 && after > 0 ? share * (after / share) ** part : after;
      add(depth_mm + layer.thickness_mm * part, passed);
    }
    depth_mm += layer.thickness_mm;
    share = after;
  });
  add(stack.sourceToDetector_mm - toSkin, share);
  return { depths_mm, values };
}

const shapeWords: Record<Detail['shape'], string> = {
  vessel: 'vessel',
  slab: 'slab',
  coat: 'coat',
  defect: 'defect',
  insert: 'insert',
};

/** The detail at its place; its width runs across the cut face, its length into the drawing. */
function sceneDetail(c: Case, detail: PlacedDetail): SceneDetail {
  const drawn = c.task.detail;
  const height_mm = detail.central.displaced_mm;
  const { agent } = drawn;
  const filled = agent
    ? `, ${agent.name} ${formatNumber(agent.amount.value)} ${agent.amount.unit}`
    : '';
  return {
    form: detail.shape === 'vessel' ? 'cylinder' : 'box',
    centreDepth_mm: detail.centreDepth_mm,
    height_mm,
    breadth_mm: drawn.width_mm ?? drawn.length_mm,
    length_mm: drawn.length_mm,
    isAbsence: detail.shape === 'defect',
    label: `${formatNumber(height_mm)} mm ${shapeWords[detail.shape]}${filled}`,
  };
}

function sceneTechnique(c: Case, index: number): SceneTechnique {
  const { name, filter, grid } = c.techniques[index];
  const layers = c.room.filters.find((entry) => entry.name === filter)?.layers ?? [];
  return {
    name,
    filter: layers.length > 0 ? { label: filter } : null,
    isGridIn: grid === 'in' && c.room.grid !== null,
  };
}

/** What the layer view draws of a case and the last answer to it; null where the patient has no place. */
export function sceneOf(model: DeskModel): StackScene | null {
  const { stack, detail } = placed(model);
  if (!stack) return null;
  const c = model.draft.case;
  const { left, right } = model;
  const shown = right === null ? [left] : [left, right];
  const profiles = shown.map((index) => {
    const evaluation = evaluationOf(model, index);
    return evaluation && primaryAlong(evaluation, stack);
  });
  const first = sceneTechnique(c, left);
  return {
    beam: stack.beam,
    sourceToSkin_mm: stack.sourceToSkin_mm,
    sourceToDetector_mm: stack.sourceToDetector_mm,
    field_mm: stack.field_mm,
    lateral_mm: c.patient.lateral_mm,
    layers: stack.layers.map(slab),
    supportEntrance: stack.supportEntrance.map(slab),
    supportExit: stack.supportExit.map(slab),
    detail: detail && sceneDetail(c, detail),
    grid: c.room.grid && { label: `grid ${formatNumber(c.room.grid.ratio)}:1` },
    detector: { label: c.room.detector.material },
    techniques: right === null ? [first] : [first, sceneTechnique(c, right)],
    primary: {
      quantity: 'primary photons',
      unit: 'per mm² and frame',
      scale: 'log',
      extent: 'beam',
      perTechnique: profiles,
    },
  };
}

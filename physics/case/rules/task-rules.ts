import { grownThicknesses_mm, growthShares } from '../../stack/grow-layers.js';
import { type Fault, faultAt } from '../fault.js';
import type { Case, Detail, Layer } from '../schema.js';
import { agentFaults } from './agent-rules.js';
import { unknownNameFaults } from './known-name.js';
import { unknownMaterialFaults } from './material-rules.js';

const path = ['task', 'detail'];

/** The materials and the agent that the detail names must be known. */
export const taskMaterialFaults = (c: Pick<Case, 'task' | 'materials'>): Fault[] => {
  const { material, reference, agent } = c.task.detail;
  return [
    ...(material === null ? [] : unknownMaterialFaults([...path, 'material'], material, c)),
    ...unknownMaterialFaults([...path, 'reference'], reference, c, ['layer']),
    ...agentFaults([...path, 'agent'], agent, c),
  ];
};

/** The detail must lie inside a layer that exists, at every size, and be made of something. */
export const detailFaults = ({ task, patient }: Pick<Case, 'task' | 'patient'>): Fault[] => {
  const { detail } = task;
  const names = patient.layers.map((layer) => layer.name);
  const layer = patient.layers.find(({ name }) => name === detail.inLayer);
  return [
    ...unknownNameFaults([...path, 'inLayer'], detail.inLayer, names, 'the name of a layer'),
    ...matterFaults(detail, layer),
    ...(layer ? placeFaults(detail, layer) : []),
    ...(layer ? thinLayerFaults(detail, patient) : []),
  ];
};

/** Thickness of the layer that the detail takes. */
const height_mm = (detail: Detail): number =>
  detail.shape === 'coat' ? detail.size_mm * detail.walls : detail.size_mm;

const matterFaults = (detail: Detail, layer: Layer | undefined): Fault[] => {
  if (detail.shape === 'defect') {
    return layer === undefined || layer.agent !== null
      ? []
      : [
          faultAt(
            [...path, 'shape'],
            detail.shape,
            `must lie in a layer that holds an agent, which "${layer.name}" does not`,
            'give the layer its agent or choose another shape',
          ),
        ];
  }
  if (detail.shape === 'insert' && detail.material === null) {
    return [
      faultAt(
        [...path, 'material'],
        undefined,
        'must be given for an insert',
        "name the insert's material",
      ),
    ];
  }
  if (detail.agent !== null || detail.material !== null) return [];
  return [
    faultAt(
      [...path, 'agent'],
      undefined,
      `must be given for a ${detail.shape}`,
      'name the agent with its amount, or a material',
    ),
  ];
};

const placeFaults = (detail: Detail, layer: Layer): Fault[] => {
  const height = height_mm(detail);
  if (height > layer.thickness_mm) {
    const rule = `must fit into layer "${layer.name}" of ${layer.thickness_mm} mm`;
    return [
      faultAt(
        [...path, 'size_mm'],
        detail.size_mm,
        rule,
        'enter a smaller detail or a thicker layer',
      ),
    ];
  }
  const depth = detail.depthInLayer_mm;
  const low = height / 2;
  const high = layer.thickness_mm - height / 2;
  if (depth === null || (depth >= low - 1e-9 && depth <= high + 1e-9)) return [];
  const rule = `must be ${low} to ${high} so that the detail lies inside layer "${layer.name}"`;
  return [
    faultAt([...path, 'depthInLayer_mm'], depth, rule, "enter the depth of the detail's centre"),
  ];
};

/** A smaller patient must not squeeze the layer below the detail's own thickness. */
const thinLayerFaults = (detail: Detail, { layers, sizes }: Case['patient']): Fault[] => {
  const shares = growthShares(layers);
  const position = layers.findIndex(({ name }) => name === detail.inLayer);
  const height = height_mm(detail);
  if (shares === null || height > layers[position].thickness_mm) return [];
  return sizes.flatMap(({ thickness_mm }, index) => {
    const left_mm = grownThicknesses_mm(layers, shares, thickness_mm)[position];
    if (left_mm <= 0 || left_mm >= height - 1e-9) return [];
    const rule = `must leave layer "${detail.inLayer}" at least the detail's ${height} mm`;
    const remedy = `enter a larger size; this one leaves ${Number(left_mm.toPrecision(3))} mm`;
    return [faultAt(['patient', 'sizes', index, 'thickness_mm'], thickness_mm, rule, remedy)];
  });
};

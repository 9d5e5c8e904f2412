import { addLayer, moveLayer, removeLayer, setLayerThickness } from '../../store/layer-changes.js';
import type { Json } from '../../store/path.js';
import type { CaseEdit } from '../fields/case-edit.js';

/** The edits of the layer list, as elements send them up. */
export const layerEdits = {
  thickness:
    (index: number) =>
    (value: Json): CaseEdit => ({
      joins: `layer ${index} thickness`,
      change: setLayerThickness(index, value),
    }),
  move: (index: number, by: -1 | 1): CaseEdit => ({ change: moveLayer(index, by) }),
  remove: (index: number): CaseEdit => ({ change: removeLayer(index) }),
  add: (below: number): CaseEdit => ({ change: addLayer(below) }),
};

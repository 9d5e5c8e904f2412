import { type Json, valueAtPath, withValueAt } from './path.js';

type Change = (document: Json) => Json;

const layersOf = (document: Json): readonly Json[] => {
  const layers = valueAtPath(document, 'patient.layers');
  return Array.isArray(layers) ? layers : [];
};

const numberAt = (json: Json, key: string): number | null => {
  const value = valueAtPath(json, key);
  return typeof value === 'number' ? value : null;
};

const drawn_mm = (layers: readonly Json[]): number =>
  layers.reduce<number>((sum, layer) => sum + (numberAt(layer, 'thickness_mm') ?? 0), 0);

/** True when every layer has a thickness: a faulty entry must not change the patient. */
const isDrawn = (layers: readonly Json[]): boolean =>
  layers.length > 0 && layers.every((layer) => (numberAt(layer, 'thickness_mm') ?? 0) > 0);

const rounded = (value: number): number => Number(value.toPrecision(12));

/**
 * Other layers in place of those there. A size as thick as the layers drawn keeps to them: whoever
 * adds 20 mm of fat to the drawing means the patient drawn to be thicker.
 */
function withLayers(document: Json, layers: readonly Json[]): Json {
  const before = drawn_mm(layersOf(document));
  const after = drawn_mm(layers);
  const changed = withValueAt(document, 'patient.layers', layers);
  const sizes = valueAtPath(document, 'patient.sizes');
  if (!Array.isArray(sizes) || !isDrawn(layersOf(document)) || !isDrawn(layers)) return changed;
  const follow = sizes.map((size) =>
    Math.abs((numberAt(size, 'thickness_mm') ?? Number.NaN) - before) < 1e-6
      ? withValueAt(size, 'thickness_mm', rounded(after))
      : size,
  );
  return withValueAt(changed, 'patient.sizes', follow);
}

/** The growth share of a layer taken away, handed to the others in proportion to their own. */
function sharedOut(layers: readonly Json[], share: number): readonly Json[] {
  const shares = layers.map((layer) => numberAt(layer, 'growthShare'));
  const total = shares.reduce<number>((sum, entry) => sum + (entry ?? 0), 0);
  if (share <= 0 || shares.some((entry) => entry === null)) return layers;
  return layers.map((layer, i) => {
    const own = shares[i] ?? 0;
    const grown = total > 0 ? own + (share * own) / total : 1 / layers.length;
    return withValueAt(layer, 'growthShare', rounded(grown));
  });
}

export const setLayerThickness =
  (index: number, value: Json): Change =>
  (document) =>
    withLayers(
      document,
      layersOf(withValueAt(document, `patient.layers[${index}].thickness_mm`, value)),
    );

/** Layer `index` one place up or down; at the end of the stack nothing changes. */
export const moveLayer =
  (index: number, by: -1 | 1): Change =>
  (document) => {
    const layers = [...layersOf(document)];
    const to = index + by;
    if (to < 0 || to >= layers.length) return document;
    [layers[index], layers[to]] = [layers[to], layers[index]];
    return withLayers(document, layers);
  };

/** The stack without layer `index`; the last layer stays. */
export const removeLayer =
  (index: number): Change =>
  (document) => {
    const layers = layersOf(document);
    if (layers.length < 2 || index >= layers.length) return document;
    const left = layers.filter((_, i) => i !== index);
    return withLayers(document, sharedOut(left, numberAt(layers[index], 'growthShare') ?? 0));
  };

/** A new layer of 10 mm soft tissue below layer `below`, under a name not yet taken. */
export const addLayer =
  (below: number): Change =>
  (document) => {
    const layers = layersOf(document);
    const names = layers.map((layer) => valueAtPath(layer, 'name'));
    const wanted = ['layer', ...Array.from({ length: 999 }, (_, i) => `layer ${i + 2}`)];
    const name = wanted.find((candidate) => !names.includes(candidate)) ?? 'layer';
    const shared = layers.some((layer) => numberAt(layer, 'growthShare') !== null);
    const added: Json = {
      name,
      material: 'soft tissue',
      thickness_mm: 10,
      ...(shared ? { growthShare: 0 } : {}),
    };
    return withLayers(document, [...layers.slice(0, below + 1), added, ...layers.slice(below + 1)]);
  };

/** A layer under another name; the detail that lies in it follows. */
export const renameLayer =
  (index: number, name: string): Change =>
  (document) => {
    const before = valueAtPath(document, `patient.layers[${index}].name`);
    const renamed = withValueAt(document, `patient.layers[${index}].name`, name);
    return valueAtPath(document, 'task.detail.inLayer') === before
      ? withValueAt(renamed, 'task.detail.inLayer', name)
      : renamed;
  };

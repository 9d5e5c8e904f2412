import type { DepthProfile, StackScene, Tracks } from '../../scenes/index.js';

/** Inverse square and exponential attenuation, enough like a beam to draw; invented. */
export function invented(
  toSkin_mm: number,
  toDetector_mm: number,
  start: number,
  thickness_mm = 200,
): DepthProfile {
  const depths_mm = Array.from(
    { length: 60 },
    (_, i) => -0.95 * toSkin_mm + (i / 59) * (toDetector_mm - 0.05 * toSkin_mm),
  );
  const attenuation = (depth: number) =>
    Math.exp(-0.02 * Math.min(thickness_mm, Math.max(0, depth)));
  const spread = (depth: number) => (toSkin_mm / (toSkin_mm + depth)) ** 2;
  return {
    depths_mm,
    values: depths_mm.map((depth) => start * attenuation(depth) * spread(depth)),
  };
}

/** An invented stack: three layers, a vessel in the second, a filter for Proposed alone. */
export const sampleScene: StackScene = {
  beam: 'point',
  sourceToSkin_mm: 850,
  sourceToDetector_mm: 1150,
  field_mm: [250, 200],
  lateral_mm: null,
  layers: [
    { name: 'front', material: 'adipose', family: 'adipose', thickness_mm: 20 },
    { name: 'middle', material: 'soft tissue', family: 'soft tissue', thickness_mm: 170 },
    { name: 'back', material: 'cortical bone', family: 'bone', thickness_mm: 10 },
  ],
  supportEntrance: [
    { name: 'support', material: 'carbon fibre', family: 'plastic', thickness_mm: 2 },
  ],
  supportExit: [],
  detail: {
    form: 'cylinder',
    centreDepth_mm: 105,
    height_mm: 6,
    breadth_mm: 6,
    length_mm: 10,
    isAbsence: false,
    label: '6 mm vessel',
  },
  grid: { label: 'grid 10:1' },
  detector: { label: 'caesium iodide' },
  techniques: [
    { name: 'Current', filter: null, isGridIn: true },
    { name: 'Proposed', filter: { label: '0.2 Cu' }, isGridIn: true },
  ],
  primary: {
    quantity: 'primary photons',
    unit: 'per mm² and frame',
    scale: 'log',
    extent: 'beam',
    perTechnique: [invented(850, 1150, 6e6), invented(850, 1150, 3e6)],
  },
};

/** Four pieces of paths, one of each kind. */
export const sampleTracks: Tracks = {
  technique: 1,
  segments_mm: Float32Array.from(
    [
      [0, 0, -850, 10, 5, 40],
      [10, 5, 40, 60, -20, 90],
      [60, -20, 90, 62, -22, 120],
      [62, -22, 120, 62, -22, 120],
    ].flat(),
  ),
  kinds: Uint8Array.from([0, 1, 2, 3]),
};

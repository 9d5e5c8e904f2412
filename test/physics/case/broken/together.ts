import { type BrokenCase, changed, type Loose } from './broken-case.js';

/** Values that are sound alone but not together. */
export const together: readonly BrokenCase[] = [
  changed('no layers', (c) => (c.patient.layers = []), 'patient.layers', 'must hold at least 1'),
  changed('no techniques', (c) => (c.techniques = []), 'techniques', 'must hold at least 1'),
  changed(
    'a potential range upside down',
    (c) => (c.room.tube.potential_kV = { min: 125, max: 50, step: 1 }),
    'room.tube.potential_kV.min',
    'must be below max, 50',
  ),
  changed(
    'growth shares that sum to 0.9',
    (c) => (c.patient.layers[0].growthShare = 0.2),
    'patient.layers',
    'must have growth shares that sum to 1',
  ),
  changed(
    'a growth share left out of one layer',
    (c) => delete c.patient.layers[2].growthShare,
    'patient.layers[2].growthShare',
    'must be given in every layer or in none',
  ),
  changed(
    'mass fractions that sum to 0.5',
    (c) => (c.materials[0].massFractions = { H: 0.1, C: 0.4 }),
    'materials[0].massFractions',
    'must sum to 1 within 0.02',
  ),
  changed(
    'a detail thicker than its layer',
    (c) => (c.task.detail.size_mm = 171),
    'task.detail.size_mm',
    'must fit into layer "abdomen" of 170 mm',
  ),
  changed(
    'a detail that sticks out of its layer',
    (c) => (c.task.detail.depthInLayer_mm = 169),
    'task.detail.depthInLayer_mm',
    'must be 3 to 167 so that the detail lies inside layer "abdomen"',
  ),
  changed(
    'a size so small that a layer vanishes',
    (c) => c.patient.sizes.push({ name: 'tiny', thickness_mm: 100 }),
    'patient.sizes[1].thickness_mm',
    'must leave layer "front" some thickness',
  ),
  changed(
    'a size at which the layer is thinner than the detail',
    (c) => {
      c.patient.layers.forEach((layer: Loose) => {
        layer.growthShare = layer.name === 'abdomen' ? 1 : 0;
      });
      c.patient.sizes[0].thickness_mm = 36;
    },
    'patient.sizes[0].thickness_mm',
    'must leave layer "abdomen" at least the detail\'s 6 mm',
  ),
  changed(
    'a grid in the beam of a room without one',
    (c) => (c.room.grid = null),
    'techniques[0].grid',
    'must be "out" in a room without a grid',
  ),
  changed(
    'strips thicker than their pitch',
    (c) => (c.room.grid.strip.thickness_um = 300),
    'room.grid.strip.thickness_um',
    'must be below the pitch of 250 µm at 40 strips/cm',
  ),
];

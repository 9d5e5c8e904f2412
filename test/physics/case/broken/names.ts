import { type BrokenCase, changed } from './broken-case.js';

/** Names that lead nowhere, collide, or do not print. */
export const names: readonly BrokenCase[] = [
  changed(
    'an unknown material',
    (c) => (c.patient.layers[1].material = 'soft tisue'),
    'patient.layers[1].material',
    'must be a known material',
  ),
  changed(
    'an unknown filter material',
    (c) => (c.room.filters[1].layers[0].material = 'unobtainium'),
    'room.filters[1].layers[0].material',
    'must be a known material',
  ),
  changed(
    'an unknown agent',
    (c) => (c.task.detail.agent.name = 'iodin'),
    'task.detail.agent.name',
    'must be a known agent',
  ),
  changed(
    'an unknown carrier',
    (c) => (c.task.detail.agent.carrier = 'milk'),
    'task.detail.agent.carrier',
    'must be a known material',
  ),
  changed(
    'a filter that the room lacks',
    (c) => (c.techniques[1].filter = '0.3 Cu'),
    'techniques[1].filter',
    'must be one of room.filters',
  ),
  changed(
    'a reading behind a filter that the room lacks',
    (c) => (c.room.readings[0].filter = 'heavy'),
    'room.readings[0].filter',
    'must be one of room.filters',
  ),
  changed(
    'a detail in a layer that does not exist',
    (c) => (c.task.detail.inLayer = 'abdomin'),
    'task.detail.inLayer',
    'must be the name of a layer',
  ),
  changed(
    'two layers of one name',
    (c) => (c.patient.layers[2].name = 'front'),
    'patient.layers[2].name',
    'must be unique in its list',
  ),
  changed(
    'two techniques of one name',
    (c) => (c.techniques[1].name = 'Current'),
    'techniques[1].name',
    'must be unique in its list',
  ),
  changed(
    'a material with the name of a built-in one',
    (c) => (c.materials[0].name = 'water'),
    'materials[0].name',
    'must not be the name of a built-in material',
  ),
  changed(
    'a name that reverses the text after it',
    (c) => (c.room.name = 'Room \u202eA'),
    'room.name',
    'must be printable text',
  ),
  changed(
    'a name with a line break',
    (c) => (c.patient.layers[0].name = 'front\nback'),
    'patient.layers[0].name',
    'must be printable text',
  ),
  changed(
    'an empty name',
    (c) => (c.techniques[0].name = ''),
    'techniques[0].name',
    'must not be empty',
  ),
  changed(
    'a formula of an element that does not exist',
    (c) => (c.materials[0] = { name: 'x', density_g_per_cm3: 1, formula: 'Qq2O' }),
    'materials[0].formula',
    'which is no element from H to U',
  ),
  changed(
    'a material of nothing',
    (c) => (c.materials[0] = { name: 'x', density_g_per_cm3: 1 }),
    'materials[0].massFractions',
    'must sum to 1 within 0.02',
  ),
  changed(
    'an element that does not exist',
    (c) => (c.materials[0].massFractions = { H: 0.5, Qq: 0.5 }),
    'materials[0].massFractions.Qq',
    'must be named by an element symbol, H to U',
  ),
];

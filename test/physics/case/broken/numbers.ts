import { type BrokenCase, changed, rewritten } from './broken-case.js';

/** Numbers out of bounds, of the wrong type, or no numbers at all. */
export const numbers: readonly BrokenCase[] = [
  changed(
    'an anode angle beyond the model',
    (c) => (c.room.tube.anodeAngle_deg = 95),
    'room.tube.anodeAngle_deg',
    'must be 6 to 22',
  ),
  changed(
    'a negative layer thickness',
    (c) => (c.patient.layers[2].thickness_mm = -3),
    'patient.layers[2].thickness_mm',
    'must be positive',
  ),
  changed(
    'a layer of no thickness',
    (c) => (c.patient.layers[0].thickness_mm = 0),
    'patient.layers[0].thickness_mm',
    'must be positive',
  ),
  changed(
    'a negative filter thickness',
    (c) => (c.room.filters[1].layers[0].thickness_mm = -0.2),
    'room.filters[1].layers[0].thickness_mm',
    'must be 0 to 1000',
  ),
  rewritten(
    'NaN in the text',
    ['"anodeAngle_deg": 12', '"anodeAngle_deg": NaN'],
    'line 16, column 25',
    'must be a value',
  ),
  rewritten(
    'a number beyond all numbers',
    ['"power_kW": 80', '"power_kW": 1e999'],
    'room.tube.power_kW',
    'must be a finite number',
  ),
  changed(
    'a potential of 1e308 kV',
    (c) => (c.techniques[0].potential_kV = 1e308),
    'techniques[0].potential_kV',
    'must be 20 to 150',
  ),
  changed(
    'a tube load of 1e308 mAs',
    (c) => (c.techniques[0].control = { tubeLoad_mAs: 1e308 }),
    'techniques[0].control.tubeLoad_mAs',
    'must be at most 1000000',
  ),
  changed(
    'a potential just below the model',
    (c) => (c.techniques[1].potential_kV = 19.9),
    'techniques[1].potential_kV',
    'must be 20 to 150',
  ),
  changed(
    'a potential just above the model',
    (c) => (c.techniques[1].potential_kV = 150.1),
    'techniques[1].potential_kV',
    'must be 20 to 150',
  ),
  changed(
    'a number written as text',
    (c) => (c.room.tube.power_kW = '80'),
    'room.tube.power_kW',
    'must be a number',
  ),
  changed(
    'a null where a number belongs',
    (c) => (c.techniques[0].potential_kV = null),
    'techniques[0].potential_kV',
    'must be a number, 20 to 150',
  ),
  changed(
    'half a frame',
    (c) => (c.techniques[0].acquisition.frames = 12.5),
    'techniques[0].acquisition.frames',
    'must be a whole number, at least 1',
  ),
  changed(
    'no frames at all',
    (c) => (c.techniques[0].acquisition.frames = 0),
    'techniques[0].acquisition.frames',
    'must be a whole number, at least 1',
  ),
  changed(
    'more than full filling',
    (c) => (c.task.detail.fillingFraction = 1.2),
    'task.detail.fillingFraction',
    'must be above 0 and at most 1',
  ),
  changed(
    'percent where a fraction belongs',
    (c) => (c.room.detector.glare_fraction = 3),
    'room.detector.glare_fraction',
    'must be 0 to 0.9',
  ),
  changed('three walls', (c) => (c.task.detail.walls = 3), 'task.detail.walls', 'must be 1 or 2'),
  changed(
    'a field of one side',
    (c) => (c.room.geometry.field_mm = [250]),
    'room.geometry.field_mm',
    'must hold exactly 2 values',
  ),
  changed(
    'a field side that is text',
    (c) => (c.room.geometry.field_mm = [250, '250']),
    'room.geometry.field_mm[1]',
    'must be a number',
  ),
];

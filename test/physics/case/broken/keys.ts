import { type BrokenCase, changed, rewritten } from './broken-case.js';

/** Keys that are unknown, missing, doubled, or reach for a prototype. */
export const keys: readonly BrokenCase[] = [
  changed(
    'thickness in the wrong unit',
    (c) => {
      c.patient.layers[0].thickness_cm = 2;
      delete c.patient.layers[0].thickness_mm;
    },
    'patient.layers[0].thickness_cm',
    'is not a key of patient.layers[0]',
  ),
  changed(
    'an unknown key at the top',
    (c) => (c.colour = 'red'),
    'colour',
    'is not a key of a case',
  ),
  changed(
    'an unknown key deep down',
    (c) => (c.room.detector.gain = 3),
    'room.detector.gain',
    'is not a key of room.detector',
  ),
  changed(
    'a key whose name is no word',
    (c) => (c.room['tube <b>'] = 1),
    'room["tube <b>"]',
    'is not a key of room',
  ),
  changed(
    'an unknown amount unit',
    (c) => (c.task.detail.agent.amount.unit = 'mg/mL'),
    'task.detail.agent.amount.unit',
    'must be one of "mg element/mL", "mg compound/mL", "mmol/mL", "% w/v"',
  ),
  rewritten(
    'a key __proto__',
    ['"title"', '"__proto__": { "polluted": true }, "title"'],
    '__proto__',
    'is not a key of a case',
  ),
  rewritten(
    'a key __proto__ inside free text',
    ['"text": {}', '"text": { "__proto__": "x" }'],
    'dossier.text.__proto__',
    'is not a key of a case',
  ),
  changed(
    'a key constructor',
    (c) => (c.room.constructor = { prototype: {} }),
    'room.constructor',
    'is not a key of a case',
  ),
  changed(
    'a key toString',
    (c) => (c.room.tube.toString = 'x'),
    'room.tube.toString',
    'is not a key of room.tube',
  ),
  changed(
    'the prototype among mass fractions',
    (c) => (c.materials[0].massFractions.prototype = 0.1),
    'materials[0].massFractions.prototype',
    'is not a key of a case',
  ),
  rewritten(
    'a key twice',
    ['"version": 1,', '"version": 1, "version": 1,'],
    'line 3, column 17',
    'must not stand twice in one object',
  ),
  changed('no patient', (c) => delete c.patient, 'patient', 'must be given'),
  changed(
    'no control',
    (c) => delete c.techniques[0].control,
    'techniques[0].control',
    'must be given',
  ),
  changed(
    'two controls at once',
    (c) => (c.techniques[0].control.tubeLoad_mAs = 5),
    'techniques[0].control',
    'must hold exactly one of detectorAirKerma_uGy, detectorSignal, incidentAirKerma_mGy, tubeLoad_mAs, curve',
  ),
  changed(
    'an unknown control',
    (c) => (c.techniques[0].control = { brightness: 5 }),
    'techniques[0].control',
    'must hold exactly one of detectorAirKerma_uGy, detectorSignal, incidentAirKerma_mGy, tubeLoad_mAs, curve',
  ),
  changed(
    'an unknown way to fix the exposure',
    (c) => (c.techniques[0].acquisition.fixed = 'longest'),
    'techniques[0].acquisition.fixed',
    'must be "shortest" or hold exactly one of exposureTime_ms, tubeCurrent_mA',
  ),
  changed(
    'an unknown kind of source',
    (c) => (c.room.source = { kind: 'gamma', energy_keV: 60 }),
    'room.source.kind',
    'must be one of "monoenergetic", "lines", "spectrum"',
  ),
];

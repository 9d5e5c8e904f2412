import { type BrokenCase, changed } from './broken-case.js';

/** Details, agents, rules and files that do not fit the rest of the case. */
export const details: readonly BrokenCase[] = [
  changed(
    'an insert of nothing',
    (c) => {
      c.task.detail.shape = 'insert';
      c.task.detail.agent = null;
    },
    'task.detail.material',
    'must be given for an insert',
  ),
  changed(
    'a vessel of nothing',
    (c) => (c.task.detail.agent = null),
    'task.detail.agent',
    'must be given for a vessel',
  ),
  changed(
    'a defect in a layer without agent',
    (c) => (c.task.detail.shape = 'defect'),
    'task.detail.shape',
    'must lie in a layer that holds an agent, which "abdomen" does not',
  ),
  changed(
    'more agent than volume',
    (c) => (c.task.detail.agent.amount.value = 5000),
    'task.detail.agent.amount.value',
    'must leave the agent no more than the whole volume, 1010 mg element/mL',
  ),
  changed(
    'rule segments out of order',
    (c) => c.room.rules[0].segments.push({ from_kV: 51, to_kV: 70, points: [[51, 1.3]] }),
    'room.rules[0].segments[1].from_kV',
    'must be above the one before, 71',
  ),
  changed(
    'a rule point outside its segment',
    (c) => (c.room.rules[0].segments[0].points[8] = [151, 5.4]),
    'room.rules[0].segments[0].points[8][0]',
    'must be within its segment, 71 to 150',
  ),
  changed(
    'an output read in mGy and entered as µGy',
    (c) => (c.room.readings[0].airKerma_uGy_per_mAs = 0.062),
    'room.readings[0].airKerma_uGy_per_mAs',
    'µGy/mAs at 80 kV and 1000 mm',
  ),
  changed(
    'a half-value layer read in cm',
    (c) => (c.room.readings[0].halfValueLayer_mmAl = 0.295),
    'room.readings[0].halfValueLayer_mmAl',
    'mm Al at 80 kV',
  ),
  changed(
    'a tube without filtration',
    (c) => {
      c.room.readings = [];
      c.room.tube.inherentFilter = [];
    },
    'room.tube.inherentFilter',
    'must be at least 1 mm aluminium equivalent with the added filter',
  ),
  changed(
    'a reading that holds no measurement',
    (c) => (c.room.readings[0] = { potential_kV: 80 }),
    'room.readings[0]',
    'must hold halfValueLayer_mmAl, airKerma_uGy_per_mAs or both',
  ),
  changed(
    'a gap beyond the focal spot',
    (c) => (c.room.geometry.exitToDetector_mm = 1200),
    'room.geometry.exitToDetector_mm',
    'must be below sourceToDetector_mm, 1150',
  ),
  changed(
    'subtraction without a mask',
    (c) => (c.techniques[0].acquisition.maskFrames = 0),
    'techniques[0].acquisition.maskFrames',
    'must be at least 1 in subtraction',
  ),
  changed(
    'a measured check of a technique that does not exist',
    (c) => c.measuredChecks.push({ quantity: 'sdnr', technique: 'Curent', values: [3] }),
    'measuredChecks[0].technique',
    'must be one of techniques',
  ),
  changed(
    'sizes in a file that is not there',
    (c) => (c.patient.sizes = { file: 'sizes.csv' }),
    'patient.sizes.file',
    'must be a file handed in with the case',
  ),
  changed(
    'a control curve that is not there',
    (c) => (c.techniques[0].control = { curve: 'control.csv' }),
    'techniques[0].control.curve',
    'must be a file handed in with the case',
  ),
  changed(
    'a spectrum that is not there',
    (c) => (c.room.source = { kind: 'spectrum', file: 'spectrum.csv' }),
    'room.source.file',
    'must be a file handed in with the case',
  ),
];

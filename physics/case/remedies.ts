import type { Path } from './printed.js';

/**
 * What to do about a bad value, by the end of its path: the longest entry that matches wins. List
 * positions are left out. A key without an entry gets its unit back: `enter it in mm`.
 */
const remedies: Readonly<Record<string, string>> = {
  format: 'write "format": "stratabeam.case"',
  version: 'write "version": 1',
  title: 'shorten the title',
  question: 'shorten the question',
  name: 'enter a short name',
  material: "name a built-in material, an element or one of the case's materials",
  carrier: "name the liquid that carries the agent, or null for the agent's own",
  'materials.density_g_per_cm3': 'enter the density in g/cm³',
  'materials.formula': 'write a formula such as BaSO4, or give massFractions',
  'materials.massFractions': 'list element symbols with their mass fractions',
  room: 'describe the room',
  'tube.anodeAngle_deg': 'enter the nameplate angle',
  'tube.ripple_percent': 'enter (Vmax − Vmin)/Vmax of the generator in percent, 0 for constant',
  'tube.outputFactor': 'leave it out and give readings instead',
  'tube.inherentFilter': 'list what lies between anode and added filter',
  'tube.potential_kV': "enter the generator's least and greatest potential and its step",
  'tube.power_kW': "enter the generator's nominal power",
  'tube.current_mA': 'enter the least and greatest tube current',
  'tube.exposureTime_ms': 'enter the least and greatest exposure time of one frame',
  'tube.focalSpot_mm': 'enter the nominal focal spot',
  'tube.rating': 'list exposure times and powers from the rating chart',
  source: 'describe the source, or null to use the tube',
  'source.energy_keV': 'enter the photon energy in keV',
  'source.lines': 'list pairs of energy in keV and photons per mm² and mAs',
  'source.kind': 'choose one of them, or leave the source out to use the tube',
  'readings.potential_kV': 'enter the tube potential of the reading',
  'readings.halfValueLayer_mmAl': 'enter the first half-value layer in mm aluminium, or null',
  'readings.airKerma_uGy_per_mAs': 'enter the air kerma per mAs at the stated distance, or null',
  'readings.distance_mm': 'enter the distance from the focal spot to the meter',
  filters: 'list the filters the room can place in the beam',
  'filters.layers': "list the filter's sheets, none for an empty slot",
  'geometry.sourceToDetector_mm': 'enter the distance from focal spot to detector',
  'geometry.exitToDetector_mm': 'enter the gap between patient and detector, 0 for contact',
  'geometry.field_mm': 'enter width and height of the field at the detector',
  'geometry.minSourceToSkin_mm': 'enter the least focus–skin distance',
  'geometry.referencePoint_mm': "enter the reference point's distance from the focal spot",
  grid: 'describe the grid, or null for a room without one',
  'grid.ratio': 'enter the grid ratio from its label, 10 for 10:1',
  'grid.strips_per_cm': 'enter the strip density from its label',
  'strip.thickness_um': 'enter the strip thickness in µm',
  'measured.primaryTransmission': 'enter a fraction, 0.7 for 70 %',
  'measured.scatterTransmission': 'enter a fraction, 0.1 for 10 %',
  'detector.arealDensity_mg_per_cm2': "enter the absorber's mass per area",
  'detector.opticalSwank': 'enter the optical Swank factor, 1 for none',
  'detector.airKerma_uGy': 'enter the least and greatest detector air kerma per frame',
  rules: 'describe the rule with its source, date and provenance',
  'rules.segments': 'list segments of potential, each with its points',
  'rules.points': 'list pairs of potential in kV and half-value layer in mm aluminium',
  'rules.source': 'name the regulation or standard',
  'rules.date': 'give the date of the text you relied on',
  'rules.provenance': 'say how the limit came to be known',
  patient: 'describe the patient as layers from entrance to exit',
  layers: 'list at least one layer, entrance to exit',
  'layers.thickness_mm': "enter the slab's thickness",
  'layers.growthShare': "enter the layer's share of a size change, or null in all layers",
  'patient.lateral_mm': 'enter width and height of the body, or null',
  sizes: 'list sizes with thickness and weight, or name a file',
  'sizes.thickness_mm': 'enter the patient thickness of this size',
  'sizes.weight': 'enter the share of patients of this size',
  task: 'say what must be seen',
  detail: 'describe the detail that must be seen',
  'detail.shape': 'choose the shape nearest to the detail',
  'detail.inLayer': 'name the layer the detail lies in',
  'detail.depthInLayer_mm':
    "enter the depth of the detail's centre below the layer's entrance face",
  'detail.size_mm': "enter the vessel's diameter or the detail's thickness along the beam",
  'detail.length_mm': 'enter the length over which the detail is seen',
  'detail.walls': 'enter 1 for a coat on one wall, 2 for both',
  'detail.fillingFraction': 'enter the filled share of the lumen, 1 for full',
  agent: 'name an agent with its amount, or null for none',
  amount: 'give value and unit as in the lumen',
  'amount.value': 'enter the amount as in the lumen',
  'amount.unit': 'choose the unit the amount was measured in',
  'task.roseThreshold': 'enter the signal-to-noise ratio asked of the detail, usually 3 to 5',
  techniques: 'list Current first, then what is proposed',
  'techniques.potential_kV': 'enter the tube potential in kV',
  'techniques.grid': 'say whether the grid is in the beam',
  'acquisition.mode': 'choose the mode the room runs in',
  'acquisition.frames': 'enter the frames of one run',
  'acquisition.maskFrames': 'enter the frames averaged into the mask, 0 for none',
  'acquisition.fixed': 'say what the room fixes: the exposure time, the tube current, or neither',
  control: 'say what the exposure control holds',
  'control.detectorAirKerma_uGy': 'enter the detector air kerma per frame in µGy',
  'control.incidentAirKerma_mGy': 'enter the incident air kerma per frame in mGy',
  'control.tubeLoad_mAs': 'enter the tube load per frame in mAs',
  'control.curve': 'name a CSV file beside the case',
  'compare.leading': 'choose what leads the comparison',
  'compare.primaryDose': 'choose the dose quantity the board looks at',
  dossier: 'put the text under dossier.text',
};

/** The advice for the value at a path. */
export const remedyFor = (path: Path): string => {
  const keys = path.filter((key): key is string => typeof key === 'string');
  for (let from = 0; from < keys.length; from++) {
    const ending = keys.slice(from).join('.');
    if (Object.hasOwn(remedies, ending)) return remedies[ending];
  }
  return remedyFromUnit(keys.at(-1) ?? '');
};

const unitNames: Readonly<Record<string, string>> = {
  deg: 'degrees',
  percent: 'percent',
  fraction: 'a fraction of 1',
  um: 'µm',
  uGy: 'µGy',
  mmAl: 'mm aluminium',
};

const remedyFromUnit = (key: string): string => {
  if (key === '') return 'hand in a case file';
  const unit = key.split('_').slice(1).join('_');
  if (unit === '') return 'correct it';
  return `enter it in ${unitNames[unit] ?? unit.replaceAll('_per_', '/').replaceAll('_', ' ')}`;
};

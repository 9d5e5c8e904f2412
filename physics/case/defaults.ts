/**
 * Every value Stratabeam assumes when a case file is silent, in one visible place. A path that took
 * its value from here is listed in `assumed` with every result and in the dossier. `null`, an empty
 * list or an empty text stands for "none given".
 */
export const defaults = {
  title: '',
  question: '',
  materials: [],
  material: { formula: null, massFractions: {} },
  room: {
    name: 'Room',
    tube: {
      anodeAngle_deg: 12,
      ripple_percent: 0,
      /** Uncalibrated output scale, ±30 % from tube to tube (Stratabeam tube model). */
      outputFactor: 0.87,
      inherentFilter: [{ material: 'aluminium', thickness_mm: 2.5 }],
      potential_kV: { min: 40, max: 125, step: 1 },
      power_kW: 80,
      current_mA: { min: 10, max: 1000 },
      exposureTime_ms: { min: 1, max: 200 },
      focalSpot_mm: 0.6,
      rating: [],
      heatPerRun_kJ: null,
    },
    source: null,
    readings: [],
    reading: {
      filter: 'none',
      halfValueLayer_mmAl: null,
      airKerma_uGy_per_mAs: null,
      distance_mm: 1000,
      relativeUncertainty_percent: 3,
    },
    filters: [{ name: 'none', layers: [] }],
    support: [],
    supportSlab: { side: 'entrance' },
    geometry: {
      beam: 'point',
      sourceToDetector_mm: 1100,
      anchor: 'detector',
      exitToDetector_mm: 100,
      field_mm: [250, 250],
      minSourceToSkin_mm: 380,
      referencePoint_mm: 600,
      air: true,
    },
    /** A room without a grid unless one is described. */
    grid: null,
    gridParts: {
      strip: { material: 'lead', thickness_um: 36 },
      interspace: { material: 'aluminium' },
      cover: [],
      measured: null,
    },
    detector: {
      material: 'caesium iodide',
      arealDensity_mg_per_cm2: 200,
      response: 'energy-integrating',
      countingThreshold_keV: 20,
      opticalSwank: 0.9,
      electronicNoiseKerma_uGy: 0.002,
      electronicNoiseBeam: 'RQA5',
      /** Equals quantum noise near 40 µGy at RQA5 in a caesium iodide panel (common practice, no source). */
      structureNoise_fraction: 0.001,
      glare_fraction: 0.03,
      pixel_mm: 0.2,
      airKerma_uGy: { min: 0.01, max: 50 },
    },
    rules: [],
    kermaRate: { appliesTo: ['fluoroscopy'] },
  },
  patient: {
    layer: { growthShare: null, agent: null },
    lateral_mm: null,
    sizes: [],
    size: { weight: 1 },
  },
  task: {
    detail: {
      /** The middle of the layer. */
      depthInLayer_mm: null,
      length_mm: 10,
      width_mm: null,
      walls: 1,
      reference: 'layer',
      fillingFraction: 1,
      material: null,
      agent: null,
    },
    /** The agent's own carrier. */
    agent: { carrier: null },
    roseThreshold: 5,
    backgroundNoise_fraction: 0,
    subtractionResidual_fraction: 0.1,
    motion_mm_per_s: 0,
  },
  technique: {
    filter: 'none',
    /** In a room without a grid the default is `out`. */
    grid: 'in',
    acquisition: {
      mode: 'radiography',
      frames: 1,
      frameRate_per_s: 1,
      maskFrames: 0,
      fixed: 'shortest',
    },
  },
  compare: { leading: 'sdnr', primaryDose: 'incidentAirKerma', sdnrMargin_percent: 5 },
  agentsCompared: [],
  agentCompared: { toxicityFactor: null, deliverable_mg_per_mL: null, source: '' },
  priors: [],
  prior: { sharing: 'shared', source: '' },
  measuredChecks: [],
  measuredCheck: { size: null, unit: '', date: '', method: '' },
  monitoring: null,
  monitoringPlan: { stopRule: '' },
  dossier: { text: {} },
} as const;

/**
 * Every value Stratabeam assumes when a case file is silent, in one visible place. A path that took
 * its value from here is listed in `assumed` with every result and in the dossier.
 */
export const defaults = {
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
    },
    filters: [{ name: 'none', layers: [] }],
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
    grid: {
      strip: { material: 'lead', thickness_um: 36 },
      interspace: { material: 'aluminium' },
      cover: [],
    },
    detector: {
      material: 'caesium iodide',
      arealDensity_mg_per_cm2: 200,
      response: 'energy-integrating',
      countingThreshold_keV: 20,
      opticalSwank: 0.9,
      electronicNoiseKerma_uGy: 0.002,
      electronicNoiseBeam: 'RQA5',
      structureNoise_fraction: 0.005,
      glare_fraction: 0.03,
      pixel_mm: 0.2,
      airKerma_uGy: { min: 0.01, max: 50 },
    },
  },
  task: {
    roseThreshold: 5,
    backgroundNoise_fraction: 0,
    subtractionResidual_fraction: 0.1,
    motion_mm_per_s: 0,
    detail: { depthInLayer_fraction: 0.5, length_mm: 10, walls: 1, fillingFraction: 1, reference: 'layer' },
  },
  technique: {
    filter: 'none',
    grid: 'in',
    acquisition: { mode: 'radiography', frames: 1, frameRate_per_s: 1, maskFrames: 0, fixed: 'shortest' },
  },
  compare: { leading: 'sdnr', primaryDose: 'incidentAirKerma', sdnrMargin_percent: 5 },
} as const;

import { absorptionEdges, elementByZ } from '../materials/index.js';
import { attenuate } from './beam/index.js';
import { binCount, type Spectrum } from './beam/spectrum.js';
import type { OperatingPoint } from './operating-point.js';
import type { Stack } from './stack/stack.js';

/** Primary photons along the axis, and the spectrum that reaches the detail, of one frame. */
export interface AlongBeam {
  readonly technique: string;
  readonly size: string;
  /** Distance from the focal spot, ascending; ends at the detector. */
  readonly distances_mm: readonly number[];
  /** Primary photons per mm² at each distance. */
  readonly primaryFluence_per_mm2: readonly number[];
  /** At the detail's centre depth, bins only: photons per mm² and keV. */
  readonly atDetail: {
    readonly energies_keV: readonly number[];
    readonly fluence_per_mm2_per_keV: readonly number[];
    /** Characteristic lines: energy and photons per mm². */
    readonly lines: readonly { readonly energy_keV: number; readonly fluence_per_mm2: number }[];
  };
  /** K edges of what the detail holds, for marking. */
  readonly kEdges: readonly { readonly element: string; readonly energy_keV: number }[];
}

const sum = (values: Float64Array): number => values.reduce((total, value) => total + value, 0);

/** Sample depths inside one layer. */
const perLayer = 12;

const spread = (stack: Stack, distance_mm: number): number =>
  stack.beam === 'parallel' ? 1 : (stack.sourceToSkin_mm / distance_mm) ** 2;

/** The primary beam of an operating point from the skin to the detector, and at the detail. */
export const alongBeam = (point: OperatingPoint): AlongBeam => {
  const { made, tubeLoad_mAs, technique, size } = point;
  const { stack, detail } = made.placement;
  const distances_mm: number[] = [];
  const fluence: number[] = [];
  const record = (distance_mm: number, beam: Spectrum): void => {
    distances_mm.push(distance_mm);
    fluence.push(sum(beam.fluence_per_mm2) * spread(stack, distance_mm) * tubeLoad_mAs);
  };
  let beam = made.skin;
  let depth_mm = 0;
  let atDetail = beam;
  record(stack.sourceToSkin_mm, beam);
  for (const layer of stack.layers) {
    const into_mm = detail.centreDepth_mm - depth_mm;
    if (into_mm >= 0 && into_mm <= layer.thickness_mm) {
      atDetail = attenuate(beam, [{ material: layer.material, thickness_mm: into_mm }]);
    }
    for (let k = 1; k <= perLayer; k++) {
      const thickness_mm = (layer.thickness_mm * k) / perLayer;
      const here = attenuate(beam, [{ material: layer.material, thickness_mm }]);
      record(stack.sourceToSkin_mm + depth_mm + thickness_mm, here);
      if (k === perLayer) beam = here;
    }
    depth_mm += layer.thickness_mm;
  }
  record(stack.sourceToDetector_mm, attenuate(beam, stack.supportExit));
  const scale = spread(stack, stack.sourceToSkin_mm + detail.centreDepth_mm) * tubeLoad_mAs;
  return {
    technique: technique.name,
    size: size.name,
    distances_mm,
    primaryFluence_per_mm2: fluence,
    atDetail: spectrumAt(atDetail, scale),
    kEdges: absorptionEdges(detail.matter, 10, 150)
      .filter(({ shell }) => shell === 'K')
      .map(({ z, energy_keV }) => ({ element: elementByZ(z).symbol, energy_keV })),
  };
};

const spectrumAt = (beam: Spectrum, scale: number): AlongBeam['atDetail'] => {
  const bins = binCount(beam);
  const { edges_keV, energies_keV, fluence_per_mm2 } = beam;
  return {
    energies_keV: [...energies_keV.subarray(0, bins)],
    fluence_per_mm2_per_keV: [...fluence_per_mm2.subarray(0, bins)].map(
      (photons, i) => (photons * scale) / (edges_keV[i + 1] - edges_keV[i]),
    ),
    lines: [...energies_keV.subarray(bins)].map((energy_keV, i) => ({
      energy_keV,
      fluence_per_mm2: fluence_per_mm2[bins + i] * scale,
    })),
  };
};

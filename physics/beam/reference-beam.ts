import { boundedMemo } from '../numeric/bounded-memo.js';
import { aluminiumForHalfValueLayer_mm } from './aluminium-equivalent.js';
import { attenuate } from './attenuate.js';
import { type ReferenceQuality, referenceQualities } from './reference-beam-table.js';
import { referenceMaterial } from './reference-materials.js';
import type { Spectrum } from './spectrum.js';
import { tungstenSpectrum } from './tube-spectrum.js';

type QualityNumber = 2 | 3 | 4 | 5 | 6 | 7 | 8 | 9 | 10;
/** A radiation quality of IEC 61267. */
export type ReferenceBeamName = `RQ${'R' | 'A'}${QualityNumber}`;

const anodeAngle_deg = 20;
const window_mmBe = 7;
const beamsKept = 128;

/**
 * A reference beam of the standard as this model makes it: 20° anode, constant potential, 7 mm
 * beryllium window, and as much aluminium as gives the half-value layer of RQRn; RQAn adds its nominal
 * aluminium. Photons per mm² and mAs at 1 m in vacuum, output scale 1.
 *
 * Against the standard (recalled): homogeneity of RQR within 0.011, half-value layer of RQA within
 * 2.1 %.
 *
 * @param extraEdges_keV K edges of whatever the beam will meet
 */
export const referenceBeam = (
  name: ReferenceBeamName,
  extraEdges_keV: readonly number[] = [],
): Spectrum => beamFor({ name, extraEdges_keV });

interface BeamRequest {
  readonly name: ReferenceBeamName;
  readonly extraEdges_keV: readonly number[];
}

const beamFor = boundedMemo<BeamRequest, Spectrum>(
  beamsKept,
  ({ name, extraEdges_keV }) => `${name}:${extraEdges_keV.join()}`,
  ({ name, extraEdges_keV }) => {
    const quality = qualityOf(name);
    const added = name.startsWith('RQA') ? quality.rqaAddedAluminium_mm : 0;
    const aluminium = {
      material: referenceMaterial('aluminium'),
      thickness_mm: fittedAluminium_mm(quality) + added,
    };
    return attenuate(windowBeam(quality.potential_kV, extraEdges_keV), [aluminium]);
  },
);

function qualityOf(name: ReferenceBeamName): ReferenceQuality {
  const quality = referenceQualities.find(({ number }) => number === Number(name.slice(3)));
  if (!quality) throw new RangeError(`${name}: must be RQR2 to RQR10 or RQA2 to RQA10`);
  return quality;
}

const windowBeam = (potential_kV: number, extraEdges_keV: readonly number[]): Spectrum =>
  attenuate(tungstenSpectrum({ potential_kV, anodeAngle_deg, extraEdges_keV }), [
    { material: referenceMaterial('beryllium'), thickness_mm: window_mmBe },
  ]);

const fitted = new Map<number, number>();

/** Aluminium behind the window that gives the half-value layer of RQRn; fitted once. */
function fittedAluminium_mm(quality: ReferenceQuality): number {
  let thickness = fitted.get(quality.number);
  if (thickness === undefined) {
    const bare = windowBeam(quality.potential_kV, []);
    thickness = aluminiumForHalfValueLayer_mm(bare, quality.rqrHalfValueLayer_mmAl) ?? 0;
    fitted.set(quality.number, thickness);
  }
  return thickness;
}

import type { Provenance } from '../../materials/index.js';

/** One radiation quality pair: RQRn and, behind added aluminium, RQAn. */
export interface ReferenceQuality {
  readonly number: number;
  readonly potential_kV: number;
  /** First half-value layer that defines RQRn, mm Al. */
  readonly rqrHalfValueLayer_mmAl: number;
  /** Aluminium that RQAn adds to RQRn, mm. */
  readonly rqaAddedAluminium_mm: number;
}

export const referenceQualitySource: { readonly source: string; readonly provenance: Provenance } =
  {
    source: 'IEC 61267:2005, tables 1 and 4',
    provenance: 'recalled',
  };

/** Columns: number, potential in kV, HVL1 of RQR in mm Al, added aluminium of RQA in mm. */
const rows: readonly (readonly [number, number, number, number])[] = [
  [2, 40, 1.42, 4],
  [3, 50, 1.78, 10],
  [4, 60, 2.19, 16],
  [5, 70, 2.58, 21],
  [6, 80, 3.01, 26],
  [7, 90, 3.48, 30],
  [8, 100, 3.97, 34],
  [9, 120, 5.0, 40],
  [10, 150, 6.57, 45],
];

/** The qualities RQR2 to RQR10 and RQA2 to RQA10 (`referenceQualitySource`). */
export const referenceQualities: readonly ReferenceQuality[] = rows.map(
  ([number, potential_kV, rqrHalfValueLayer_mmAl, rqaAddedAluminium_mm]) => ({
    number,
    potential_kV,
    rqrHalfValueLayer_mmAl,
    rqaAddedAluminium_mm,
  }),
);

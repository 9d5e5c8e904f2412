import type { Case } from '../../../physics/case/schema.js';
import { isCurve } from '../../../physics/control.js';
import { type Json, withValueAt } from '../../store/path.js';
import { addTechnique, controlOfKind } from '../../store/technique-changes.js';

/** A setting to take over into a Proposed technique. */
export interface Adopted {
  readonly potential_kV: number;
  readonly filter: string;
  /** What the control is to hold; null keeps the technique's own control. */
  readonly detectorAirKerma_uGy: number | null;
}

/**
 * Whether adopting a setting must replace the control of a technique: a control curve decides
 * potential and filter itself, so a setting beside it would mean nothing.
 */
export const replacesControl = (c: Case, technique: number | null): boolean =>
  isCurve(c.techniques[technique ?? 0].control);

/**
 * The document with a setting adopted as Proposed: into technique number `technique`, or into a new
 * technique, a copy of Current, where there is none.
 */
export const adoptSetting =
  (technique: number | null, { potential_kV, filter, detectorAirKerma_uGy }: Adopted) =>
  (document: Json): Json => {
    const index = technique ?? 1;
    const path = `techniques[${index}]`;
    const standing = technique === null ? addTechnique(0)(document) : document;
    const set = withValueAt(
      withValueAt(standing, `${path}.potential_kV`, potential_kV),
      `${path}.filter`,
      filter,
    );
    return detectorAirKerma_uGy === null
      ? set
      : withValueAt(
          set,
          `${path}.control`,
          controlOfKind('detectorAirKerma_uGy', Number(detectorAirKerma_uGy.toPrecision(4)), ''),
        );
  };

import {
  aluminiumForHalfValueLayer_mm,
  attenuate,
  halfValueLayer_mm,
  homogeneityCoefficient,
  idealSnrSquaredPerAirKerma_per_mm2_uGy,
  type ReferenceBeamName,
  referenceBeam,
  type Spectrum,
} from '../beam/index.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { type ReferenceRow, referenceRows } from './reference-rows.js';

/**
 * Reference beams: RQR as fitted to its first half-value layer, RQA behind the nominal aluminium.
 * The fitted value itself is no check and is left out.
 */
export const qualityChecks = (): CheckRow[] =>
  referenceRows('qualities').flatMap((row) => {
    const name = (/RQ[RA]\d+/.exec(row.item)?.[0] ?? 'RQA5') as ReferenceBeamName;
    if (row.set === 'RQR' && row.item.includes('homogeneity')) return [homogeneityCheck(row, name)];
    if (row.set === 'RQA' && row.item.includes('HVL1')) return [halfValueLayerCheck(row, name)];
    return row.set === 'IEC62220' ? [fluenceCheck(row, name)] : [];
  });

const homogeneityCheck = (row: ReferenceRow, name: ReferenceBeamName): CheckRow =>
  checkRow(row, homogeneityCoefficient(referenceBeam(name)), { absolute: 0.015 });

const halfValueLayerCheck = (row: ReferenceRow, name: ReferenceBeamName): CheckRow =>
  checkRow(row, halfValueLayer_mm(referenceBeam(name), materialOf('aluminium')), {
    relative: 0.025,
  });

/** First half-value layers of the RQA of IEC 61267:1994 (recalled), on which the 2003 edition rests. */
const olderHalfValueLayers_mmAl: Readonly<Record<string, number>> = {
  RQA3: 4.0,
  RQA5: 7.1,
  RQA7: 9.1,
  RQA9: 11.5,
};

/** Photons per air kerma as an ideal counter sees them, in the beam of the edition. */
const fluenceCheck = (row: ReferenceRow, name: ReferenceBeamName): CheckRow => {
  const older_mmAl = row.item.includes('2003') ? olderHalfValueLayers_mmAl[name] : undefined;
  const beam = older_mmAl === undefined ? referenceBeam(name) : olderBeam(name, older_mmAl);
  return checkRow(row, beam && idealSnrSquaredPerAirKerma_per_mm2_uGy(beam), {
    relative: 0.03,
    ...(older_mmAl === undefined ? {} : { note: olderEdition }),
  });
};

const olderEdition =
  'computed for the RQA of IEC 61267:1994, set by half-value layer, on which the 2003 edition rests; by the added filter of 2005 RQA3 would be 5 % lower';

/** RQR behind as much aluminium as gives the older half-value layer. */
const olderBeam = (name: ReferenceBeamName, halfValueLayer_mmAl: number): Spectrum | null => {
  const open = referenceBeam(name.replace('RQA', 'RQR') as ReferenceBeamName);
  const thickness_mm = aluminiumForHalfValueLayer_mm(open, halfValueLayer_mmAl);
  return thickness_mm === null
    ? null
    : attenuate(open, [{ material: materialOf('aluminium'), thickness_mm }]);
};

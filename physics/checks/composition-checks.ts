import { elementBySymbol } from '../../materials/index.js';
import { type CheckRow, carried, checkRow } from './check-row.js';
import { findMaterial } from './material-of.js';
import { type ReferenceRow, referenceRows } from './reference-rows.js';

/** Densities and mass fractions of the tissues and materials that Stratabeam carries. */
export const compositionChecks = (): CheckRow[] =>
  referenceRows('compositions')
    .flatMap((row) => (row.set === 'density' ? densityCheck(row) : massFractionCheck(row)))
    .map(carried);

const densityCheck = (row: ReferenceRow): CheckRow[] => {
  const material = findMaterial(row.item);
  return material ? [checkRow(row, material.density_g_per_cm3, { relative: 0.0005 })] : [];
};

/** `water:H`; fractions here are rounded to three to six digits and then normalised. */
const massFractionCheck = (row: ReferenceRow): CheckRow[] => {
  const [, name, symbol] = /^(.*):(\w+)$/.exec(row.item) ?? [];
  const material = findMaterial(name ?? row.item);
  const element = elementBySymbol(symbol ?? '');
  if (!material || !element) return [];
  const found = material.massFractions.find(({ z }) => z === element.z)?.massFraction ?? 0;
  return [checkRow(row, found, { absolute: row.tolerance.includes('0.001') ? 0.001 : 0.0005 })];
};

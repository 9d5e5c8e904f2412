import { absorptionEdges, elementBySymbol, massAttenuation } from '../../materials/index.js';
import { type CheckRow, checkRow } from './check-row.js';
import { materialOf } from './material-of.js';
import { type ReferenceRow, referenceRows } from './reference-rows.js';

/** K edges, and the jump of iodine's attenuation at its own. */
export const edgeChecks = (): CheckRow[] =>
  referenceRows('edges').flatMap((row) =>
    row.set === 'K edge' ? [kEdgeCheck(row)] : jumpChecks(row),
  );

/** The attenuation table's edge lies within 10 eV of the measured one. */
const kEdgeCheck = (row: ReferenceRow): CheckRow => {
  const symbol = row.item.split(' ')[0];
  const edge_keV = kEdge_keV(elementBySymbol(symbol)?.name ?? symbol);
  return checkRow(row, edge_keV, { absolute: 0.01 });
};

/** `6.553 -> 35.82`: below and above. */
const jumpChecks = (row: ReferenceRow): CheckRow[] => {
  const edge_keV = kEdge_keV('iodine');
  const [below, above] = row.value.split('->').map((text) => text.trim());
  return [
    { expected: below, energy_keV: edge_keV * (1 - 1e-9), side: 'below' },
    { expected: above, energy_keV: edge_keV, side: 'above' },
  ].map(({ expected, energy_keV, side }) =>
    checkRow(
      { ...row, item: `mu/rho of iodine just ${side} its K edge` },
      massAttenuation(materialOf('iodine'), energy_keV),
      { relative: 0.01 },
      expected,
    ),
  );
};

const kEdge_keV = (name: string): number =>
  absorptionEdges(materialOf(name), 1, 150).find(({ shell }) => shell === 'K')?.energy_keV ??
  Number.NaN;

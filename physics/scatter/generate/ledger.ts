import { fieldAxes } from '../field-axes.js';
import type { Effort } from './water-pencil.js';

/** What the ledger says of one run of the generator. */
export interface TableRun {
  readonly sha256: string;
  readonly elementTableSha256: string;
  readonly bytes: number;
  readonly seed: number;
  readonly photons: number;
  readonly effort: Effort;
}

/** The ledger of physics/scatter/tables, line by line. */
export function ledger(run: TableRun): string[] {
  const { energies_keV, thicknesses_cm, gaps_cm, halfSides_cm } = fieldAxes;
  return [
    '# Ledger of the scatter tables',
    '',
    'Written by `npm run scatter-table` (some minutes of one core). Unchanged inputs leave this folder unchanged.',
    '',
    '## field-table.ts',
    '',
    'Share of multiple scatter, and of backscatter, that a square field keeps of an infinite one.',
    '',
    `SHA-256 of the packed text (${run.bytes} bytes): \`${run.sha256}\``,
    '',
    '- Source: computed here by photon transport (physics/transport): water slabs, parallel beam, ideal',
    '  energy-integrating detector, no fluorescence, vacuum around. A pencil beam and its exit',
    '  displacements give every field and gap of one slab.',
    '- Input: cross sections of materials/tables/elements.ts,',
    `  SHA-256 \`${run.elementTableSha256}\``,
    `- Seed ${run.seed}; ${Math.round(run.photons / 1e6)} million photons: per slab until ${run.effort.enough} multiply scattered photons`,
    `  came through, ${run.effort.most / 1e6} million at most.`,
    '- Provenance: computed.',
    `- Energies, keV: ${energies_keV.join(', ')}.`,
    `- Thicknesses, cm: ${thicknesses_cm.join(', ')}. Beyond 10.5 mean free paths the next thinner slab stands.`,
    `- Gaps, cm: ${gaps_cm.join(', ')}.`,
    `- Half sides of the field, cm: ${halfSides_cm.join(', ')}.`,
    '- Values: multiple scatter in the field over that in an infinite field, divided by the same ratio of',
    '  first-order Compton scatter, which varies far more; of energy, then of air kerma (every second',
    '  energy and thickness, and the last); four digits. Backscattered air kerma in the field over that',
    '  in an infinite field, at the thickest slab up to 20 cm.',
    '- Interpolation: logarithm of the value, linear in ln E, ln t, ln(gap + 4 cm), ln a; end values held.',
    '- Uncertainty: 1 to 2 % (one standard error) where a field catches a tenth of the infinite one.',
  ];
}

import { inGroup } from './quantity.js';

/** Scatter at the detector and what the grid does to it. */
export const scatterQuantities = inGroup('scatter and grid', [
  {
    id: 'spr',
    name: 'Scatter to primary',
    unit: '',
    of: (e) => e.scatter.spr,
    words:
      'Detector signal from scattered photons over that from primary ones at the field centre, no grid.',
  },
  {
    id: 'sprBehindGrid',
    name: 'Scatter to primary, behind grid',
    unit: '',
    of: (e) => e.scatter.sprBehindGrid,
    words:
      'Detector signal from scattered photons over that from primary ones at the field centre, behind the grid; without a grid in the beam, as without grid.',
  },
  {
    id: 'buckyFactor',
    name: 'Bucky factor',
    unit: '',
    of: (e) => e.grid?.buckyFactor ?? null,
    words: 'One over the grid’s total transmission in this beam behind this stack.',
  },
  {
    id: 'selectivity',
    name: 'Grid selectivity',
    unit: '',
    of: (e) => e.grid?.selectivity ?? null,
    words: 'Transmission of primary over transmission of scatter.',
  },
  {
    id: 'snrImprovement',
    name: 'SNR improvement factor',
    unit: '',
    of: (e) => e.grid?.snrImprovement ?? null,
    words:
      'Primary transmission over the square root of total transmission; below 1 the grid costs more than it gives.',
  },
]);

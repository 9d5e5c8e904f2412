import { inGroup } from './quantity.js';

/** What the detail shows, before noise. */
export const detailQuantities = inGroup('detail', [
  {
    id: 'subjectContrast',
    name: 'Subject contrast',
    unit: '',
    of: (e) => e.contrast.subject,
    words:
      'Detected primary signal without the detail less with it, over without, at its centre; negative when the detail is more transparent.',
  },
  {
    id: 'detectedContrast',
    name: 'Detected contrast',
    unit: '',
    of: (e) => e.contrast.detected,
    words:
      'Subject contrast times the contrast degradation factor times one less the glare fraction.',
  },
  {
    id: 'contrastDegradation',
    name: 'Contrast degradation factor',
    unit: '',
    of: (e) => e.contrast.degradationFactor,
    words: 'One over one plus the scatter-to-primary ratio behind the grid; glare is not in it.',
  },
  {
    id: 'iodineEquivalent',
    name: 'Iodine equivalent',
    unit: 'mg/cm²',
    of: (e) => e.contrast.iodineEquivalent_mg_per_cm2,
    words:
      'Areal density of iodine that gives the same subject contrast in this beam behind this stack.',
  },
]);

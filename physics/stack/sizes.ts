import { kept } from '../../materials/kept.js';
import type { Case, Size } from '../case/schema.js';
import { drawnThickness_mm } from './grow-layers.js';

/** The one size of a patient without a mix; kept, since results are remembered by the size itself. */
const asDrawn = new WeakMap<Case['patient']['layers'], readonly Size[]>();

/**
 * The size mix of a case. Without sizes there is one, the layers as drawn.
 *
 * @throws Error when the sizes are still the name of a file: the parser reads it before this.
 */
export const sizesOf = (patient: Case['patient']): readonly Size[] => {
  const { sizes, layers } = patient;
  if ('file' in sizes) {
    throw new Error(`patient.sizes: ${sizes.file}: the file has not been read; parse it first`);
  }
  return sizes.length > 0
    ? sizes
    : kept(asDrawn, layers, () => [
        { name: 'as drawn', thickness_mm: drawnThickness_mm(layers), weight: 1 },
      ]);
};

import type { Detail } from '../../physics/case/index.js';

/**
 * The detail by shape and size, `vessel, 3 mm × 10 mm`: a vessel's diameter and length, else the
 * thickness along the beam (per wall of a coat) and the two sides of the area.
 */
export const detailWords = ({ shape, size_mm, length_mm, width_mm, walls }: Detail): string => {
  const place = shape === 'coat' ? ` on ${walls === 1 ? 'one wall' : 'two walls'}` : '';
  const sides_mm = shape === 'vessel' ? [length_mm] : [length_mm, width_mm ?? length_mm];
  return `${shape}${place}, ${[size_mm, ...sides_mm].map((side) => `${side} mm`).join(' × ')}`;
};

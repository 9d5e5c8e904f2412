import { z } from 'zod';
import { defaults } from '../defaults.js';

/** Values that many parts of a case hold. */

type Writable<T> = T extends object ? { -readonly [K in keyof T]: Writable<T[K]> } : T;

/** The defaults, typed so that zod takes their lists. */
export const d = defaults as Writable<typeof defaults>;

/** Text that prints as it reads: no control characters, no marks that reverse its direction. */
const printable = /^(?!\s*$)[^\p{Cc}\u2028-\u202e\u2066-\u2069]+$/u;
export const name = z.string().min(1).max(200).regex(printable);
export const materialName = name;
export const fileName = z.string().min(1).max(200).regex(printable);
export const remark = z.string().max(2000);
export const positive = z.number().positive().max(1e6);
export const nonNegative = z.number().min(0).max(1e6);
export const fraction = z.number().min(0).max(1);
/** The tube model's range (see physics/beam). */
export const potential_kV = z.number().min(20).max(150);
/** From the tube model's lowest energy to the end of the attenuation tables. */
export const energy_keV = z.number().min(5).max(20000);
export const range = z.strictObject({
  min: nonNegative.describe('Least value.'),
  max: positive.describe('Greatest value.'),
});

export const slab = z.strictObject({
  material: materialName.describe("Built-in material, element or one of the case's materials."),
  thickness_mm: z.number().min(0).max(1000).describe('Thickness along the beam, mm.'),
});

import type { MaterialLayer } from '../../physics/beam/index.js';
import { materialNamed } from './material-named.js';
import { numberIn } from './option-number.js';
import { refuse } from './refusal.js';

const millimetres: Readonly<Record<string, number>> = {
  um: 1e-3,
  µm: 1e-3,
  μm: 1e-3,
  mm: 1,
  cm: 10,
  m: 1000,
};

// NAME [DENSITY g/cm3] THICKNESS UNIT
const written = /^(.+?)(?:\s+([\d.,]+)\s*g\/cm[3³])?\s+(\S+?)\s*(um|µm|μm|mm|cm|m)$/;

/** `aluminium 2.5 mm` (or `CsI 4.51 g/cm3 0.2 mm`) as a layer of the beam path. */
export const throughLayer = (text: string): MaterialLayer => {
  const [, name, density, amount, unit] = written.exec(text.trim()) ?? [];
  const thickness = amount === undefined ? null : numberIn(amount.replace(',', '.'));
  if (name === undefined || thickness === null) {
    refuse(
      '--through',
      JSON.stringify(text),
      'must be a material and a thickness with its unit',
      'write it as "aluminium 2.5 mm"',
    );
  }
  const thickness_mm = thickness * millimetres[unit];
  if (thickness_mm < 0 || thickness_mm > 1e5) {
    refuse(
      '--through',
      JSON.stringify(text),
      'must be 0 to 100000 mm thick',
      "enter the slab's thickness",
    );
  }
  const density_g_per_cm3 = density === undefined ? undefined : numberIn(density.replace(',', '.'));
  const material = materialNamed('--through', name, density_g_per_cm3 ?? undefined, densityRemedy);
  return { material, thickness_mm };
};

const densityRemedy = 'write it as "CsI 4.51 g/cm3 0.2 mm"';

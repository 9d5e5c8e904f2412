import { makeMaterial } from './composition.js';
import { elements } from './elements.js';
import { kept } from './kept.js';
import type { Material, MaterialFamily } from './material.js';
import { compound, materialFromFractions } from './mixture.js';
import { compositionSources, compositions } from './tables/compositions.js';

/** Detector, plastic and support materials given by formula: name, formula, density, source. */
const formulas: readonly (readonly [string, string, number, MaterialFamily, string])[] = [
  ['polyethylene', 'C2H4', 0.93, 'plastic', 'density: NISTIR 5632, recalled'],
  ['polystyrene', 'C8H8', 1.06, 'plastic', 'density: NISTIR 5632, recalled'],
  ['polycarbonate', 'C16H14O3', 1.2, 'plastic', 'density: NIST STAR, recalled'],
  ['cellulose', 'C6H10O5', 1.5, 'plastic', 'density: common handbook value, recalled'],
  [
    'cotton fibre',
    'C6H10O5',
    0.7,
    'plastic',
    'cellulose, assumed packed to 0.7 g/cm³ as a grid interspace',
  ],
  ['hydroxyapatite', 'Ca10(PO4)6(OH)2', 3.16, 'bone', 'density: common handbook value, recalled'],
  ['barium sulfate', 'BaSO4', 4.5, 'agent', 'density: NISTIR 5632, recalled'],
  ['calcium tungstate', 'CaWO4', 6.06, 'detector', 'density: NIST STAR, recalled'],
  ['sodium iodide', 'NaI', 3.667, 'detector', 'density: NIST STAR, recalled'],
  ['amorphous selenium', 'Se', 4.27, 'detector', 'density: common detector value, recalled'],
  ['carbon fibre', 'C', 1.6, 'plastic', 'carbon at 1.6 g/cm³, assumed for carbon-fibre laminate'],
  ['carbon dioxide', 'CO2', 0.00184, 'gas', 'ideal gas at 20 °C and 101.325 kPa'],
];

const otherSpellings: Readonly<Record<string, string>> = {
  aluminum: 'aluminium',
  cesium: 'caesium',
  sulphur: 'sulfur',
  'cesium iodide': 'caesium iodide',
  'carbon fiber': 'carbon fibre',
  'cotton fiber': 'cotton fibre',
  csi: 'caesium iodide',
  gos: 'gadolinium oxysulfide',
};

/** Makers of every named material; each is made once, when first asked for, and kept. */
const makers = new Map<string, () => Material>([
  ...elements.map((element): [string, () => Material] => [
    element.name,
    () =>
      makeMaterial({
        name: element.name,
        density_g_per_cm3: element.density_g_per_cm3,
        massByZ: new Map([[element.z, 1]]),
        source: 'element; density: NISTIR 5632, Table 1',
        provenance: 'recalled',
      }),
  ]),
  ...formulas.map(([name, formula, density, family, source]): [string, () => Material] => [
    name,
    () =>
      Object.freeze({
        ...compound(formula, density, name, family),
        source: `formula ${formula}; ${source}`,
        provenance: source.includes('assumed') ? ('assumed' as const) : ('recalled' as const),
      }),
  ]),
  ...compositions.map(({ name, from, ...rest }): [string, () => Material] => [
    name,
    () => materialFromFractions({ name, ...rest, ...compositionSources[from] }),
  ]),
]);

const made = new Map<string, Material>();
const keyOf = new Map([...makers.keys()].map((name) => [name.toLowerCase(), name]));

/** Every name `namedMaterial` knows: tissues and materials first, then the elements. */
export const materialNames: readonly string[] = [...makers.keys()].sort(
  (a, b) => Number(isElement(a)) - Number(isElement(b)),
);

/**
 * The material of a name (capitals do not matter; 'aluminum' and 'cesium' are understood), or
 * undefined. The same object every time, so that coefficients are computed once.
 */
export function namedMaterial(name: string): Material | undefined {
  const written = name.trim().toLowerCase();
  const key = keyOf.get(otherSpellings[written] ?? written);
  const make = key === undefined ? undefined : makers.get(key);
  return key === undefined || !make ? undefined : kept(made, key, make);
}

function isElement(name: string): boolean {
  return elements.some((element) => element.name === name);
}

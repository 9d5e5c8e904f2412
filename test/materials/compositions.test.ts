/**
 * Compositions and densities of the named materials against test/reference/compositions.csv (ICRU 44,
 * ICRU 46, ICRP 110, ICRP 23 by NIST STAR). Published fractions are rounded and need not sum to 1;
 * ours are normalised, so 0.001 is allowed as the file says (0.0005 where it says exact).
 */
import { describe, expect, test } from 'vitest';
import { elementBySymbol, materialNames, namedMaterial } from '../../materials/index.js';
import { readReference } from '../reference/read-reference.js';
import { known } from './element-material.js';

/** Named materials that stand for each item of the file. */
const nameOf: Readonly<Record<string, string>> = {
  water: 'water',
  air: 'air',
  pmma: 'pmma',
  bone_cortical_icru44: 'cortical bone',
  cortical_bone_icru46: 'cortical bone',
  tissue_soft_icru44: 'soft tissue',
  muscle_skeletal_icru44: 'muscle',
  adipose_icru44: 'adipose',
  blood_whole_icru44: 'blood',
  lung_icru44: 'lung deflated',
  lung_inflated: 'lung',
  breast_icru44: 'breast',
  brain_icru44: 'brain',
  cesium_iodide: 'caesium iodide',
  gadolinium_oxysulfide: 'gadolinium oxysulfide',
  cadmium_telluride: 'cadmium telluride',
  soft_tissue_avg_male_icru46: 'soft tissue ICRU 46',
  liver_icru46: 'liver',
  skin_icru46: 'skin',
  kidney_icru46: 'kidney',
  spongiosa_icru46: 'spongiosa',
  mineral_bone_icrp110: 'mineral bone ICRP 110',
  'NIST-STAR Adipose Tissue (ICRP)': 'adipose ICRP',
  'NIST-STAR Blood (ICRP)': 'blood ICRP',
  'NIST-STAR Bone, Compact (ICRU)': 'compact bone ICRU',
  'NIST-STAR Bone, Cortical (ICRP)': 'cortical bone ICRP',
  'NIST-STAR Brain (ICRP)': 'brain ICRP',
  'NIST-STAR Lung (ICRP)': 'lung ICRP',
  'NIST-STAR Muscle, Skeletal': 'muscle ICRP',
  'NIST-STAR Muscle, Striated': 'muscle ICRU striated',
  'NIST-STAR Skin (ICRP)': 'skin ICRP',
  'NIST-STAR Tissue, Soft (ICRP)': 'soft tissue ICRP',
  'NIST-STAR Tissue, Soft (ICRU four-component)': 'soft tissue ICRU four-component',
  'NIST-STAR Polymethyl Methacralate (Lucite, Perspex)': 'pmma',
  'NIST-STAR Water, Liquid': 'water',
  'NIST-STAR Air, Dry (near sea level)': 'air',
};

const rows = readReference('compositions.csv');

const fractions = rows
  .filter(({ set }) => set === 'composition')
  .map(({ item, value, tolerance }) => {
    const [material, symbol] = item.split(':');
    return {
      material,
      symbol,
      expected: Number(value),
      allowed: tolerance.includes('001') ? 0.001 : 0.0005,
    };
  });

test.each(fractions)(
  '$material holds $expected $symbol',
  ({ material, symbol, expected, allowed }) => {
    const z = elementBySymbol(symbol)?.z;
    const share = known(nameOf[material]).massFractions.find((part) => part.z === z)?.massFraction;
    expect(Math.abs((share ?? 0) - expected)).toBeLessThanOrEqual(allowed);
  },
);

const densities = rows
  .filter(({ set }) => set === 'density')
  .map(({ item, value }) => ({ material: item, expected: Number(value) }));

test.each(densities)('$material has $expected g/cm³', ({ material, expected }) => {
  expect(known(nameOf[material]).density_g_per_cm3).toBeCloseTo(expected, 6);
});

describe('named materials', () => {
  test('are found whatever their capitals and in either spelling, always as the same object', () => {
    expect(namedMaterial('Soft Tissue')).toBe(known('soft tissue'));
    expect(namedMaterial('aluminum')).toBe(known('aluminium'));
    expect(namedMaterial('cesium iodide')).toBe(known('caesium iodide'));
    expect(namedMaterial('soft tissue icru 46')).toBe(known('soft tissue ICRU 46'));
  });

  test('are undefined for a name nobody knows', () => {
    expect(namedMaterial('unobtainium')).toBeUndefined();
    expect(namedMaterial('toString')).toBeUndefined();
  });

  test.each(materialNames)('%s is frozen, sums to 1, ascends in Z and names its source', (name) => {
    const { massFractions, source, provenance, density_g_per_cm3 } = known(name);
    const sum = massFractions.reduce((total, { massFraction }) => total + massFraction, 0);
    expect(sum).toBeCloseTo(1, 12);
    const order = massFractions.map(({ z }) => z);
    expect(order).toEqual([...order].sort((a, b) => a - b));
    expect(Object.isFrozen(known(name)) && Object.isFrozen(massFractions)).toBe(true);
    expect(source.length).toBeGreaterThan(3);
    expect(['published', 'recalled', 'assumed']).toContain(provenance);
    expect(density_g_per_cm3).toBeGreaterThan(0);
  });
});

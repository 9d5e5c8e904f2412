/** Agents in their carriers against test/reference/agents.csv (tolerances of the file) and chemistry. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type AmountUnit, agent, agentMixture, agentNames } from '../../materials/index.js';
import { readReference } from '../reference/read-reference.js';
import { known } from './element-material.js';

const blood = known('blood');
const water = known('water');
const units: readonly AmountUnit[] = ['mg element/mL', 'mg compound/mL', 'mmol/mL', '% w/v'];

function mixed(name: string, value: number, unit: AmountUnit, carrier = water) {
  return agentMixture({ agent: name, amount: { value, unit }, carrier });
}
function reference(item: string): string {
  const row = readReference('agents.csv').find((candidate) => candidate.item === item);
  if (!row) throw new Error(`${item}: no such row`);
  return row.value;
}
function agentOf(name: string) {
  const found = agent(name);
  if (!found) throw new Error(`${name}: no such agent`);
  return found;
}

describe('published facts', () => {
  test('the iodinated molecule is 0.4636 iodine by mass, M 821.14 (chemistry)', () => {
    expect(agentOf('iodine').elementMassFraction).toBeCloseTo(
      Number(reference('iodine mass fraction of iohexol C19H26I3N3O9')),
      4,
    );
    expect(agentOf('iodine').molarMass_g_per_mol).toBeCloseTo(821.14, 1);
  });

  test('solutions of 240, 300 and 350 mg I/mL have the published densities within 5 % (recalled)', () => {
    const densities = reference('density of iohexol-type solution at 240/300/350 mg I/mL').split(
      '/',
    );
    [240, 300, 350].forEach((concentration, i) => {
      const { material } = mixed('iodine', concentration, 'mg element/mL');
      expect(Math.abs(material.density_g_per_cm3 / Number(densities[i]) - 1)).toBeLessThan(0.05);
    });
  });

  test.each([
    [60, 1.467],
    [100, 1.778],
    [250, 2.94],
  ])('barium sulfate of %d %% w/v has %d g/mL (volumes add)', (value, density) => {
    const { material } = mixed('barium sulfate', value, '% w/v');
    expect(material.density_g_per_cm3).toBeCloseTo(density, 2);
  });

  test('barium sulfate is 0.5884 barium', () => {
    expect(agentOf('barium sulfate').elementMassFraction).toBeCloseTo(0.5884, 4);
  });

  test('gadolinium of 0.5 mol/L is 78.6 mg Gd/mL at 1.19 to 1.20 g/mL (recalled)', () => {
    const { material, elementConcentration_mg_per_mL } = mixed(
      'gadolinium chelate',
      0.5,
      'mmol/mL',
    );
    expect(elementConcentration_mg_per_mL).toBeCloseTo(78.6, 1);
    expect(material.density_g_per_cm3).toBeGreaterThan(1.19);
    expect(material.density_g_per_cm3).toBeLessThan(1.2);
  });

  test('carbon dioxide takes the whole volume at 1.84 mg/cm³ whatever is asked', () => {
    for (const carrier of [water, blood]) {
      const { material } = mixed('carbon dioxide', 7, 'mg element/mL', carrier);
      expect(material.density_g_per_cm3).toBeCloseTo(0.00184, 8);
      expect(material.massFractions.map(({ z }) => z)).toEqual([6, 8]);
      expect(material.family).toBe('gas');
    }
  });
});

describe('every agent', () => {
  test('is found by name, the organic iodinated molecule first', () => {
    expect(agentNames[0]).toBe('iodine');
    expect(agentNames).toEqual(
      expect.arrayContaining([
        'elemental iodine',
        'barium sulfate',
        'gadolinium chelate',
        'carbon dioxide',
        'tantalum',
        'ytterbium',
        'gold',
        'bismuth',
        'tungsten',
      ]),
    );
    expect(agent('Iodine')).toBe(agent('iodine'));
    expect(agent('snake oil')).toBeUndefined();
  });

  test.each(agentNames)(
    '%s is investigational unless iodine, barium, gadolinium or CO2',
    (name) => {
      const settled = [
        'iodine',
        'elemental iodine',
        'barium sulfate',
        'gadolinium chelate',
        'carbon dioxide',
      ];
      expect(agentOf(name).investigational).toBe(!settled.includes(name));
    },
  );

  test.each(agentNames)(
    '%s has a default carrier among the named materials and a source',
    (name) => {
      expect(known(agentOf(name).defaultCarrier)).toBeDefined();
      expect(agentOf(name).source).not.toBe('');
    },
  );
});

const soluble = fc.constantFrom(...agentNames.filter((name) => name !== 'carbon dioxide'));
const amounts = fc.double({ min: 0.01, max: 250, noNaN: true });

describe('an agent mixture', () => {
  test('conserves volume and mass', () => {
    fc.assert(
      fc.property(soluble, amounts, (name, value) => {
        const { material, soluteVolumeFraction } = mixed(name, value, 'mg compound/mL', blood);
        const carrier_g = (1 - soluteVolumeFraction) * blood.density_g_per_cm3;
        expect(material.density_g_per_cm3).toBeCloseTo(carrier_g + value / 1000, 12);
        expect(soluteVolumeFraction).toBeCloseTo(
          (value / 1000) * agentOf(name).specificVolume_mL_per_g,
          12,
        );
      }),
    );
  });

  test('holds the concentration of the element it states', () => {
    fc.assert(
      fc.property(soluble, amounts, (name, value) => {
        // Water holds none of the attenuating elements, so all of it is the agent's.
        const { material, z, elementConcentration_mg_per_mL } = mixed(name, value, 'mg element/mL');
        const share = material.massFractions.find((part) => part.z === z)?.massFraction ?? 0;
        expect(1000 * share * material.density_g_per_cm3).toBeCloseTo(value, 8);
        expect(elementConcentration_mg_per_mL).toBeCloseTo(value, 8);
      }),
    );
  });

  test('is the same in all four units', () => {
    fc.assert(
      fc.property(soluble, amounts, (name, compound_mg_per_mL) => {
        const { elementMassFraction, molarMass_g_per_mol } = agentOf(name);
        const values: Record<AmountUnit, number> = {
          'mg element/mL': compound_mg_per_mL * elementMassFraction,
          'mg compound/mL': compound_mg_per_mL,
          'mmol/mL': compound_mg_per_mL / molarMass_g_per_mol,
          '% w/v': compound_mg_per_mL / 10,
        };
        const [first, ...others] = units.map((unit) => mixed(name, values[unit], unit));
        for (const other of others) {
          expect(other.material.density_g_per_cm3).toBeCloseTo(
            first.material.density_g_per_cm3,
            12,
          );
          expect(other.elementConcentration_mg_per_mL).toBeCloseTo(
            first.elementConcentration_mg_per_mL,
            9,
          );
        }
      }),
    );
  });

  test('of nothing is its carrier', () => {
    const { material } = mixed('iodine', 0, 'mg element/mL', blood);
    expect(material.density_g_per_cm3).toBeCloseTo(blood.density_g_per_cm3, 12);
    expect(material.massFractions).toEqual(blood.massFractions);
  });

  test('of more than fills the volume is refused with value, rule and remedy', () => {
    expect(() => mixed('iodine', 3000, 'mg element/mL')).toThrow(
      'iodine: 3000 mg element/mL: the solute alone would fill 298 % of the volume, must be at most 100 %; enter at most 1.01e+3 mg element/mL',
    );
    expect(() => mixed('barium sulfate', 451, '% w/v')).toThrow(/enter at most 450 % w\/v/);
    expect(mixed('barium sulfate', 450, '% w/v').material.density_g_per_cm3).toBeCloseTo(4.5, 9);
  });

  test.each([-1, Number.NaN, Number.POSITIVE_INFINITY])('of %s is refused', (value) => {
    expect(() => mixed('iodine', value, 'mg element/mL')).toThrow(/must be 0 or positive/);
  });

  test('of an unknown agent or in an unknown unit is refused with the choice', () => {
    expect(() => mixed('snake oil', 1, 'mg element/mL')).toThrow(/choose one of iodine, /);
    expect(() => mixed('iodine', 1, 'drops' as AmountUnit)).toThrow(/use mg element\/mL/);
  });
});

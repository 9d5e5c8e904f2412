import { elementBySymbol, materialNames, namedMaterial } from '../../../materials/index.js';
import { type Fault, faultAt } from '../fault.js';
import { formulaFractions } from '../formulas.js';
import type { Path } from '../printed.js';
import type { Case, UserMaterial } from '../schema.js';
import { unknownNameFaults } from './known-name.js';
import { uniqueNameFaults } from './unique-names.js';

/** How far entered mass fractions may sum from 1: published compositions are rounded. */
const sumTolerance = 0.02;

const isBuiltIn = (name: string): boolean =>
  namedMaterial(name) !== undefined || elementBySymbol(name) !== undefined;

/** The case's own materials: real elements, shares that sum to 1, names of their own. */
export const materialFaults = ({ materials }: Pick<Case, 'materials'>): Fault[] => [
  ...uniqueNameFaults(['materials'], materials),
  ...materials.flatMap((material, index) => compositionFaults(material, ['materials', index])),
];

const compositionFaults = (material: UserMaterial, path: Path): Fault[] => {
  const { name, massFractions } = material;
  const faults: Fault[] = [];
  if (isBuiltIn(name)) {
    const rule = 'must not be the name of a built-in material';
    faults.push(faultAt([...path, 'name'], name, rule, 'choose a name of your own'));
  }
  const at = [...path, 'massFractions'];
  for (const [symbol, share] of Object.entries(massFractions)) {
    if (elementBySymbol(symbol) === undefined) {
      const rule = 'must be named by an element symbol, H to U';
      faults.push(
        faultAt([...at, symbol], share, rule, 'write the symbol with its usual capitals'),
      );
    }
  }
  if (material.formula !== null && Object.keys(massFractions).length === 0) {
    const read = formulaFractions(material.formula);
    const isRefused = 'rule' in read;
    return isRefused
      ? [...faults, faultAt([...path, 'formula'], material.formula, read.rule, read.remedy)]
      : faults;
  }
  const sum = Object.values(massFractions).reduce((total, share) => total + share, 0);
  if (Math.abs(sum - 1) > sumTolerance) {
    const rule = `must sum to 1 within ${sumTolerance}`;
    faults.push(
      faultAt(at, Number(sum.toPrecision(4)), rule, "enter each element's share of the mass"),
    );
  }
  return faults;
};

/** A material named anywhere in the case must be built in, an element, or among `materials`. */
export const unknownMaterialFaults = (
  path: Path,
  name: string,
  { materials }: Pick<Case, 'materials'>,
  alsoAllowed: readonly string[] = [],
): Fault[] => {
  if (alsoAllowed.includes(name) || isBuiltIn(name)) return [];
  const known = [...alsoAllowed, ...materials.map((material) => material.name)];
  if (known.includes(name)) return [];
  return unknownNameFaults(path, name, [...known, ...materialNames], 'a known material').map(
    (fault) =>
      fault.remedy.startsWith('did you mean')
        ? fault
        : { ...fault, remedy: 'name a built-in material or element, or enter it under materials' },
  );
};

import { type Fault, faultAt } from '../fault.js';
import { nearestKey } from '../nearest-key.js';
import { type Path, printedValue } from '../printed.js';

/** A name must be one of those known; the remedy is the nearest of them, else the choice. */
export const unknownNameFaults = (
  path: Path,
  name: string,
  known: readonly string[],
  what: string,
): Fault[] => {
  if (known.includes(name)) return [];
  const near = nearestKey(name, known);
  const some = known.slice(0, 6).map(printedValue).join(', ');
  const choice =
    known.length === 0 ? 'there is none yet' : `choose ${some}${known.length > 6 ? ' …' : ''}`;
  const remedy = near === undefined ? choice : `did you mean ${printedValue(near)}?`;
  return [faultAt(path, name, `must be ${what}`, remedy)];
};

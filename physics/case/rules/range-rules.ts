import { type Fault, faultAt } from '../fault.js';
import type { Path } from '../printed.js';

/** The lower end of a range must lie below the upper. */
export const rangeFaults = (
  path: Path,
  { min, max }: { readonly min: number; readonly max: number },
): Fault[] =>
  min < max
    ? []
    : [faultAt([...path, 'min'], min, `must be below max, ${max}`, 'enter the lower end as min')];

/** Values that must rise from row to row; the first that does not is named. */
export const ascendingFaults = (
  values: readonly number[],
  pathOf: (index: number) => Path,
  remedy: string,
): Fault[] => {
  const index = values.findIndex((value, i) => i > 0 && !(value > values[i - 1]));
  return index < 0
    ? []
    : [
        faultAt(
          pathOf(index),
          values[index],
          `must be above the one before, ${values[index - 1]}`,
          remedy,
        ),
      ];
};

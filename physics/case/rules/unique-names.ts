import { type Fault, faultAt } from '../fault.js';
import type { Path } from '../printed.js';

/** Names within one list must differ, since techniques, sizes and layers are told apart by them. */
export const uniqueNameFaults = (
  path: Path,
  named: readonly { readonly name: string }[],
): Fault[] =>
  named.flatMap(({ name }, index) =>
    named.findIndex((other) => other.name === name) === index
      ? []
      : [
          faultAt(
            [...path, index, 'name'],
            name,
            'must be unique in its list',
            'choose another name',
          ),
        ],
  );

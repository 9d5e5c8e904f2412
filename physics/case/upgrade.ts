import { type Fault, faultAt } from './fault.js';
import { valueAt } from './printed.js';

/** The version of the case format that this Stratabeam writes. */
export const currentVersion = 1;

/**
 * Steps that bring an old case up by one version, by the version they start from. Empty until there
 * is a version 2.
 */
const upgrades: Readonly<Record<number, (input: unknown) => unknown>> = {};

/** A case of any version known brought up to the current one; a newer one is refused. */
export const upgraded = (
  input: unknown,
  steps: typeof upgrades = upgrades,
  latest = currentVersion,
): { readonly input: unknown } | { readonly fault: Fault } => {
  const version = valueAt(input, ['version']);
  if (typeof version !== 'number' || !Number.isInteger(version)) return { input };
  if (version > latest) {
    const rule = `must be at most ${latest}`;
    return {
      fault: faultAt(
        ['version'],
        version,
        rule,
        'open it with the Stratabeam that wrote it, or a newer one',
      ),
    };
  }
  const step = steps[version];
  return version < latest && step ? upgraded(step(input), steps, latest) : { input };
};

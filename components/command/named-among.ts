import { nearestKey } from '../../physics/case/index.js';
import { refuse } from './refusal.js';

/**
 * Names with commas between them, each one of those known; `all` is all of them. A known name may
 * hold commas itself.
 */
export const namedAmong = (
  option: string,
  text: string,
  known: readonly string[],
  most = known.length,
): string[] => {
  if (text.trim() === 'all' && !known.includes('all')) return [...known];
  const names = known.includes(text.trim())
    ? [text.trim()]
    : text.split(',').map((name) => name.trim());
  for (const name of names) {
    if (known.includes(name)) continue;
    const near = nearestKey(name, known);
    const remedy = near ? `did you mean "${near}"?` : `name ${known.join(', ')}`;
    refuse(option, JSON.stringify(name), `must be one of ${known.join(', ')}`, remedy);
  }
  if (names.length > most) {
    refuse(
      option,
      JSON.stringify(text),
      `must be ${most === 1 ? 'one name' : `${most} names`}`,
      'name fewer',
    );
  }
  return known.filter((name) => names.includes(name));
};

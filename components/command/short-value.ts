const longest = 90;

/** A value of a case on one line: `{ min: 40, max: 125 }`, texts in quotes; cut where it is long. */
export const shortValue = (value: unknown): string => {
  const whole = written(value);
  return whole.length > longest ? `${whole.slice(0, longest - 1)}…` : whole;
};

const written = (value: unknown): string => {
  if (Array.isArray(value)) return `[${value.map(written).join(', ')}]`;
  if (value === null || typeof value !== 'object') return JSON.stringify(value);
  const pairs = Object.entries(value).map(([key, item]) => `${key}: ${written(item)}`);
  return pairs.length === 0 ? '{}' : `{ ${pairs.join(', ')} }`;
};

/** True for what a case writes where there is none: null, an empty list, object or text. */
export const isNone = (value: unknown): boolean =>
  value === null ||
  value === '' ||
  (typeof value === 'object' && Object.keys(value as object).length === 0);

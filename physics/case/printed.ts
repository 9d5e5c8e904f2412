/** A place in the case: keys and list positions from the top. */
export type Path = readonly (string | number)[];

const longest = 60;
/** Characters a terminal or page could take as an order, or that do not print. */
const unprintable = /[\p{Cc}\u2028-\u202e\u2066-\u2069\ufeff]/gu;

const escaped = (character: string): string =>
  `\\u${character.charCodeAt(0).toString(16).padStart(4, '0')}`;

/** Text for one line of print: nothing unprintable, at most 60 characters. */
export const shortText = (text: string): string => {
  const plain = text.slice(0, 4 * longest).replace(unprintable, escaped);
  return plain.length > longest ? `${plain.slice(0, longest - 1)}…` : plain;
};

/** `room.filters[1].layers`; a key that is no plain word stands in quotes: `room["a b"]`. */
export const printedPath = (path: Path): string =>
  path.length === 0
    ? 'case'
    : path.map((key, position) => printedKey(key, position === 0)).join('');

const printedKey = (key: string | number, first: boolean): string => {
  if (typeof key === 'number') return `[${key}]`;
  if (!/^[A-Za-z_$][\w$-]*$/.test(key)) return `[${shortText(JSON.stringify(key))}]`;
  return first ? shortText(key) : `.${shortText(key)}`;
};

/** A value as it stood, shortened: text in quotes, lists and objects by their outline. */
export const printedValue = (value: unknown): string => {
  if (value === undefined) return 'missing';
  if (typeof value === 'string') return quoted(value);
  if (typeof value === 'bigint') return shortText(String(value));
  if (Array.isArray(value)) return value.length === 0 ? '[]' : `a list of ${value.length}`;
  if (value !== null && typeof value === 'object') return outline(value);
  return shortText(String(value));
};

// The closing quote stays even when the text is cut, so that it is plain where the text ends.
const quoted = (text: string): string => {
  const whole = JSON.stringify(text.slice(0, 4 * longest)).replace(unprintable, escaped);
  return whole.length > longest ? `${whole.slice(0, longest - 2)}…"` : whole;
};

const outline = (value: object): string => {
  const keys = Object.keys(value);
  return keys.length === 0 ? '{}' : shortText(`{ ${keys.slice(0, 4).join(', ')} }`);
};

/** The value at a path, `undefined` where the path leads nowhere. Own keys only. */
export const valueAt = (root: unknown, path: Path): unknown =>
  path.reduce<unknown>(
    (value, key) =>
      value !== null && typeof value === 'object' && Object.hasOwn(value, key)
        ? (value as Record<string | number, unknown>)[key]
        : undefined,
    root,
  );

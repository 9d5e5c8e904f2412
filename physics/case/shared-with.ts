/**
 * The same value as `next`, with every part that equals its counterpart in `previous` being that
 * very object. What is remembered by the identity of a part (stack, detector, grid, scatter) then
 * survives an edit elsewhere in the case. Plain JSON values only.
 */
export const sharedWith = <T>(previous: unknown, next: T): T => {
  if (Object.is(previous, next)) return next;
  if (!isContainer(previous) || !isContainer(next)) return next;
  if (Array.isArray(previous) !== Array.isArray(next)) return next;
  const keys = Object.keys(next);
  const before = previous as Record<string, unknown>;
  const after = next as Record<string, unknown>;
  let isSame = keys.length === Object.keys(previous).length;
  const merged: Record<string, unknown> = Array.isArray(next)
    ? ([] as unknown as Record<string, unknown>)
    : {};
  for (const key of keys) {
    merged[key] = sharedWith(before[key], after[key]);
    isSame &&= Object.is(merged[key], before[key]) && key in before;
  }
  return (isSame ? previous : Object.freeze(merged)) as T;
};

const isContainer = (value: unknown): value is object =>
  typeof value === 'object' && value !== null;

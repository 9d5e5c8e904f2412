/** Freezes a tree of plain data all the way down and returns it. */
export const deepFrozen = <T>(value: T): T => {
  if (value !== null && typeof value === 'object' && !Object.isFrozen(value)) {
    Object.freeze(value);
    for (const item of Object.values(value)) deepFrozen(item);
  }
  return value;
};

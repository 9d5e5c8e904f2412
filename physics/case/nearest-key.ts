/** Units and quantities people leave out, add or swap; compared without them. */
const unitEnding = /_(deg|kV|keV|kW|mA|mAs|ms|s|mm|cm|um|m|percent|fraction|uGy|mGy|Gy|mmAl|kJ).*$/;

const bare = (key: string): string => key.replace(unitEnding, '').toLowerCase();

/** Edits (insert, delete, replace, swap neighbours) that turn one word into the other. */
export const editDistance = (a: string, b: string): number => {
  let before: number[] = [];
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const next = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      const swapped = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1];
      next[j] = Math.min(row[j] + 1, next[j - 1] + 1, row[j - 1] + same);
      if (swapped) next[j] = Math.min(next[j], before[j - 2] + 1);
    }
    before = row;
    row = next;
  }
  return row[b.length];
};

/** The known key most like a mistyped one, or `undefined` when none is near. */
export const nearestKey = (key: string, known: readonly string[]): string | undefined => {
  if (key.length > 100) return undefined;
  const ranked = known
    .map((candidate) => ({ candidate, distance: likeness(key, candidate) }))
    .sort((a, b) => a.distance - b.distance);
  return ranked.length > 0 && ranked[0].distance <= 0.4 ? ranked[0].candidate : undefined;
};

/** 0 for the same word, 1 for nothing in common; a unit ending counts little. */
const likeness = (key: string, candidate: string): number => {
  const a = bare(key);
  const b = bare(candidate);
  if (a.length === 0 || b.length === 0) return 1;
  const contained = a.length >= 3 && b.length >= 3 && (a.includes(b) || b.includes(a));
  const words = editDistance(a, b) / Math.max(a.length, b.length);
  const whole = editDistance(key, candidate) / Math.max(key.length, candidate.length);
  return (contained ? Math.min(words, 0.3) : words) + 0.01 * whole;
};

/** Atomic subshells from the innermost outward; the packed tables number them by this order. */
export const shellNames: readonly string[] = [
  'K',
  ...subshells('L', 3),
  ...subshells('M', 5),
  ...subshells('N', 7),
  ...subshells('O', 9),
  ...subshells('P', 11),
  ...subshells('Q', 3),
];

function subshells(letter: string, count: number): string[] {
  return Array.from({ length: count }, (_, i) => `${letter}${i + 1}`);
}

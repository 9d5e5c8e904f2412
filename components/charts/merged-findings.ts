import type { Finding } from '../../physics/results.js';

/** Findings of one severity that say the same, of whichever techniques and sizes. */
interface Group {
  readonly finding: Finding;
  readonly all: Finding[];
}

/**
 * Findings said once: those that say the same of several techniques or sizes become one, which
 * names them all. The message comes back with the names before it; `technique` and `size` are gone
 * from it. At `here`, the size looked at, no size is named.
 */
export function mergedFindings(findings: readonly Finding[], here = ''): Finding[] {
  const groups = new Map<string, Group>();
  for (const finding of findings) {
    const key = `${finding.severity} ${finding.message}`;
    const group = groups.get(key) ?? { finding, all: [] };
    group.all.push(finding);
    groups.set(key, group);
  }
  return [...groups.values()].map(({ finding, all }) => {
    const { technique: _, size: __, message, ...rest } = finding;
    const whose = whoseWords(all, here);
    return { ...rest, message: whose ? `${whose}: ${message}` : message };
  });
}

/** `Current, Proposed`, or `Proposed, size large` where that is not the size looked at. */
function whoseWords(all: readonly Finding[], here: string): string {
  const techniques = distinct(all.flatMap(({ technique }) => technique ?? []));
  const words = techniques.map((technique) =>
    named(
      technique,
      sizesAway(
        all.filter((finding) => finding.technique === technique),
        here,
      ),
    ),
  );
  // A name may hold a comma of its own: `Proposed, heavier`.
  return words.join(words.some((entry) => entry.includes(',')) ? '; ' : ', ');
}

const named = (technique: string, sizes: readonly string[]): string =>
  sizes.length === 0
    ? technique
    : `${technique}, ${sizes.length > 1 ? 'sizes' : 'size'} ${sizes.join(' and ')}`;

/** The sizes to be named; none where the finding also holds at the size looked at. */
const sizesAway = (own: readonly Finding[], here: string): string[] =>
  own.some(({ size }) => size === undefined || size === here)
    ? []
    : distinct(own.flatMap(({ size }) => size ?? []));

const distinct = (names: readonly string[]): string[] => [...new Set(names)];

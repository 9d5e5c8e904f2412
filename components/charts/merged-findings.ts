import type { Finding } from '../../physics/results.js';

/**
 * Findings said once: those that say the same of several techniques become one that names them all,
 * and repetitions go. `names` are the techniques a sentence may begin with, as `Current: …`.
 */
export function mergedFindings(findings: readonly Finding[], names: readonly string[]): Finding[] {
  const groups = new Map<string, { finding: Finding; said: string; of: string[] }>();
  for (const finding of findings) {
    const name = names.find((candidate) => finding.message.startsWith(`${candidate}: `));
    const said = name === undefined ? finding.message : finding.message.slice(name.length + 2);
    const key = `${finding.severity} ${name === undefined} ${said}`;
    const group = groups.get(key) ?? { finding, said, of: [] };
    if (name !== undefined && !group.of.includes(name)) group.of.push(name);
    groups.set(key, group);
  }
  return [...groups.values()].map(({ finding, said, of }) =>
    of.length > 1 ? { ...finding, message: `${of.join(', ')}: ${said}` } : finding,
  );
}

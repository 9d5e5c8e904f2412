import { caseHash } from './case/hash.js';
import type { ParsedCase } from './case/parse.js';
import type { Size } from './case/schema.js';
import { compare } from './compare.js';
import { evaluate } from './evaluate.js';
import { caseFindings, distinctFindings, findingsOf, techniqueFindings } from './findings.js';
import { type OperatingPoint, operatingPoint } from './operating-point.js';
import { prepare } from './prepare.js';
import type { Comparison, Evaluation, Finding, Weighing } from './results.js';
import { sizesOf } from './stack/sizes.js';
import { version } from './version.js';

/**
 * Weighs a case: every technique at every size, and every Proposed against Current.
 *
 * @param sizes which sizes to weigh; all of the mix unless told otherwise.
 * @returns a frozen answer that clones to a worker. A technique that cannot be computed at a size
 *   is left out of `evaluations` and named in `findings`.
 */
export const weigh = (
  { case: c, assumed }: ParsedCase,
  sizes: readonly Size[] = sizesOf(c.patient),
): Weighing => {
  const evaluations: Evaluation[] = [];
  const comparisons: Comparison[] = [];
  const findings: Finding[] = [
    ...caseFindings(c),
    ...(prepare(c).calibration?.findings ?? []),
    ...c.techniques.flatMap((technique, i) => techniqueFindings(technique, `techniques[${i}]`)),
  ];
  for (const size of sizes) {
    const points = c.techniques.map((technique) => operatingPoint(c, technique, size));
    points.forEach((point, index) => {
      if ('made' in point) evaluations.push(evaluate(c, point, index));
      else findings.push(...findingsOf(point.findings, c.techniques[index].name, size.name));
    });
    const [current, ...proposed] = points;
    if (!('made' in current)) continue;
    const standing = proposed.filter((point): point is OperatingPoint => 'made' in point);
    comparisons.push(...standing.map((point) => compare(c, current, point)));
  }
  return Object.freeze({
    case: { hash: caseHash(c), title: c.title },
    version,
    assumed,
    calibration: prepare(c).calibration,
    evaluations,
    comparisons,
    findings: distinctFindings(findings),
  });
};

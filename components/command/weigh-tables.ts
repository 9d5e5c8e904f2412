import type { Case } from '../../physics/case/index.js';
import { holdConstantWords } from '../../physics/compare.js';
import { findingWords } from '../../physics/findings.js';
import type { Comparison, Finding, Ratios, Weighing } from '../../physics/results.js';
import { assumedText } from './assumed-text.js';
import { calibrationText } from './calibration-text.js';
import { detailWords } from './detail-words.js';
import { shown } from './numbers.js';
import { plainTableText } from './plain-table.js';
import { sizeTables } from './weigh-size-tables.js';

/** A weighing for people: heading, a table for each size, the comparisons, then what must be read. */
export const weighTables = (weighing: Weighing, c: Case): string => {
  const sizes = [...new Set(weighing.evaluations.map(({ size }) => size))];
  return [
    headingText(weighing),
    calibrationText(weighing.calibration, c),
    ...sizes.flatMap((size) => [
      ...sizeTables(
        weighing.evaluations.filter((evaluation) => evaluation.size === size),
        detailWords(c.task.detail),
      ),
      ...weighing.comparisons.filter((comparison) => comparison.size === size).map(comparisonTable),
    ]),
    findingsText(weighing),
    assumedText(weighing.assumed, c, weighing.calibration),
  ]
    .filter((part) => part !== '')
    .join('\n');
};

const headingText = ({ case: stamp, version }: Weighing): string =>
  `${stamp.title || 'Untitled case'}\ncase ${stamp.hash}, Stratabeam ${version}\n`;

const ratioColumns: readonly (readonly [keyof Ratios, string])[] = [
  ['sdnr', 'SdNR'],
  ['incidentAirKerma', 'incident kerma'],
  ['entranceSurfaceAirKerma', 'entrance kerma'],
  ['kermaAreaProduct', 'KAP'],
  ['energyImparted', 'energy imparted'],
  ['tubeLoad', 'tube load'],
  ['power', 'power'],
  ['subjectContrast', 'contrast'],
];

const comparisonTable = ({ size, from, to, rows }: Comparison): string =>
  plainTableText({
    title: `${to} over ${from}, size ${size}`,
    headings: ['condition', ...ratioColumns.map(([, heading]) => heading)],
    rows: rows.map(({ holdConstant, ratio }) => [
      holdConstantWords[holdConstant],
      ...ratioColumns.map(([key]) => shown(ratio[key], 3)),
    ]),
  });

const findingsText = ({ findings, evaluations, comparisons }: Weighing): string => {
  const said = [
    ...findings,
    ...evaluations.flatMap((evaluation) => evaluation.findings),
    ...comparisons.flatMap(({ rows }) => rows.flatMap((row) => row.findings)),
  ];
  const sizes = new Set(evaluations.map(({ size }) => size)).size;
  const lines = alike(said).map((group) => line(group, sizes));
  return lines.length === 0 ? '' : `Findings\n${lines.join('\n')}\n`;
};

/** Findings that say the same of one technique at several sizes, together; limits first. */
const alike = (findings: readonly Finding[]): Finding[][] => {
  const groups = new Map<string, Finding[]>();
  for (const finding of findings) {
    const key = `${finding.technique}|${finding.severity}|${finding.message}`;
    groups.set(key, [...(groups.get(key) ?? []), finding]);
  }
  const rank = ['limit', 'caution', 'note'];
  return [...groups.values()].sort(
    ([a], [b]) => rank.indexOf(a.severity) - rank.indexOf(b.severity),
  );
};

const line = (group: readonly Finding[], sizes: number): string => {
  const [first] = group;
  const names = [...new Set(group.flatMap(({ size }) => size ?? []))];
  const where = names.length > 1 && names.length === sizes ? 'every size' : names.join(', ');
  return `  ${first.severity}: ${findingWords({ ...first, size: where || undefined })}`;
};

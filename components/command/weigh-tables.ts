import { holdConstantWords } from '../../physics/compare.js';
import { findingWords } from '../../physics/findings.js';
import type { Calibration, Comparison, Finding, Ratios, Weighing } from '../../physics/results.js';
import { shown } from './numbers.js';
import { plainTableText } from './plain-table.js';
import { sizeTables } from './weigh-size-tables.js';

/** A weighing for people: heading, a table for each size, the comparisons, then what must be read. */
export const weighTables = (weighing: Weighing): string => {
  const sizes = [...new Set(weighing.evaluations.map(({ size }) => size))];
  return [
    headingText(weighing),
    ...sizes.flatMap((size) => [
      ...sizeTables(weighing.evaluations.filter((evaluation) => evaluation.size === size)),
      ...weighing.comparisons.filter((comparison) => comparison.size === size).map(comparisonTable),
    ]),
    findingsText(weighing),
    assumedText(weighing.assumed),
  ]
    .filter((part) => part !== '')
    .join('\n');
};

const headingText = ({ case: stamp, version, calibration }: Weighing): string => {
  const heading = `${stamp.title || 'Untitled case'}\ncase ${stamp.hash}, Stratabeam ${version}\n`;
  return calibration === null
    ? `${heading}\nNot calibrated to readings of the room.\n`
    : `${heading}\n${calibrationTable(calibration)}`;
};

const readingNames = {
  halfValueLayer_mmAl: 'half-value layer, mm Al',
  airKerma_uGy_per_mAs: 'air kerma, µGy/mAs',
} as const;

const calibrationTable = (calibration: Calibration): string =>
  plainTableText({
    title:
      `Calibration: output factor ${shown(calibration.outputFactor)}, ` +
      `inherent filter ${shown(calibration.inherentFilter_mmAl)} mm Al`,
    headings: ['reading', 'kV', 'measured', 'model', 'difference %'],
    rows: calibration.residuals.map((residual) => [
      readingNames[residual.quantity],
      String(residual.potential_kV),
      shown(residual.measured),
      shown(residual.model),
      residual.relative_percent.toFixed(1),
    ]),
  });

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

const assumedText = (assumed: readonly string[]): string =>
  assumed.length === 0 ? '' : `Assumed because the case is silent\n  ${assumed.join('\n  ')}\n`;

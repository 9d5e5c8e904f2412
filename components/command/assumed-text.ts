import type { Case } from '../../physics/case/index.js';
import type { Calibration } from '../../physics/results.js';
import { shown } from './numbers.js';
import { isNone, shortValue } from './short-value.js';

/**
 * What the case left open and what stands there: `path = value` a line, then in one line the paths
 * whose default is "none". A default that readings have replaced says by what.
 */
export const assumedText = (
  assumed: readonly string[],
  c: Case,
  calibration: Calibration | null,
): string => {
  if (assumed.length === 0) return '';
  const found = assumed.map((path) => ({ path, value: valueIn(c, path) }));
  const none = found.filter(({ path, value }) => isNone(value) && !meaningOfNone(path));
  const lines = found
    .filter((one) => !none.includes(one))
    .map(
      ({ path, value }) =>
        `${path} = ${isNone(value) ? meaningOfNone(path) : shortValue(value)}${replacedBy(path, calibration)}`,
    );
  return [
    'Assumed because the case is silent',
    ...lines.map((line) => `  ${line}`),
    ...(none.length > 0 ? [`  none: ${none.map(({ path }) => path).join(', ')}`] : []),
    '',
  ].join('\n');
};

/** What silence means at keys where null or an empty list does not mean that there is none. */
const meaningsOfNone: readonly (readonly [ending: string, meaning: string])[] = [
  ['.growthShare', 'in proportion to thickness'],
  ['patient.lateral_mm', 'laterally infinite'],
  ['patient.sizes', 'one size, the layers as drawn'],
  ['detail.depthInLayer_mm', 'the middle of the layer'],
  ['detail.width_mm', 'as length_mm; a vessel has none'],
  ['.carrier', "the agent's own"],
];

const meaningOfNone = (path: string): string | undefined =>
  meaningsOfNone.find(([ending]) => path.endsWith(ending))?.[1];

/** The value at a path as `assumed` prints it; every key there is a plain word. */
const valueIn = (c: Case, path: string): unknown =>
  path
    .split(/[.[\]]+/)
    .filter(Boolean)
    .reduce<unknown>((part, key) => (part as Record<string, unknown> | null)?.[key], c);

const replacedBy = (path: string, calibration: Calibration | null): string => {
  const reads = (quantity: string): boolean =>
    calibration?.residuals.some((residual) => residual.quantity === quantity) ?? false;
  if (path === 'room.tube.outputFactor' && reads('airKerma_uGy_per_mAs')) {
    return `, replaced by the readings: ${shown(calibration?.outputFactor)}`;
  }
  if (path === 'room.tube.inherentFilter' && reads('halfValueLayer_mmAl')) {
    return `, replaced by the readings: ${shown(calibration?.inherentFilter_mmAl)} mm Al`;
  }
  return '';
};

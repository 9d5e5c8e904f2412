import { numberText } from '../number-text.js';
import type { CheckRow } from './check-rows.js';

const units = [
  [1e9, ' billion'],
  [1e6, ' million'],
  [1e3, ' thousand'],
  [1, ''],
] as const;

/** `300 thousand`, `2.4 million`: a number of photons to two digits. */
export const photonsText = (photons: number): string => {
  const rounded = Number(photons.toPrecision(2));
  const [size, name] = units.find(([least]) => rounded >= least) ?? units[units.length - 1];
  return `${numberText(rounded / size)}${name}`;
};

/** The verdict on a row in plain words. */
export const verdictText = ({
  tolerance_percent,
  verdict,
  photonsToDecide,
  transport,
}: CheckRow): string => {
  if (tolerance_percent === null || verdict === null) return 'transport alone';
  const within = `${numberText(tolerance_percent, 2)} %`;
  if (verdict === 'agrees') return `agrees within ${within}`;
  if (verdict === 'differs') return `differs by more than ${within}`;
  const isBlurred =
    transport.standardError === null ||
    2 * transport.standardError > (Math.abs(transport.value) * tolerance_percent) / 100;
  if (!isBlurred) return `not yet decided: at the edge of ${within}`;
  return photonsToDecide === null
    ? 'not yet decided'
    : `not yet decided: needs ${photonsText(photonsToDecide)} photons`;
};

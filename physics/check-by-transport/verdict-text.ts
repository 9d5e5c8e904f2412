import { numberText } from '../number-text.js';
import type { CheckRow } from './check-rows.js';
import { sureStandardErrors } from './verdict.js';

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

/** How a verdict falls, for under a table of them. */
export const verdictRule = [
  'One s.e. is the standard error of the mean, from how the means of the batches of the run differ.',
  `A verdict falls once ${sureStandardErrors} s.e. fit into the stated accuracy: the estimate agrees inside it, and differs`,
  `where it lies outside by more than ${sureStandardErrors} s.e.; between the two more photons decide. "To decide" is how`,
  `many in all, if the values stay as they are. Chance passes ${sureStandardErrors} s.e. to one side in 1 of 40 rows:`,
  'where few photons say "differs" and more say "not yet decided", believe the longer run.',
] as const;

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
    sureStandardErrors * transport.standardError >
      (Math.abs(transport.value) * tolerance_percent) / 100;
  const state = isBlurred ? 'not yet decided' : `not yet decided: at the edge of ${within}`;
  if (photonsToDecide === null) return state;
  return `${state}${isBlurred ? ':' : ','} needs ${photonsText(photonsToDecide)} photons`;
};

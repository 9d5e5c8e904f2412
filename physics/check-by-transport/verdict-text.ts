import { numberText } from '../number-text.js';
import type { CheckRow } from './check-rows.js';

/** `300 thousand`, `2.4 million`: a number of photons to two digits. */
export const photonsText = (photons: number): string => {
  if (photons >= 1e9) return `${numberText(photons / 1e9, 2)} billion`;
  if (photons >= 1e6) return `${numberText(photons / 1e6, 2)} million`;
  return photons >= 1e3 ? `${numberText(photons / 1e3, 2)} thousand` : numberText(photons);
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

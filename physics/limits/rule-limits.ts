import type { Rule } from '../case/schema.js';
import type { Finding } from '../results.js';
import { apartTexts } from './apart-texts.js';
import type { LimitInputs } from './limit-inputs.js';

type MinimumHvl = Extract<Rule, { kind: 'minimum-hvl' }>;
type KermaRate = Extract<Rule, { kind: 'kerma-rate' }>;
type Segment = MinimumHvl['segments'][number];

/** Value of a segment at a potential: linear between its points, the end points' lines beyond. */
const segmentValue_mmAl = (segment: Segment, potential_kV: number): number => {
  const { points } = segment;
  if (points.length === 1) return points[0][1];
  const after = points.findIndex(([kV]) => kV >= potential_kV);
  const upper = after < 0 ? points.length - 1 : Math.max(1, after);
  const [x0, y0] = points[upper - 1];
  const [x1, y1] = points[upper];
  return y0 + ((potential_kV - x0) / (x1 - x0)) * (y1 - y0);
};

/**
 * The least half-value layer a rule asks for at a potential; null where the rule is silent.
 * Interpolation never leaves a segment: 70 and 71 kV may belong to different ones.
 */
export const minimumHalfValueLayer_mmAl = (
  rule: MinimumHvl,
  potential_kV: number,
): number | null => {
  const segment = rule.segments.find(
    ({ from_kV, to_kV }) => potential_kV >= from_kV && potential_kV <= to_kV,
  );
  return segment ? segmentValue_mmAl(segment, potential_kV) : null;
};

const origin = ({ source, date, provenance }: Rule): string =>
  [source, date, provenance].filter((part) => part !== '').join(', ');

/** Text quoted from memory is no law: what meets it is said, and counts as nothing. */
const unconfirmed = (rule: Rule, path: string, isMet: string, more: Partial<Finding>): Finding[] =>
  rule.provenance === 'recalled' || rule.provenance === 'assumed'
    ? [
        {
          code: 'ruleUnconfirmed',
          severity: 'note',
          message: `${isMet}, but the rule’s text is ${rule.provenance} (${rule.source}): confirm the text, and measure.`,
          path,
          ...more,
        },
      ]
    : [];

const minimumHvlFindings = (inputs: LimitInputs, rule: MinimumHvl, path: string): Finding[] => {
  const { potential_kV } = inputs.setting;
  const bound = minimumHalfValueLayer_mmAl(rule, potential_kV);
  const value = inputs.halfValueLayer_mmAl;
  if (value === null) return [];
  const [is, least] = apartTexts(value, bound ?? 0, 4);
  if (bound === null) {
    return [
      {
        code: 'minimumHvlSilent',
        severity: 'note',
        message: `The minimum half-value layer rule (${origin(rule)}) gives no value at ${potential_kV} kV; check it by hand.`,
        path,
        value,
        bound: null,
      },
    ];
  }
  if (value < bound) {
    return [
      {
        code: 'minimumHvl',
        severity: 'limit',
        message: `Half-value layer ${is} mm Al in vacuum is below the ${least} mm Al asked for at ${potential_kV} kV (${origin(rule)}).`,
        path,
        value,
        bound,
      },
    ];
  }
  const isMet = `Half-value layer ${is} mm Al in vacuum is not below the ${least} mm Al asked for at ${potential_kV} kV`;
  return unconfirmed(rule, path, isMet, { value, bound });
};

const kermaRateFindings = (inputs: LimitInputs, rule: KermaRate, path: string): Finding[] => {
  const value = inputs.incidentAirKermaRate_mGy_per_min;
  if (!rule.appliesTo.includes(inputs.mode) || value === null) return [];
  const bound = rule.limit_mGy_per_min;
  const [rate, most] = apartTexts(value, bound);
  if (value > bound) {
    return [
      {
        code: 'kermaRate',
        severity: 'limit',
        message: `Incident air kerma rate ${rate} mGy/min exceeds ${most} mGy/min for ${inputs.mode} (${origin(rule)}).`,
        path,
        value,
        bound,
      },
    ];
  }
  const isMet = `Incident air kerma rate ${rate} mGy/min does not exceed ${most} mGy/min for ${inputs.mode}`;
  return unconfirmed(rule, path, isMet, { value, bound });
};

/**
 * The room's own rules: minimum half-value layer and kerma rate, as entered with their source. The
 * half-value layer is the beam's behind tube and filter in vacuum; air would harden it a little.
 */
export const ruleLimits = (inputs: LimitInputs): Finding[] =>
  inputs.case.room.rules.flatMap((rule, index) => {
    const path = `room.rules[${index}]`;
    return rule.kind === 'minimum-hvl'
      ? minimumHvlFindings(inputs, rule, path)
      : kermaRateFindings(inputs, rule, path);
  });

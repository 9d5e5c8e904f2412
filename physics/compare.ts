import { type Weighed, weighedAt } from './at-load.js';
import type { Case } from './case/schema.js';
import { findingsOf } from './findings.js';
import { numberText } from './number-text.js';
import type { OperatingPoint } from './operating-point.js';
import { sdnrAt } from './readout/index.js';
import type { Comparison, ComparisonRow, Finding, HoldConstant, Ratios } from './results.js';
import { loadFor } from './yield.js';

/** The equalities every comparison shows, in this order. */
export const holdConstants: readonly HoldConstant[] = [
  'asSet',
  'sdnr',
  'detectorAirKerma',
  'detectorSignal',
  'incidentAirKerma',
  'tubeLoad',
];

/** How an equality is named in a sentence. */
export const holdConstantWords: Readonly<Record<HoldConstant, string>> = {
  asSet: 'as set',
  sdnr: 'equal SdNR',
  detectorAirKerma: 'equal detector air kerma',
  detectorSignal: 'equal detector signal',
  incidentAirKerma: 'equal incident air kerma',
  tubeLoad: 'equal tube load',
};

/**
 * Two operating points at one size under every equality. The first keeps its load as set; the
 * second's is solved so that the held quantity equals the first's.
 */
export const compare = (c: Case, from: OperatingPoint, to: OperatingPoint): Comparison => {
  const base = weighedAt(c, from.made, from.technique.acquisition, from.tubeLoad_mAs);
  const rows = holdConstants.map((hold) => compareRow(c, from, to, base, hold));
  return {
    size: from.size.name,
    from: from.technique.name,
    to: to.technique.name,
    rows: withDisagreement(rows, c.compare.sdnrMargin_percent).map((row) => ({
      ...row,
      findings: findingsOf(row.findings, to.technique.name, from.size.name),
    })),
  };
};

/** The load of `to` at which the held quantity equals that of `from` as set. */
export const heldLoad = (from: OperatingPoint, to: OperatingPoint, hold: HoldConstant) => {
  if (hold === 'asSet') return { tubeLoad_mAs: to.tubeLoad_mAs, reason: null };
  return loadFor(to.made, hold, heldTarget(from, hold));
};

/** The value of the held quantity that the first operating point has as set. */
export const heldTarget = (
  { made, tubeLoad_mAs }: OperatingPoint,
  hold: Exclude<HoldConstant, 'asSet'>,
): number => {
  switch (hold) {
    case 'sdnr':
      return sdnrAt(made.readout, tubeLoad_mAs);
    case 'detectorAirKerma':
      return made.readout.detectorAirKerma_uGy_per_mAs * tubeLoad_mAs;
    case 'detectorSignal':
      return made.readout.signalTotal_per_mm2_per_mAs * tubeLoad_mAs;
    case 'incidentAirKerma':
      return made.dose.incidentAirKerma_mGy_per_mAs * tubeLoad_mAs;
    case 'tubeLoad':
      return tubeLoad_mAs;
  }
};

const ratioKeys: readonly (keyof Ratios)[] = [
  'incidentAirKerma',
  'entranceSurfaceAirKerma',
  'kermaAreaProduct',
  'energyImparted',
  'meanAbsorbedDose',
  'tubeLoad',
  'power',
  'sdnr',
  'subjectContrast',
  'detectedContrast',
];

const ratiosOf = (value: Weighed | null, base: Weighed): Ratios =>
  Object.fromEntries(
    ratioKeys.map((key) => {
      const above = value?.[key] ?? null;
      const below = base[key];
      return [key, above === null || below === null || below === 0 ? null : above / below];
    }),
  ) as Record<keyof Ratios, number | null>;

const compareRow = (
  c: Case,
  from: OperatingPoint,
  to: OperatingPoint,
  base: Weighed,
  holdConstant: HoldConstant,
): ComparisonRow => {
  const load = heldLoad(from, to, holdConstant);
  if (load.tubeLoad_mAs === null) {
    const unreachable: Finding = {
      code: 'equalityUnreachable',
      severity: 'caution',
      message: `Cannot reach ${holdConstantWords[holdConstant]}: ${load.reason}`,
      value: null,
    };
    return { holdConstant, ratio: ratiosOf(null, base), findings: [unreachable] };
  }
  const value = weighedAt(c, to.made, to.technique.acquisition, load.tubeLoad_mAs);
  return { holdConstant, ratio: ratiosOf(value, base), findings: [] };
};

/** Conditions under which a lower dose is reported as a saving, the first that applies to be told. */
const claimsSaving: readonly HoldConstant[] = ['asSet', 'detectorAirKerma', 'detectorSignal'];

/**
 * A dose that falls as set while SdNR falls too has not been shown to be a saving: where the
 * equalities disagree on who wins, the first row that claims a saving says so.
 */
const withDisagreement = (
  rows: readonly ComparisonRow[],
  sdnrMargin_percent: number,
): ComparisonRow[] => {
  const rowOf = (hold: HoldConstant) => rows.find((row) => row.holdConstant === hold);
  const atEqualSdnr = rowOf('sdnr')?.ratio.incidentAirKerma ?? null;
  for (const hold of claimsSaving) {
    const claim = rowOf(hold);
    const doubt = claim && doubtOf(claim, atEqualSdnr, sdnrMargin_percent);
    if (!doubt) continue;
    return rows.map((row) =>
      row === claim ? { ...row, findings: [...row.findings, doubt] } : row,
    );
  }
  return [...rows];
};

/** What speaks against reading a row's lower incident air kerma as a saving, if anything does. */
const doubtOf = (
  { holdConstant, ratio: { incidentAirKerma, sdnr } }: ComparisonRow,
  atEqualSdnr: number | null,
  sdnrMargin_percent: number,
): Finding | null => {
  if (incidentAirKerma === null || sdnr === null || incidentAirKerma >= 1) return null;
  if (atEqualSdnr === null || atEqualSdnr > 1) {
    const otherwise =
      atEqualSdnr === null
        ? 'but reaches equal SdNR at no tube load'
        : `but more (×${numberText(atEqualSdnr)}) at equal SdNR`;
    return {
      code: 'equalitiesDisagree',
      severity: 'caution',
      message: `Less incident air kerma (×${numberText(incidentAirKerma)}) ${holdConstantPhrase(holdConstant)}, ${otherwise}: SdNR falls to ×${numberText(sdnr)}.`,
      value: incidentAirKerma,
      bound: atEqualSdnr,
    };
  }
  const bound = 1 - sdnrMargin_percent / 100;
  if (sdnr >= bound) return null;
  return {
    code: 'sdnrLost',
    severity: 'caution',
    message: `${holdConstantPhrase(holdConstant, true)} the saving looks larger because SdNR falls by ${numberText(100 * (1 - sdnr), 2)} %.`,
    value: sdnr,
    bound,
  };
};

const holdConstantPhrase = (hold: HoldConstant, isStart = false): string => {
  const phrase = hold === 'asSet' ? 'as set' : `at ${holdConstantWords[hold]}`;
  return isStart ? phrase[0].toUpperCase() + phrase.slice(1) : phrase;
};

import type { Case } from './case/schema.js';
import { operatingPoint } from './operating-point.js';
import type { Finding, HoldConstant } from './results.js';
import { roomAxes, type SweepAxes } from './sweep/axes.js';
import type { CostName } from './sweep/costs.js';
import { frontierOf } from './sweep/frontier.js';
import { type SweepSetting, sweepSetting } from './sweep/sweep-setting.js';

/** What is asked of a sweep. */
export interface SweepRequest {
  readonly axes: SweepAxes;
  readonly holdConstant: HoldConstant;
  /** Costs the frontier is judged by, together with SdNR. */
  readonly costs: readonly CostName[];
}

/** A setting and whether it stands on the frontier of its size. */
export interface MappedSetting extends SweepSetting {
  readonly onFrontier: boolean;
}

/** The map of all settings and what no setting beats. */
export interface Sweep {
  readonly axes: {
    readonly potential_kV: readonly number[];
    readonly filter: readonly string[];
    readonly size: readonly string[];
  };
  readonly holdConstant: HoldConstant;
  readonly settings: readonly MappedSetting[];
  readonly frontier: {
    readonly costs: readonly CostName[];
    readonly members: readonly MappedSetting[];
  };
  readonly findings: readonly Finding[];
}

/** Costs a frontier is judged by unless told otherwise. */
export const usualCosts: readonly CostName[] = ['incidentAirKerma', 'tubeLoad'];

/** The whole room under a condition. */
export const wholeRoom = (c: Case, holdConstant: HoldConstant = 'sdnr'): SweepRequest => ({
  axes: roomAxes(c),
  holdConstant,
  costs: usualCosts,
});

/** One independent part of a sweep: one filter at one size, all potentials. */
export interface SweepPiece {
  readonly settings: readonly SweepSetting[];
  readonly findings: readonly Finding[];
}

/** Number of pieces a sweep splits into, size after size. */
export const sweepPieceCount = ({ axes }: SweepRequest): number =>
  axes.sizes.length * axes.filters.length;

/** Computes one piece; pieces of one size share its stack and scatter. */
export const sweepPiece = (c: Case, request: SweepRequest, index: number): SweepPiece => {
  const { potentials_kV, filters, sizes } = request.axes;
  const size = sizes[Math.floor(index / filters.length)];
  const filter = filters[index % filters.length];
  const reference = operatingPoint(c, c.techniques[0], size);
  if (!('made' in reference)) return { settings: [], findings: reference.findings };
  const { grid } = c.techniques[0];
  return {
    settings: potentials_kV.map((potential_kV) =>
      sweepSetting(c, reference, { potential_kV, filter, grid }, request.holdConstant),
    ),
    findings: [],
  };
};

/** Puts pieces together, in order, and finds what no setting beats. */
export const combineSweep = (request: SweepRequest, pieces: readonly SweepPiece[]): Sweep => {
  const settings = pieces.flatMap((piece) => piece.settings);
  const isMember = new Set(frontierOf(settings, request.costs));
  const mapped = settings.map((setting, i) => ({ ...setting, onFrontier: isMember.has(i) }));
  const { potentials_kV, filters, sizes } = request.axes;
  return Object.freeze({
    axes: {
      potential_kV: potentials_kV,
      filter: filters,
      size: sizes.map(({ name }) => name),
    },
    holdConstant: request.holdConstant,
    settings: mapped,
    frontier: {
      costs: request.costs,
      members: mapped.filter(({ onFrontier }) => onFrontier),
    },
    findings: distinct(pieces.flatMap((piece) => piece.findings)),
  });
};

/** The sweep in one go; workers run the pieces and combine. */
export const sweep = (c: Case, request: SweepRequest = wholeRoom(c)): Sweep => {
  const count = sweepPieceCount(request);
  const pieces = Array.from({ length: count }, (_, index) => sweepPiece(c, request, index));
  return combineSweep(request, pieces);
};

const distinct = (findings: readonly Finding[]): Finding[] => [
  ...new Map(findings.map((finding) => [finding.message, finding])).values(),
];

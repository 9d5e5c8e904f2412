import type { Case } from './case/schema.js';
import { distinctFindings } from './findings.js';
import { operatingPoint } from './operating-point.js';
import type { Finding, HoldConstant } from './results.js';
import { roomAxes, type SweepAxes } from './sweep/axes.js';
import type { CostName } from './sweep/costs.js';
import { frontierOf } from './sweep/frontier.js';
import { type SweepSetting, sweepSetting } from './sweep/sweep-setting.js';
import { withNearest } from './sweep/with-nearest.js';

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
  /** Name of the detail's agent when it is investigational: every plot says so. */
  readonly investigationalAgent: string | null;
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
  readonly investigationalAgent: string | null;
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
  const [technique] = c.techniques;
  const reference = operatingPoint(c, technique, size);
  if (!('made' in reference)) {
    return { settings: [], investigationalAgent: null, findings: reference.findings };
  }
  const { grid } = technique;
  const { agent } = reference.made.placement.detail;
  return {
    settings: potentials_kV.map((potential_kV) =>
      sweepSetting(c, reference, { potential_kV, filter, grid }, request.holdConstant),
    ),
    investigationalAgent: agent?.isInvestigational ? agent.name : null,
    findings: [],
  };
};

/** Settings of one size as they stand in the map: limits name the nearest allowed, the frontier. */
export const mappedSettings = (
  settings: readonly SweepSetting[],
  filters: readonly string[],
  costs: readonly CostName[],
): MappedSetting[] => {
  const isMember = new Set(frontierOf(settings, costs));
  return withNearest(settings, filters).map((setting, i) => ({
    ...setting,
    onFrontier: isMember.has(i),
  }));
};

/** Puts pieces together, in order, and finds what no setting beats. */
export const combineSweep = (request: SweepRequest, pieces: readonly SweepPiece[]): Sweep => {
  const { potentials_kV, filters, sizes } = request.axes;
  const settings = sizes.flatMap((_, s) => {
    const own = pieces.slice(s * filters.length, (s + 1) * filters.length);
    return mappedSettings(
      own.flatMap((piece) => piece.settings),
      filters,
      request.costs,
    );
  });
  return Object.freeze({
    axes: {
      potential_kV: potentials_kV,
      filter: filters,
      size: sizes.map(({ name }) => name),
    },
    holdConstant: request.holdConstant,
    settings,
    frontier: {
      costs: request.costs,
      members: settings.filter(({ onFrontier }) => onFrontier),
    },
    investigationalAgent:
      pieces.find(({ investigationalAgent }) => investigationalAgent)?.investigationalAgent ?? null,
    findings: distinctFindings(pieces.flatMap((piece) => piece.findings)),
  });
};

/** The sweep in one go; workers run the pieces and combine. */
export const sweep = (c: Case, request: SweepRequest = wholeRoom(c)): Sweep => {
  const count = sweepPieceCount(request);
  const pieces = Array.from({ length: count }, (_, index) => sweepPiece(c, request, index));
  return combineSweep(request, pieces);
};

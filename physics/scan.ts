import type { Case, Size } from './case/schema.js';
import { operatingPoint } from './operating-point.js';
import type { Finding, HoldConstant } from './results.js';
import { settingOf } from './setting.js';
import { type SweepSetting, sweepSetting } from './sweep/sweep-setting.js';

/** One filter's line of the contrast-versus-dose curve. */
export interface ScanLine {
  readonly filter: string;
  readonly points: readonly SweepSetting[];
}

/** Potential scanned at one size under one condition, a line per filter. */
export interface PotentialScan {
  readonly size: string;
  readonly holdConstant: HoldConstant;
  readonly lines: readonly ScanLine[];
  /** Name of the detail's agent when it is investigational: every plot says so. */
  readonly investigationalAgent: string | null;
  readonly findings: readonly Finding[];
}

/** Potentials the room offers, thinned evenly to at most `most` of them, both ends kept. */
export const roomPotentials_kV = (c: Case, most = Number.POSITIVE_INFINITY): number[] => {
  const { min, max, step } = c.room.tube.potential_kV;
  const count = Math.floor((max - min) / step + 1e-9) + 1;
  const stride = Math.max(1, Math.ceil((count - 1) / Math.max(1, most - 1)));
  const potentials: number[] = [];
  for (let i = 0; i < count; i += stride) potentials.push(Number((min + i * step).toFixed(6)));
  const last = Number((min + (count - 1) * step).toFixed(6));
  if (potentials[potentials.length - 1] !== last) potentials.push(last);
  return potentials;
};

/**
 * How contrast and dose move as the potential does: every filter of the room, Current's grid and
 * acquisition, under a condition held equal to Current's.
 *
 * @param most greatest number of potentials per line.
 */
export const potentialScan = (
  c: Case,
  size: Size,
  holdConstant: HoldConstant = 'detectorAirKerma',
  most = 40,
): PotentialScan => {
  const reference = operatingPoint(c, c.techniques[0], size);
  if (!('made' in reference)) {
    const { findings } = reference;
    return { size: size.name, holdConstant, lines: [], investigationalAgent: null, findings };
  }
  const { agent } = reference.made.placement.detail;
  const { grid } = settingOf(c.techniques[0]);
  const potentials = roomPotentials_kV(c, most);
  return {
    size: size.name,
    holdConstant,
    lines: c.room.filters.map(({ name: filter }) => ({
      filter,
      points: potentials.map((potential_kV) =>
        sweepSetting(c, reference, { potential_kV, filter, grid }, holdConstant),
      ),
    })),
    investigationalAgent: agent?.isInvestigational ? agent.name : null,
    findings: [],
  };
};

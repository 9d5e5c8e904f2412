import type { Case, Size, Technique } from './case/schema.js';
import { curvePointAt, isCurve } from './control.js';
import { placementOf } from './placement.js';
import type { Finding } from './results.js';
import { type Setting, settingOf } from './setting.js';
import { deliver, loadFor, type Yield } from './yield.js';

/** Where a technique stands at a size: its setting in force, its yield, and the load of one frame. */
export interface OperatingPoint {
  readonly technique: Technique;
  readonly size: Size;
  readonly made: Yield;
  readonly tubeLoad_mAs: number;
  readonly findings: readonly Finding[];
}

/** A technique that cannot be computed at a size, and why. */
export interface NoPoint {
  readonly findings: readonly Finding[];
}

/**
 * What the room's own exposure control will deliver for a technique at a size: as set. A control
 * curve decides potential, filter and load by thickness; any other control fixes one quantity of a
 * frame and the load follows.
 */
export const operatingPoint = (
  c: Case,
  technique: Technique,
  size: Size,
): OperatingPoint | NoPoint => {
  const placement = placementOf(c, size);
  if (!('stack' in placement)) return placement;
  const written = settingOf(technique);
  const { control } = technique;
  const curve = isCurve(control)
    ? curvePointAt(control, size.thickness_mm, c.room.tube.potential_kV)
    : null;
  const setting: Setting = curve ? { ...written, ...curve.setting } : written;
  const { made, findings } = deliver(c, placement, setting, technique.acquisition);
  if (!made) return { findings };
  if (isCurve(control)) {
    if (!curve) {
      return {
        findings: [blocked('controlCurveEmpty', 'The control curve has no rows.')],
      };
    }
    const { tubeCurrent_mA, exposureTime_ms } = curve;
    const tubeLoad_mAs = (tubeCurrent_mA * exposureTime_ms) / 1000;
    // The curve splits the load, whatever the acquisition says.
    const acquisition = { ...technique.acquisition, fixed: { tubeCurrent_mA } };
    return {
      technique: { ...technique, acquisition },
      size,
      made,
      tubeLoad_mAs,
      findings: [...findings, ...withdrawn(technique, setting, size)],
    };
  }
  const [hold, target] = heldBy(control);
  const load = loadFor(made, hold, target);
  return load.tubeLoad_mAs === null
    ? {
        findings: [...findings, blocked('controlUnreachable', load.reason)],
      }
    : { technique, size, made, tubeLoad_mAs: load.tubeLoad_mAs, findings };
};

type Fixed = Exclude<Technique['control'], { curve: string }>;

const heldBy = (
  control: Fixed,
): ['detectorAirKerma' | 'detectorSignal' | 'incidentAirKerma' | 'tubeLoad', number] => {
  if ('detectorAirKerma_uGy' in control) return ['detectorAirKerma', control.detectorAirKerma_uGy];
  if ('detectorSignal' in control) return ['detectorSignal', control.detectorSignal];
  if ('incidentAirKerma_mGy' in control) return ['incidentAirKerma', control.incidentAirKerma_mGy];
  return ['tubeLoad', control.tubeLoad_mAs];
};

const blocked = (code: string, message: string): Finding => ({ code, severity: 'limit', message });

/** The control curve left the technique as written. */
const withdrawn = (technique: Technique, setting: Setting, size: Size): Finding[] =>
  setting.filter === technique.filter
    ? []
    : [
        {
          code: 'filterWithdrawn',
          severity: 'caution',
          message: `At ${size.thickness_mm} mm the control curve uses filter ${setting.filter} instead of ${technique.filter}.`,
          value: setting.filter,
          bound: technique.filter,
        },
      ];

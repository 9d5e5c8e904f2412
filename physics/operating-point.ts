import type { Case, Size, Technique } from './case/schema.js';
import { curvePointAt, isCurve } from './control.js';
import { outputBeam } from './output-beam.js';
import { placementOf } from './placement.js';
import { prepare } from './prepare.js';
import { solveTubeLoad } from './readout/index.js';
import type { Finding } from './results.js';
import { type Setting, settingLabel, settingOf } from './setting.js';
import { type Yield, yieldOf } from './yield.js';

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

/** Detector signal (keV or counts) below which a primary beam is none: no tube makes 10⁹ mAs. */
const leastSignal_per_mm2_per_mAs = 1e-12;

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
  const { spectrum, findings } = outputBeam(prepare(c), setting.potential_kV, setting.filter);
  if (!spectrum) return { findings };
  const made = yieldOf(c, placement, setting, technique.acquisition, spectrum);
  if (!(made.readout.signalPrimary_per_mm2_per_mAs > leastSignal_per_mm2_per_mAs)) {
    const message = `No primary photon of ${settingLabel(setting)} reaches the detector at ${size.thickness_mm} mm; nothing can be shown.`;
    return { findings: [...findings, blocked('nothingArrives', message)] };
  }
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
  const load = solveTubeLoad(made.readout, made.dose.incidentAirKerma_mGy, hold, target);
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

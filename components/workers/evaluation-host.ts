import { type AlongBeam, alongBeam } from '../../physics/along-beam.js';
import type { ParsedCase } from '../../physics/case/index.js';
import { sharedWith } from '../../physics/case/shared-with.js';
import type { CheckRequest, NoCheck } from '../../physics/check-by-transport/index.js';
import { type DepthProfiles, depthProfiles } from '../../physics/depth-profiles.js';
import { type OperatingPoint, operatingPoint } from '../../physics/operating-point.js';
import type { Weighing } from '../../physics/results.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import type { SweepSetting } from '../../physics/sweep/sweep-setting.js';
import { weigh } from '../../physics/weigh.js';
import { type CheckStart, startCheck } from './check-start.js';
import { type ScanRequest, scanSlice } from './scan-slice.js';

/**
 * What the evaluation worker does, free of any worker: it is handed a case and answers about it.
 * Parts of the case that an edit left alone keep their identity, and with it what was computed.
 */
export interface EvaluationHost {
  readonly load: (parsed: ParsedCase) => void;
  /** The answer at one size of the mix, so that none has to wait for the others. */
  readonly weigh: (size: string) => Weighing;
  /** Primary photons along the axis and the spectrum at the detail, per technique that has them. */
  readonly along: (size: string) => AlongBeam[];
  readonly scan: (request: ScanRequest) => SweepSetting[];
  /** Absorbed energy and scatter along the depth, per technique; much more work than `weigh`. */
  readonly depths: (size: string) => DepthProfiles[];
  /** A transport run made ready to fly, with the ways of its first photons. */
  readonly check: (request: CheckRequest) => CheckStart | NoCheck;
}

export function evaluationHost(): EvaluationHost {
  let loaded: ParsedCase | null = null;
  const parsed = (): ParsedCase => {
    if (!loaded) throw new Error('no case was handed over');
    return loaded;
  };
  const sizesNamed = (name: string) =>
    sizesOf(parsed().case.patient).filter((size) => size.name === name);
  const pointsAt = (name: string): OperatingPoint[] => {
    const { case: c } = parsed();
    const [size] = sizesNamed(name);
    if (!size) return [];
    const points = c.techniques.map((technique) => operatingPoint(c, technique, size));
    return points.filter((point): point is OperatingPoint => 'made' in point);
  };
  return {
    load: (next) => {
      loaded = { case: sharedWith(loaded?.case, next.case), assumed: next.assumed };
    },
    weigh: (name) => weigh(parsed(), sizesNamed(name)),
    along: (name) => pointsAt(name).map(alongBeam),
    scan: (request) => scanSlice(parsed().case, request),
    depths: (name) => pointsAt(name).map(depthProfiles),
    check: (request) => startCheck(parsed().case, request),
  };
}

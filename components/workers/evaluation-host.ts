import type { ParsedCase } from '../../physics/case/index.js';
import { sharedWith } from '../../physics/case/shared-with.js';
import type { Weighing } from '../../physics/results.js';
import { weigh } from '../../physics/weigh.js';
import { type DetailSpectra, detailSpectra } from './detail-spectra.js';
import { type ScanHold, type ScanPoint, scanSlice } from './scan-slice.js';

/** A stretch of the potential scan: one filter, some potentials, one size, one technique's frame. */
export interface ScanRequest {
  readonly size: string;
  readonly filter: string;
  readonly potentials_kV: readonly number[];
  readonly hold: ScanHold;
}

/**
 * What the evaluation worker does, free of any worker: it is handed a case and answers about it.
 * Parts of the case that an edit left alone keep their identity, and with it what was computed.
 */
export interface EvaluationHost {
  readonly load: (parsed: ParsedCase) => void;
  readonly weigh: () => Weighing;
  readonly scan: (request: ScanRequest) => ScanPoint[];
  readonly spectra: (size: string) => DetailSpectra;
}

export function evaluationHost(): EvaluationHost {
  let loaded: ParsedCase | null = null;
  const parsed = (): ParsedCase => {
    if (!loaded) throw new Error('no case was handed over');
    return loaded;
  };
  return {
    load: (next) => {
      loaded = { case: sharedWith(loaded?.case, next.case), assumed: next.assumed };
    },
    weigh: () => weigh(parsed()),
    scan: (request) => scanSlice(parsed().case, request),
    spectra: (size) => detailSpectra(parsed().case, size),
  };
}

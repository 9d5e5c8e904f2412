import type { HoldConstant } from '../../../physics/results.js';

/** The equalities the margin has room for; Balance shows all. */
export const marginHolds: readonly HoldConstant[] = [
  'asSet',
  'sdnr',
  'detectorAirKerma',
  'incidentAirKerma',
];

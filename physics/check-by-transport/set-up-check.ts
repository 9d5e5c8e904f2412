import { airPath, attenuate } from '../beam/index.js';
import type { Case, Technique } from '../case/schema.js';
import { fieldArea_cm2 } from '../dose/field-area.js';
import type { OperatingPoint } from '../operating-point.js';
import { operatingPoint } from '../operating-point.js';
import type { Finding } from '../results.js';
import { settingLabel } from '../setting.js';
import { sizesOf } from '../stack/sizes.js';
import type { Stack } from '../stack/stack.js';
import { buildTransportInput } from '../transport/index.js';
import { centralColumn } from './central-column.js';
import { checkEstimate } from './check-estimate.js';
import { checkFindings, transportRange_keV } from './check-findings.js';
import type { CheckRequest } from './check-request.js';
import type { CheckSetup } from './check-setup.js';

/** A check that cannot be made, and why. */
export interface NoCheck {
  readonly findings: readonly Finding[];
}

/**
 * A transport run of the plain stack (without the detail, as the scatter estimate takes it) in the
 * beam, field, gap, grid and detector of one technique at one size, and the estimate's values of
 * what the run will score. A point source fills its field and is scored at the field centre; a
 * parallel beam on layers without sides flies as a pencil.
 *
 * @returns the setup, or findings where the technique has no operating point at this size, the names
 * are not those of the case, or the beam holds photons outside 1–150 keV.
 */
export const setUpCheck = (c: Case, request: CheckRequest): CheckSetup | NoCheck => {
  const technique = c.techniques.find(({ name }) => name === request.technique);
  const size = sizesOf(c.patient).find(({ name }) => name === request.size);
  if (!technique) return unknown('technique', request.technique);
  if (!size) return unknown('size', request.size);
  const point = operatingPoint(c, technique, size);
  return 'made' in point ? setUp(c, technique, point, request) : point;
};

const unknown = (what: string, name: string): NoCheck => ({
  findings: [
    { code: 'unknownName', severity: 'limit', message: `The case has no ${what} called ${name}.` },
  ],
});

const setUp = (
  c: Case,
  technique: Technique,
  point: OperatingPoint,
  request: CheckRequest,
): CheckSetup | NoCheck => {
  const { made, tubeLoad_mAs } = point;
  const { chain, placement, setting, dose } = made;
  const { stack } = placement;
  const { energies_keV, fluence_per_mm2 } = made.output;
  const [least_keV, greatest_keV] = transportRange_keV;
  const outside = energies_keV.find(
    (energy, i) => fluence_per_mm2[i] > 0 && (energy < least_keV || energy > greatest_keV),
  );
  if (outside !== undefined) return outsideRange(technique, outside);
  const { lateral_mm } = c.patient;
  const isPencil = stack.beam === 'parallel' && lateral_mm === null;
  const column = isPencil ? { boxes: [], layers: [] } : centralColumn(stack);
  const { grid } = chain;
  const input = buildTransportInput(
    stack,
    isPencil ? attenuate(made.output, [airPath(airBefore_mm(stack))]) : made.output,
    chain.detector,
    grid && ((energy_keV, cosine) => grid.table.lookup(energy_keV, cosine)),
    request,
    { lateral_mm, boxes: column.boxes },
  );
  return {
    request,
    setting: `${settingLabel(setting)}, grid ${grid ? 'in' : 'out'}`,
    input,
    estimate: checkEstimate(point),
    hasGrid: grid !== null,
    measuredGridShare: grid?.measured
      ? grid.measured.scatterTransmission / grid.measured.primaryTransmission
      : null,
    incidentAirKerma_mGy: dose.incidentAirKerma_mGy_per_mAs * tubeLoad_mAs,
    pencilField_cm2: isPencil ? fieldArea_cm2(stack, stack.sourceToSkin_mm) : 1,
    column: column.layers,
    findings: checkFindings(c, point),
  };
};

// A pencil starts at the support: the air before it only filters.
const airBefore_mm = (stack: Stack): number => {
  const support_mm = stack.supportEntrance.reduce((sum, slab) => sum + slab.thickness_mm, 0);
  return stack.air ? Math.max(0, stack.sourceToSkin_mm - support_mm) : 0;
};

const outsideRange = ({ name }: Technique, energy_keV: number): NoCheck => ({
  findings: [
    {
      code: 'transportRange',
      severity: 'limit',
      message: `${name}: the beam holds photons of ${energy_keV} keV; transport covers ${transportRange_keV[0]} to ${transportRange_keV[1]} keV.`,
      value: energy_keV,
      bound: transportRange_keV[1],
    },
  ],
});

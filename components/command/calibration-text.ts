import type { Case, Tube } from '../../physics/case/index.js';
import type { Calibration, Residual } from '../../physics/results.js';
import { shown } from './numbers.js';
import { plainTableText } from './plain-table.js';

const readingNames = {
  halfValueLayer_mmAl: 'half-value layer, mm Al',
  airKerma_uGy_per_mAs: 'air kerma, µGy/mAs',
} as const;

/** What the readings made of the tube, each beside the model, and how to have the beam alone. */
export const calibrationText = (calibration: Calibration | null, { room }: Case): string => {
  if (calibration === null) return 'Not calibrated to readings of the room.\n';
  const { residuals } = calibration;
  const table = plainTableText({
    title: calibrationTitle(calibration),
    headings: ['reading', 'filter', 'kV', 'measured', 'model', 'difference %'],
    rows: residuals.map((residual) => [
      readingNames[residual.quantity],
      readingOf(residual, room.readings).filter,
      String(residual.potential_kV),
      shown(residual.measured),
      shown(residual.model),
      residual.relative_percent.toFixed(1),
    ]),
    wordColumns: 2,
  });
  const medium = room.geometry.air ? 'air' : 'vacuum';
  return [
    table,
    `Readings and their model are in ${medium} at the reading's distance; beams below are in vacuum at 1 m.`,
    'The output factor holds at 80 kV and goes as (kV/80)^exponent. The unfiltered beam alone:',
    `  stratabeam ${beamCommand(calibration, room.tube)}`,
    '',
  ].join('\n');
};

const calibrationTitle = (fit: Calibration): string =>
  `Calibration: output factor ${shown(fit.outputFactor)}, output exponent ` +
  `${shown(fit.outputExponent)}, inherent filter ${shown(fit.inherentFilter_mmAl)} mm Al`;

/** `room.readings[3].halfValueLayer_mmAl` names its reading. */
const readingOf = ({ path }: Residual, readings: Case['room']['readings']) =>
  readings[Number(/\[(\d+)\]/.exec(path)?.[1])];

const beamCommand = (fit: Calibration, { anodeAngle_deg, ripple_percent }: Tube): string =>
  [
    'beam --potential 80',
    `--anode-angle ${anodeAngle_deg}`,
    ...(ripple_percent === 0 ? [] : [`--ripple ${ripple_percent}`]),
    `--through "aluminium ${digits(fit.inherentFilter_mmAl)} mm"`,
    `--output-factor ${digits(fit.outputFactor)}`,
    `--output-exponent ${digits(fit.outputExponent)}`,
  ].join(' ');

/** Enough digits for the tables' four. */
const digits = (value: number): string => String(Number(value.toPrecision(6)));

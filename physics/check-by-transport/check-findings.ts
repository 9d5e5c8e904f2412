import type { Case } from '../case/schema.js';
import { numberText } from '../number-text.js';
import type { OperatingPoint } from '../operating-point.js';
import type { Finding } from '../results.js';
import { cutoffEnergy_keV, greatestEnergy_keV } from '../transport/energy-nodes.js';
import { leastTriedTransmission, triedRange } from './stated-accuracy.js';

/** Photon energies transport has tables for. */
export const transportRange_keV = [cutoffEnergy_keV, greatestEnergy_keV] as const;

/** What estimate and transport do not have in common, and where the stated accuracy was not tried. */
export const checkFindings = (c: Case, point: OperatingPoint): Finding[] => [
  ...differences(c),
  ...untried(point),
];

const note = (code: string, message: string, path: string): Finding => ({
  code,
  severity: 'note',
  message,
  path,
});

const differences = ({ patient, room }: Case): Finding[] => {
  const [width_mm, height_mm] = room.geometry.field_mm;
  const findings: Finding[] = [];
  if (patient.lateral_mm) {
    const [across_mm, along_mm] = patient.lateral_mm;
    findings.push(
      note(
        'checkSides',
        `Transport flies through a body of ${across_mm} × ${along_mm} mm; the estimate takes its layers without sides.`,
        'patient.lateral_mm',
      ),
    );
  }
  if (Math.abs(width_mm - height_mm) > 1e-3 * width_mm) {
    findings.push(
      note(
        'checkField',
        `Transport has the field of ${width_mm} × ${height_mm} mm as it is; the estimate takes its equivalent square.`,
        'room.geometry.field_mm',
      ),
    );
  }
  if (room.grid?.measured) {
    findings.push(
      note(
        'checkMeasuredGrid',
        'Behind the grid both use its measured transmissions, so that row says no more than the one without grid.',
        'room.grid.measured',
      ),
    );
  }
  return findings;
};

const untried = (point: OperatingPoint): Finding[] => {
  const { placement, setting, primary, skin } = point.made;
  const { stack } = placement;
  const outside = [
    beyond('gap', stack.exitToDetector_mm, triedRange.gap_mm, 'mm'),
    ...stack.field_mm.map((side_mm) => beyond('field', side_mm, triedRange.field_mm, 'mm')),
    beyond('potential', setting.potential_kV, triedRange.potential_kV, 'kV'),
  ].filter((words) => words !== null);
  const findings: Finding[] = [];
  if (outside.length > 0) {
    const words = [...new Set(outside)].join(', ');
    findings.push(
      note('checkUntried', `The stated accuracy was not tried here: ${words}.`, 'room.geometry'),
    );
  }
  const spread =
    stack.beam === 'parallel' ? 1 : (stack.sourceToSkin_mm / stack.sourceToDetector_mm) ** 2;
  const energyOf = (beam: typeof skin): number =>
    beam.fluence_per_mm2.reduce((sum, photons, i) => sum + photons * beam.energies_keV[i], 0);
  const transmission = energyOf(primary) / (spread * energyOf(skin));
  if (transmission < leastTriedTransmission) {
    findings.push({
      code: 'checkOpaque',
      severity: 'caution',
      message: `Only ${numberText(transmission, 2)} of the primary energy passes this stack: scatter is set against next to nothing, and the stated accuracy does not cover it.`,
      value: transmission,
      bound: leastTriedTransmission,
    });
  }
  return findings;
};

const beyond = (
  what: string,
  value: number,
  [least, greatest]: readonly [number, number],
  unit: string,
): string | null =>
  value < least || value > greatest
    ? `${what} ${numberText(value)} ${unit} (tried ${least} to ${greatest})`
    : null;

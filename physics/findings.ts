import type { Case, Technique } from './case/schema.js';
import { isCurve } from './control.js';
import type { Finding } from './results.js';

/** Said once with every result of a case, whatever its numbers. */
export const caseFindings = (c: Case): Finding[] => {
  const findings: Finding[] = [];
  if (c.room.source) {
    findings.push({
      code: 'sourceWithoutTube',
      severity: 'note',
      message:
        'The source has no tube: loads are in units of its own intensity, not mAs; power and tube limits do not apply.',
      path: 'room.source',
    });
  } else if (c.room.readings.length === 0) {
    findings.push({
      code: 'uncalibrated',
      severity: 'caution',
      message:
        'No readings are entered: tube output is the model’s, ±30 % from tube to tube; ratios between techniques suffer far less than absolute kerma.',
      path: 'room.readings',
    });
  }
  findings.push(...unruled(c), ...notUsed(c));
  const [width_mm, height_mm] = c.room.geometry.field_mm;
  if (Math.max(width_mm, height_mm) > 1.001 * Math.min(width_mm, height_mm)) {
    findings.push({
      code: 'equivalentSquare',
      severity: 'note',
      message: `Scatter treats the ${width_mm} × ${height_mm} mm field as its equivalent square (4 area/perimeter); its scatter is approximate.`,
      path: 'room.geometry.field_mm',
    });
  }
  if (c.patient.lateral_mm === null) {
    findings.push({
      code: 'lateralInfinite',
      severity: 'note',
      message:
        'Layers are laterally infinite, bone too: scatter from bone at the field’s edge and dose beside the spine are those of a full slab.',
      path: 'patient.lateral_mm',
    });
  }
  return findings;
};

/** What no rule is entered for is not tested, and silence is no pass. */
const unruled = (c: Case): Finding[] => {
  const kinds = c.room.rules.map(({ kind }) => kind);
  const isRated = c.techniques.some(({ acquisition }) => acquisition.mode === 'fluoroscopy');
  const missing = [
    ...(c.room.source || kinds.includes('minimum-hvl') ? [] : ['minimum half-value layer']),
    ...(isRated && !kinds.includes('kerma-rate') ? ['kerma rate'] : []),
  ];
  return missing.map((words) => ({
    code: 'noRuleEntered',
    severity: 'caution' as const,
    message: `No rule for the ${words} is entered, so none is tested; enter the one that binds this room with its source and date.`,
    path: 'room.rules',
    value: null,
  }));
};

/** Parts of a case that are kept and checked for form, but enter no number of this version. */
const notUsed = (c: Case): Finding[] => {
  const entered = {
    agentsCompared: c.agentsCompared.length,
    priors: c.priors.length,
    measuredChecks: c.measuredChecks.length,
    monitoring: c.monitoring === null ? 0 : 1,
  };
  return Object.entries(entered)
    .filter(([, count]) => count > 0)
    .map(([path]) => ({
      code: 'enteredNotUsed',
      severity: 'caution' as const,
      message: `${path}: is kept with the case, but no number of this version rests on it.`,
      path,
    }));
};

/** Said with every result of a technique. */
export const techniqueFindings = (technique: Technique, path: string): Finding[] =>
  isCurve(technique.control)
    ? []
    : [
        {
          code: 'controlNotModelled',
          severity: 'caution',
          technique: technique.name,
          message:
            "The room's exposure control is not modelled; every size is taken at the same setting. Enter a control curve to see where a filter is withdrawn.",
          path: `${path}.control`,
        },
      ];

/** Whose a finding is, and where: the same finding said of a technique at a size. */
export const findingsOf = (
  findings: readonly Finding[],
  technique: string,
  size: string,
): Finding[] => findings.map((finding) => ({ ...finding, technique, size }));

/** A finding as it is read on its own: `Proposed, P75: needs 75.2 kW …`. */
export const findingWords = ({ technique, size, message }: Finding): string => {
  const whose = [technique, size].filter((name) => name !== undefined).join(', ');
  return whose ? `${whose}: ${message}` : message;
};

/** Each sentence once, in order of first saying. */
export const distinctFindings = (findings: readonly Finding[]): Finding[] => [
  ...new Map(findings.map((finding) => [findingWords(finding), finding])).values(),
];

/** The findings that forbid. */
export const limitsOf = (findings: readonly Finding[]): Finding[] =>
  findings.filter(({ severity }) => severity === 'limit');

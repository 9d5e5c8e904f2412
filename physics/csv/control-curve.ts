import { potentialColumn, thicknessColumn } from './common-columns.js';
import { readColumns } from './read-columns.js';

const positive = { min: 1e-6, max: 1e6 };

const columns = {
  thickness_mm: thicknessColumn,
  potential_kV: potentialColumn,
  tubeCurrent_mA: { kind: 'number', names: ['tube current', 'current'], unit: 'mA', ...positive },
  exposureTime_ms: { kind: 'number', names: ['exposure time', 'time'], unit: 'ms', ...positive },
  filter: { kind: 'text', names: ['added filter'] },
} as const;

/** What a room's exposure control does by patient thickness, as rows of `control.curve`. */
export const parseControlCurveCsv = (
  text: string,
  mapping?: Partial<Record<keyof typeof columns, string>>,
) => readColumns(text, columns, mapping);

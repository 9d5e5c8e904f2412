/** Columns that several tables share. */

export const potentialColumn = {
  kind: 'number',
  names: ['potential', 'tube potential', 'tube voltage', 'kv', 'kvp'],
  unit: 'kV',
  min: 20,
  max: 150,
} as const;

export const thicknessColumn = {
  kind: 'number',
  names: ['thickness', 'patient thickness'],
  unit: 'mm',
  min: 1e-6,
  max: 2000,
} as const;

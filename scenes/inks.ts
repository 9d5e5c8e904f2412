/** Colours of a drawing, as `#rrggbb`: paper and ink, and one ink a technique. */
export interface StackInks {
  readonly paper: string;
  /** Faces that are not cut, a little off the paper. */
  readonly shade: string;
  readonly ink: string;
  readonly soft: string;
  readonly rule: string;
  readonly current: string;
  readonly proposed: string;
}

export const lightInks: StackInks = {
  paper: '#faf8f3',
  shade: '#f1ece2',
  ink: '#2b2a28',
  soft: '#6a655d',
  rule: '#d9d3c7',
  current: '#3f4650',
  proposed: '#8e2f5c',
};

export const darkInks: StackInks = {
  paper: '#1b1b1a',
  shade: '#242422',
  ink: '#ece8df',
  soft: '#a8a298',
  rule: '#3a3835',
  current: '#b7c0cc',
  proposed: '#e08bb0',
};

export type InkName = keyof StackInks;

/** Order in which inks are handed to the graphics card. */
export const inkNames = ['paper', 'shade', 'ink', 'soft', 'rule', 'current', 'proposed'] as const;
export const inkNumber = (name: InkName): number => inkNames.indexOf(name);

/** Red, green and blue of `#rrggbb`, 0 to 1; black for anything else. */
export function rgbOf(color: string): [number, number, number] {
  const match = /^#([0-9a-f]{6})$/i.exec(color.trim());
  const value = match ? Number.parseInt(match[1], 16) : 0;
  return [(value >> 16) / 255, ((value >> 8) & 255) / 255, (value & 255) / 255];
}

/** The ink of the half of technique number 0 or 1. */
export const techniqueInkName = (technique: 0 | 1): InkName =>
  technique === 0 ? 'current' : 'proposed';

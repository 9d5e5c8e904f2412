import { type Fault, faultAt } from '../fault.js';
import type { Case, Technique } from '../schema.js';
import { unknownNameFaults } from './known-name.js';
import { ascendingFaults } from './range-rules.js';
import { uniqueNameFaults } from './unique-names.js';

/** What techniques ask of the room: its filters and its grid. */
export const techniqueFaults = ({
  techniques,
  room,
}: Pick<Case, 'techniques' | 'room'>): Fault[] => {
  const filters = room.filters.map(({ name }) => name);
  return [
    ...uniqueNameFaults(['techniques'], techniques),
    ...techniques.flatMap((technique, index) => {
      const path = ['techniques', index];
      return [
        ...unknownNameFaults([...path, 'filter'], technique.filter, filters, 'one of room.filters'),
        ...(technique.grid === 'in' && room.grid === null
          ? [
              faultAt(
                [...path, 'grid'],
                'in',
                'must be "out" in a room without a grid',
                'describe room.grid or write "out"',
              ),
            ]
          : []),
        ...curveFaults(technique, index, filters),
        ...maskFaults(technique, index),
      ];
    }),
  ];
};

const curveFaults = (
  { control }: Technique,
  index: number,
  filters: readonly string[],
): Fault[] => {
  if (!('curve' in control)) return [];
  const path = ['techniques', index, 'control', 'rows'];
  const rows = control.rows ?? [];
  return [
    ...ascendingFaults(
      rows.map((row) => row.thickness_mm),
      (row) => [...path, row, 'thickness_mm'],
      'order the control curve by thickness',
    ),
    ...rows.flatMap(({ filter }, row) =>
      unknownNameFaults([...path, row, 'filter'], filter, filters, 'one of room.filters'),
    ),
  ];
};

const maskFaults = ({ acquisition }: Technique, index: number): Fault[] =>
  acquisition.mode === 'subtraction' && acquisition.maskFrames === 0
    ? [
        faultAt(
          ['techniques', index, 'acquisition', 'maskFrames'],
          0,
          'must be at least 1 in subtraction',
          'enter the frames averaged into the mask',
        ),
      ]
    : [];

/** Measured checks must name a technique and a size of this case. */
export const measuredCheckFaults = ({
  measuredChecks,
  techniques,
  patient,
}: Pick<Case, 'measuredChecks' | 'techniques' | 'patient'>): Fault[] =>
  measuredChecks.flatMap(({ technique, size }, index) => {
    const path = ['measuredChecks', index];
    const names = techniques.map(({ name }) => name);
    const sizes = patient.sizes.map(({ name }) => name);
    return [
      ...unknownNameFaults([...path, 'technique'], technique, names, 'one of techniques'),
      ...(size === null
        ? []
        : unknownNameFaults([...path, 'size'], size, sizes, 'one of patient.sizes')),
    ];
  });

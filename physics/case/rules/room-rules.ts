import { type Fault, faultAt } from '../fault.js';
import type { Path } from '../printed.js';
import type { Case, Room, Rule, Slab } from '../schema.js';
import { unknownNameFaults } from './known-name.js';
import { unknownMaterialFaults } from './material-rules.js';
import { ascendingFaults, rangeFaults } from './range-rules.js';
import { uniqueNameFaults } from './unique-names.js';

/** What one part of the room asks of another. */
export const roomFaults = ({ room }: Pick<Case, 'room'>): Fault[] => [
  ...rangeFaults(['room', 'tube', 'potential_kV'], room.tube.potential_kV),
  ...rangeFaults(['room', 'tube', 'current_mA'], room.tube.current_mA),
  ...rangeFaults(['room', 'tube', 'exposureTime_ms'], room.tube.exposureTime_ms),
  ...rangeFaults(['room', 'detector', 'airKerma_uGy'], room.detector.airKerma_uGy),
  ...ascendingFaults(
    room.tube.rating.map((row) => row.exposureTime_ms),
    (index) => ['room', 'tube', 'rating', index, 'exposureTime_ms'],
    'order the rating chart by exposure time',
  ),
  ...uniqueNameFaults(['room', 'filters'], room.filters),
  ...readingFaults(room),
  ...gapFaults(room),
  ...(room.grid === null ? [] : stripFaults(room.grid)),
  ...room.rules.flatMap((rule, index) => segmentFaults(rule, ['room', 'rules', index])),
];

const readingFaults = ({ readings, filters }: Room): Fault[] =>
  readings.flatMap((reading, index) => {
    const path = ['room', 'readings', index];
    const names = filters.map((filter) => filter.name);
    const empty = reading.halfValueLayer_mmAl === null && reading.airKerma_uGy_per_mAs === null;
    return [
      ...unknownNameFaults([...path, 'filter'], reading.filter, names, 'one of room.filters'),
      ...(empty
        ? [
            faultAt(
              path,
              reading,
              'must hold halfValueLayer_mmAl, airKerma_uGy_per_mAs or both',
              'enter what was measured, or remove the reading',
            ),
          ]
        : []),
    ];
  });

const gapFaults = ({ geometry }: Room): Fault[] =>
  geometry.exitToDetector_mm < geometry.sourceToDetector_mm
    ? []
    : [
        faultAt(
          ['room', 'geometry', 'exitToDetector_mm'],
          geometry.exitToDetector_mm,
          `must be below sourceToDetector_mm, ${geometry.sourceToDetector_mm}`,
          'enter the gap between patient and detector',
        ),
      ];

/** Strips must leave room for interspace. */
const stripFaults = (grid: NonNullable<Room['grid']>): Fault[] => {
  const pitch_um = 1e4 / grid.strips_per_cm;
  if (grid.strip.thickness_um < pitch_um) return [];
  const rule = `must be below the pitch of ${Number(pitch_um.toPrecision(3))} µm at ${grid.strips_per_cm} strips/cm`;
  const path = ['room', 'grid', 'strip', 'thickness_um'];
  return [faultAt(path, grid.strip.thickness_um, rule, 'enter the strip thickness in µm')];
};

const segmentFaults = (rule: Rule, path: Path): Fault[] => {
  if (rule.kind !== 'minimum-hvl') return [];
  return [
    ...ascendingFaults(
      rule.segments.map((segment) => segment.from_kV),
      (index) => [...path, 'segments', index, 'from_kV'],
      'order the segments by potential',
    ),
    ...rule.segments.flatMap(({ from_kV, to_kV, points }, index) => {
      const at = [...path, 'segments', index];
      const next = rule.segments[index + 1];
      const outside = points.findIndex(([kV]) => kV < from_kV || kV > to_kV);
      return [
        ...(from_kV <= to_kV
          ? []
          : [
              faultAt(
                [...at, 'from_kV'],
                from_kV,
                `must not exceed to_kV, ${to_kV}`,
                'enter the lower end as from_kV',
              ),
            ]),
        ...(next === undefined || to_kV <= next.from_kV
          ? []
          : [
              faultAt(
                [...at, 'to_kV'],
                to_kV,
                `must not pass the next segment's from_kV, ${next.from_kV}`,
                'end the segment where the next begins',
              ),
            ]),
        ...(outside < 0
          ? []
          : [
              faultAt(
                [...at, 'points', outside, 0],
                points[outside][0],
                `must be within its segment, ${from_kV} to ${to_kV}`,
                'move the point or widen the segment',
              ),
            ]),
        ...ascendingFaults(
          points.map(([kV]) => kV),
          (point) => [...at, 'points', point, 0],
          'order the points by potential',
        ),
      ];
    }),
  ];
};

/** Every material that the room names must be known. */
export const roomMaterialFaults = (c: Pick<Case, 'room' | 'materials'>): Fault[] => {
  const { room } = c;
  const slabs = (path: Path, list: readonly Slab[]): Fault[] =>
    list.flatMap(({ material }, index) =>
      unknownMaterialFaults([...path, index, 'material'], material, c),
    );
  return [
    ...slabs(['room', 'tube', 'inherentFilter'], room.tube.inherentFilter),
    ...room.filters.flatMap(({ layers }, index) =>
      slabs(['room', 'filters', index, 'layers'], layers),
    ),
    ...slabs(['room', 'support'], room.support),
    ...(room.grid === null
      ? []
      : [
          ...unknownMaterialFaults(
            ['room', 'grid', 'strip', 'material'],
            room.grid.strip.material,
            c,
          ),
          ...unknownMaterialFaults(
            ['room', 'grid', 'interspace', 'material'],
            room.grid.interspace.material,
            c,
          ),
          ...slabs(['room', 'grid', 'cover'], room.grid.cover),
        ]),
    ...unknownMaterialFaults(['room', 'detector', 'material'], room.detector.material, c, [
      'ideal',
    ]),
  ];
};

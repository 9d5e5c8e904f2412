import { beamFaults, type MaterialLayer, readingFaults } from '../../beam/index.js';
import { resolveMaterial } from '../../stack/resolve-material.js';
import type { Fault } from '../fault.js';
import type { Case, Slab } from '../schema.js';
import { roomFaults, roomMaterialFaults } from './room-rules.js';

type Parts = Pick<Case, 'room' | 'materials' | 'techniques'>;

/**
 * What the tube model asks: readings a tube can give in their unit and, where no readings tell the
 * filtration, enough of it behind every technique's filter. A source without a tube is not asked.
 */
export const beamPathFaults = (c: Parts): readonly Fault[] => {
  const { room } = c;
  const isUnclear = roomFaults(c).length > 0 || roomMaterialFaults(c).length > 0;
  if (isUnclear || room.source !== null) return [];
  const material = resolveMaterial(c);
  const layers = (slabs: readonly Slab[]): MaterialLayer[] =>
    slabs.map((slab) => ({ material: material(slab.material), thickness_mm: slab.thickness_mm }));
  const filters = new Map(room.filters.map((filter) => [filter.name, layers(filter.layers)]));
  if (room.readings.length > 0) {
    return readingFaults(room.tube, room.readings, filters, { air: room.geometry.air, material });
  }
  const { anodeAngle_deg, ripple_percent } = room.tube;
  const inherent = layers(room.tube.inherentFilter);
  return c.techniques.flatMap(({ potential_kV, filter }) =>
    beamFaults(
      { potential_kV, anodeAngle_deg, ripple_percent },
      [...inherent, ...(filters.get(filter) ?? [])],
      'room.tube',
    ),
  );
};

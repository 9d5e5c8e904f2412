import type { Material } from '../materials/index.js';
import { calibrate, kEdges_keV, type MaterialLayer } from './beam/index.js';
import type { Case } from './case/schema.js';
import { KeptBy } from './numeric/kept-by.js';
import {
  type DetectorResponse,
  detectorResponse,
  type RoomGrid,
  roomGrid,
} from './readout/index.js';
import type { Calibration } from './results.js';
import { layerMaterial, resolveAgent, resolveMaterial } from './stack/resolve-material.js';

/** A case with everything looked up that does not depend on technique or size. */
export interface Prepared {
  readonly room: Case['room'];
  readonly material: (name: string) => Material;
  readonly detector: DetectorResponse;
  readonly grid: RoomGrid | null;
  /** Edges of everything in the beam: bin boundaries of every spectrum of this case. */
  readonly edges_keV: readonly number[];
  readonly calibration: Calibration | null;
  /** Between anode and added filter: calibrated aluminium, or the filtration as entered. */
  readonly inherentFilter: readonly MaterialLayer[];
  /** The room's added filters by name. */
  readonly filters: ReadonlyMap<string, readonly MaterialLayer[]>;
}

const prepared = new KeptBy<Prepared>();

/** What a parsed case looks up once; kept by identity of all it depends on. */
export const prepare = (c: Case): Prepared =>
  prepared.get([c.room, c.patient, c.task, c.materials, c.agentsCompared], () => makePrepared(c));

const makePrepared = (c: Case): Prepared => {
  const material = resolveMaterial(c);
  const slabs = (layers: readonly { material: string; thickness_mm: number }[]): MaterialLayer[] =>
    layers.map(({ material: name, thickness_mm }) => ({ material: material(name), thickness_mm }));
  const { room } = c;
  const filters = new Map(room.filters.map(({ name, layers }) => [name, slabs(layers)]));
  const detector = detectorResponse(room.detector, material);
  const grid = room.grid && roomGrid(room.grid, material);
  const calibration =
    room.source === null && room.readings.length > 0
      ? calibrate(room.tube, room.readings, filters, { air: room.geometry.air, material })
      : null;
  return {
    room,
    material,
    detector,
    grid,
    edges_keV: [
      ...detector.edges_keV,
      ...kEdges_keV([
        ...[...filters.values()].flat().map((layer) => layer.material),
        ...room.support.map((slab) => material(slab.material)),
        ...c.patient.layers.map((layer) => layerMaterial(c, layer)),
        ...detailMaterials(c, material),
        ...(room.grid ? [material(room.grid.strip.material)] : []),
      ]),
    ],
    calibration,
    inherentFilter: calibration
      ? [{ material: material('aluminium'), thickness_mm: calibration.inherentFilter_mmAl }]
      : slabs(room.tube.inherentFilter),
    filters,
  };
};

/** Matter of the detail and of the agents compared with it. */
const detailMaterials = (c: Case, material: (name: string) => Material): Material[] => {
  const { detail } = c.task;
  const agents = [...(detail.agent ? [detail.agent] : []), ...c.agentsCompared];
  return [
    ...agents.map((agent) => resolveAgent(c, agent).material),
    ...(detail.material ? [material(detail.material)] : []),
    ...(detail.reference === 'layer' ? [] : [material(detail.reference)]),
  ];
};

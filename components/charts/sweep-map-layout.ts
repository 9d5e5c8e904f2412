import { scaleLinear } from 'd3-scale';

/** One setting of the map. */
export interface MapCell {
  /** SdNR² per the chosen cost; null where the condition cannot be met. */
  readonly merit: number | null;
  /** Name of the limit that forbids it; null where the room allows it. */
  readonly forbidden: string | null;
}

/** One filter of the room; `cells` follow the map's potentials, and are empty until computed. */
export interface MapRow {
  readonly filter: string;
  readonly cells: readonly MapCell[];
}

export interface MapMark {
  readonly ink: number;
  readonly name: string;
  readonly potential_kV: number;
  readonly filter: string;
}

export interface MapBest {
  readonly potential_kV: number;
  readonly filter: string;
  readonly merit: number;
  readonly window90_kV: readonly [number, number];
}

/** A map of settings: potential across, the room's filters in their own order down. */
export interface SweepMapData {
  /** `SdNR² per incident air kerma`. */
  readonly meritName: string;
  readonly meritUnit: string;
  /** `equal SdNR`. */
  readonly holdConstant: string;
  readonly size: string;
  readonly potentials_kV: readonly number[];
  readonly rows: readonly MapRow[];
  readonly marks: readonly MapMark[];
  /** The best allowed setting; null where none is. */
  readonly best: MapBest | null;
  /** Set for agents that are not in clinical use; printed on the plot. */
  readonly investigational: string | null;
}

/** Places on the map, in px. */
export interface MapLayout {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  /** Centre of a potential. */
  readonly x: (potential_kV: number) => number;
  /** Edges around the potentials: one more than there are potentials. */
  readonly edges: readonly number[];
  readonly rowTop: (row: number) => number;
  readonly rowHeight: number;
  readonly ticks_kV: readonly number[];
}

const margin = { top: 22, right: 10, bottom: 42, left: 74 };
/** Paper between two filters: nothing lies between them. */
const between = 3;

/** How high the map is drawn for a number of filters. */
export const mapHeight = (filters: number): number =>
  margin.top + margin.bottom + filters * Math.min(46, Math.max(24, 260 / Math.max(1, filters)));

export const mapLayout = (data: SweepMapData, width: number): MapLayout => {
  const height = mapHeight(data.rows.length);
  const { potentials_kV } = data;
  const last = potentials_kV.length - 1;
  const halfway = (i: number): number => (potentials_kV[i] + potentials_kV[i + 1]) / 2;
  const step_kV = last > 0 ? potentials_kV[1] - potentials_kV[0] : 1;
  const lastStep_kV = last > 0 ? potentials_kV[last] - potentials_kV[last - 1] : 1;
  const edges_kV = [
    potentials_kV[0] - step_kV / 2,
    ...Array.from({ length: last }, (_, i) => halfway(i)),
    potentials_kV[last] + lastStep_kV / 2,
  ];
  const x = scaleLinear([edges_kV[0], edges_kV[last + 1]], [margin.left, width - margin.right]);
  const bottom = height - margin.bottom;
  const pitch = (bottom - margin.top) / Math.max(1, data.rows.length);
  return {
    width,
    height,
    left: margin.left,
    right: width - margin.right,
    top: margin.top,
    bottom,
    x,
    edges: edges_kV.map((kV) => x(kV)),
    rowTop: (row) => margin.top + row * pitch,
    rowHeight: pitch - between,
    ticks_kV: x.ticks(Math.max(2, Math.floor(width / 80))),
  };
};

/** The setting nearest to a point of the drawing: index of potential and row; null outside the map. */
export const placeAt = (
  layout: MapLayout,
  data: SweepMapData,
  at: { readonly x: number; readonly y: number },
): { readonly column: number; readonly row: number } | null => {
  const { left, right, top, bottom, edges } = layout;
  if (at.x < left || at.x > right || at.y < top || at.y > bottom) return null;
  const after = edges.findIndex((edge) => edge > at.x);
  const column = Math.min(data.potentials_kV.length - 1, Math.max(0, after - 1));
  const pitch = (bottom - top) / Math.max(1, data.rows.length);
  const row = Math.min(data.rows.length - 1, Math.floor((at.y - top) / pitch));
  return { column, row };
};

/** Neighbouring settings forbidden by one limit, as first and last index of potential. */
export interface ForbiddenRun {
  readonly limit: string;
  readonly from: number;
  readonly to: number;
}

export const forbiddenRuns = (cells: readonly MapCell[]): ForbiddenRun[] => {
  const runs: ForbiddenRun[] = [];
  cells.forEach(({ forbidden }, i) => {
    const last = runs.at(-1);
    if (forbidden === null) return;
    if (last && last.limit === forbidden && last.to === i - 1)
      runs[runs.length - 1] = { ...last, to: i };
    else runs.push({ limit: forbidden, from: i, to: i });
  });
  return runs;
};

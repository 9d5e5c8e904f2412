import type { MapCursor } from '../../charts/sweep-map.js';
import type { SweepMapData } from '../../charts/sweep-map-layout.js';

/** Potentials that Page Up and Page Down move by. */
const page = 10;

/**
 * Where a key moves the reading: arrows by one setting, Page Up and Down by ten potentials, Home and
 * End to the ends of the row. Null for any other key. The first key begins at the best setting.
 */
export function movedCursor(
  data: SweepMapData,
  cursor: MapCursor | null,
  key: string,
): MapCursor | null {
  const last = data.potentials_kV.length - 1;
  const moves: Record<string, readonly [columns: number, rows: number]> = {
    ArrowLeft: [-1, 0],
    ArrowRight: [1, 0],
    ArrowUp: [0, -1],
    ArrowDown: [0, 1],
    PageUp: [page, 0],
    PageDown: [-page, 0],
    Home: [-last, 0],
    End: [last, 0],
  };
  const move = Object.hasOwn(moves, key) ? moves[key] : undefined;
  if (!move) return null;
  if (!cursor) return startOf(data);
  const within = (value: number, most: number): number => Math.min(most, Math.max(0, value));
  return {
    column: within(cursor.column + move[0], last),
    row: within(cursor.row + move[1], data.rows.length - 1),
  };
}

const startOf = ({ best, potentials_kV, rows }: SweepMapData): MapCursor => ({
  column: Math.max(0, best ? potentials_kV.indexOf(best.potential_kV) : 0),
  row: Math.max(0, best ? rows.findIndex(({ filter }) => filter === best.filter) : 0),
});

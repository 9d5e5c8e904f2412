import { formatEntry } from '../../charts/format.js';
import { piecesDone, type SweepState } from './sweep-state.js';

/** How far a sweep has come, in words; anything but the whole is called incomplete. */
export function progressWords(state: SweepState): string {
  const { request, pieces, phase, elapsed_ms, message } = state;
  const { potentials_kV, filters, sizes } = request.axes;
  const perPiece = potentials_kV.length;
  const all = pieces.length * perPiece;
  const done = piecesDone(state) * perPiece;
  const count = (settings: number): string => `${formatEntry(settings)} settings`;
  const axes = `${potentials_kV.length} potentials, ${filters.length} filters, ${sizes.length} ${sizes.length === 1 ? 'size' : 'sizes'}`;
  switch (phase) {
    case 'running':
      return `${done} of ${count(all)}: incomplete`;
    case 'cancelled':
      return `cancelled after ${done} of ${count(all)}: incomplete`;
    case 'failed':
      return `could not be computed: ${message}`;
    default:
      return `${count(all)}: ${axes}, in ${(elapsed_ms / 1000).toFixed(1)} s`;
  }
}

import { type CheckRow, verdictText } from '../../../physics/check-by-transport/index.js';
import type { CheckState } from './check-state.js';

/** A whole number in groups of three: 1 000 000. */
export const countText = (count: number): string =>
  String(Math.round(count)).replace(/\B(?=(\d{3})+$)/g, ' ');

/** Sign before a verdict, so that it is not told by words alone. */
export const verdictSign = ({ verdict }: CheckRow): string =>
  ({ agrees: '≈', differs: '≠', undecided: '?', none: '' })[verdict ?? 'none'];

export const verdictWords = (row: CheckRow): string =>
  row.verdict === null ? 'transport alone' : verdictText(row);

/** How far a run has come, in a line. */
export function progressWords({ phase, report, request, message }: CheckState): string {
  if (phase === 'preparing') return 'making the run ready';
  if (phase === 'failed') return `not flown: ${message}`;
  const flown = `${countText(report?.photons ?? 0)} of ${countText(request.photons)} photons`;
  if (phase === 'cancelled') return `${message}; incomplete: ${flown}`;
  const rate = report?.photonsPerSecond ?? null;
  const speed = rate === null ? '' : `, ${countText(Number(rate.toPrecision(3)))} a second`;
  if (phase === 'done') return `${countText(request.photons)} photons${speed}`;
  const left_s =
    rate === null ? null : Math.ceil((request.photons - (report?.photons ?? 0)) / rate);
  return `incomplete: ${flown}${speed}${left_s === null ? '' : `, ${left_s} s left`}`;
}

/** What a screen reader is told when a run begins and ends; nothing in between. */
export function announcement(check: CheckState | null): string {
  if (check === null) return '';
  if (check.phase === 'preparing' || check.phase === 'flying') return 'Run begun.';
  if (check.phase !== 'done') return `Run ended: ${progressWords(check)}.`;
  const count = (verdict: CheckRow['verdict']): number =>
    check.report?.rows.filter((row) => row.verdict === verdict).length ?? 0;
  return `Run done: ${count('agrees')} quantities agree, ${count('differs')} differ, ${count('undecided')} not yet decided.`;
}

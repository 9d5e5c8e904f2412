import type { ParsedCase } from '../../../physics/case/index.js';
import { startEvaluator } from '../../workers/evaluator.js';
import { makeEvaluationWorker } from '../../workers/make-evaluation-worker.js';
import { makeTransportWorker } from '../../workers/make-transport-worker.js';
import { transportPool } from '../../workers/transport-pool.js';
import type { DeskPage } from '../page/desk-page.js';
import { askDepths } from './ask-depths.js';
import { checkRunner } from './check-runner.js';
import { type CheckState, checkBasis, isRunning } from './check-state.js';
import { isDepthInk } from './depth-shadings.js';

/** Made when first asked for. */
const once = <T>(make: () => T): (() => T) => {
  let made: T | null = null;
  return () => {
    made ??= make();
    return made;
  };
};

/**
 * Joins the page with what computes aside from it: transport runs, and what
 * happens along the depth. Both have workers of their own, so that answers to edits never wait for them.
 *
 * @param parsed the case as it stands.
 * @returns what to call after every change of the case or of the size looked at.
 */
export function joinTransport(page: DeskPage, parsed: () => ParsedCase): () => void {
  const aside = once(() => startEvaluator(makeEvaluationWorker));
  const pool = once(() =>
    transportPool(makeTransportWorker, Math.max(1, navigator.hardwareConcurrency - 1)),
  );
  const parts = { evaluator: aside, pool, now_ms: () => performance.now() };
  const runner = checkRunner(parts, (check) => {
    page.check = check;
    if (check.phase === 'preparing' || check.history.length === 0) drawTracks();
  });

  const isCurrent = ({ basis, request }: CheckState): boolean =>
    basis === checkBasis(parsed().case, request.technique);

  const drawTracks = () => {
    const { check, tracksDrawn, model } = page;
    const drawn = check !== null && tracksDrawn && isCurrent(check) && check.tracks.length > 0;
    const tracks = drawn ? { ...check.request, tracks: check.tracks } : null;
    if (tracks?.tracks !== model.tracks?.tracks) page.model = { ...model, tracks };
  };

  let ink = '';
  const ask = askDepths(aside, parsed, {
    depths: (depths) => {
      page.model = { ...page.model, depths };
    },
    trouble: (words) => {
      page.depthTrouble = words;
    },
  });
  const askAgain = () => {
    if (isDepthInk(ink)) void ask(page.model.sizeName);
  };

  page.addEventListener('run-check', ({ detail }) => void runner.run(parsed(), detail));
  page.addEventListener('cancel-check', () => runner.cancel());
  page.addEventListener('draw-tracks', ({ detail }) => {
    page.tracksDrawn = detail;
    drawTracks();
  });
  page.addEventListener('choose-ink', ({ detail }) => {
    ink = detail;
    askAgain();
  });
  return () => {
    const { check } = page;
    if (check && isRunning(check) && !isCurrent(check)) runner.cancel('the case has changed');
    drawTracks();
    askAgain();
  };
}

import { sizesOf } from '../../../physics/stack/sizes.js';
import { usualSize } from '../../../physics/stack/usual-size.js';
import { autosave } from '../../store/autosave.js';
import { canStand, createCaseStore, type Sheet, type StoreState } from '../../store/case-store.js';
import { keepSoon } from '../../store/keep-soon.js';
import { startEvaluator } from '../../workers/evaluator.js';
import { makeEvaluationWorker } from '../../workers/make-evaluation-worker.js';
import { makeSweepWorker } from '../../workers/make-sweep-worker.js';
import { sweepPool } from '../../workers/sweep-pool.js';
import type { DeskCommand } from '../desk-header/desk-header.js';
import { joinTransport } from '../transport-section/join-transport.js';
import { answering } from './answers.js';
import { deskFiles } from './desk-files.js';
import { beforeGone, listenForDrops, listenForKeys } from './desk-keys.js';
import type { DeskPage } from './desk-page.js';
import { examples } from './examples.js';
import { keptPaper, papers, usePaper } from './paper.js';

const keepAfter_ms = 400;

/** Puts a case on the page, and joins page, store, files and evaluator for as long as it is open. */
export async function startDesk(page: DeskPage): Promise<void> {
  const storage = autosave('stratabeam');
  const recovered = await storage.recover();
  const isRecovered = recovered !== null && canStand(recovered);
  const example: Sheet = { document: examples[0].document, files: {}, fileName: null };
  const store = createCaseStore(isRecovered ? recovered : example, () => performance.now());
  if (isRecovered) page.status = 'continued where you left off in this browser';
  const keeper = keepSoon(storage.keep, keepAfter_ms, (isKept) => {
    page.isKept = isKept;
  });
  const keep = () => {
    const { draft, fileName } = store.state();
    keeper.later({ document: draft.document, files: draft.files, fileName });
  };

  const ask = answering(startEvaluator(makeEvaluationWorker), {
    answer: (answer, { revision }) => {
      page.model = {
        ...page.model,
        ...answer,
        others: [],
        stale: revision !== store.state().revision,
      };
      page.trouble = '';
    },
    curve: (scan) => {
      page.scan = scan;
      page.curveStale = false;
    },
    otherSize: (weighing) => {
      page.model = { ...page.model, others: [...page.model.others, weighing] };
    },
    failed: (message) => {
      page.trouble = `This case could not be computed: ${message}`;
    },
  });

  const besidesChanged = joinTransport(page, () => store.state().draft);
  const askAgain = () => {
    const { draft, revision } = store.state();
    page.curveStale = true;
    besidesChanged();
    ask({ revision, parsed: draft, size: page.model.sizeName, hold: page.hold });
  };

  const show = ({ draft, canUndo, canRedo }: StoreState) => {
    const sizes = sizesOf(draft.case.patient);
    const { techniques } = draft.case;
    const shown = page.model?.right ?? 1;
    page.model = {
      draft,
      weighing: page.model?.weighing ?? null,
      along: page.model?.along ?? [],
      others: page.model?.others ?? [],
      depths: page.model?.depths,
      tracks: page.model?.tracks,
      stale: true,
      sizeName: sizes.some(({ name }) => name === page.model?.sizeName)
        ? page.model.sizeName
        : usualSize(sizes).name,
      left: 0,
      right: techniques.length > 1 ? Math.min(Math.max(1, shown), techniques.length - 1) : null,
    };
    page.canUndo = canUndo;
    page.canRedo = canRedo;
    document.title = `${draft.case.title || 'Untitled case'} · Stratabeam`;
    keep();
    askAgain();
  };
  show(store.state());
  store.subscribe(show);

  const files = deskFiles(store, {
    status: (words) => {
      page.status = words;
      keep();
    },
    refused: (report) => {
      page.refused = report;
    },
  });
  const commands: Record<DeskCommand, () => unknown> = {
    open: files.choose,
    save: files.save,
    undo: store.undo,
    redo: store.redo,
    paper: () => {
      page.paper = papers[(papers.indexOf(page.paper) + 1) % papers.length];
      usePaper(page.paper);
    },
  };

  page.pool = sweepPool(makeSweepWorker, Math.max(1, navigator.hardwareConcurrency - 1));
  page.paper = keptPaper();
  usePaper(page.paper);
  page.examples = examples.map(({ name }) => name);
  page.addEventListener('case-edit', ({ detail }) => {
    if ('path' in detail) store.setAt(detail.path, detail.value);
    else store.change(detail.change, detail.joins);
  });
  page.addEventListener('fault-report', ({ detail }) => {
    page.refused = detail;
  });
  page.addEventListener('command', ({ detail }) => commands[detail]());
  page.addEventListener('example', ({ detail }) => {
    const chosen = examples.find(({ name }) => name === detail);
    if (chosen) files.open({ document: chosen.document, files: {}, fileName: null });
  });
  page.addEventListener('choose-size', ({ detail }) => {
    page.model = { ...page.model, sizeName: detail };
    askAgain();
  });
  page.addEventListener('choose-hold', ({ detail }) => {
    page.hold = detail;
    askAgain();
  });
  page.addEventListener('show-technique', ({ detail }) => {
    page.model = { ...page.model, right: detail };
  });
  listenForKeys((command) => commands[command]());
  listenForDrops(files.handed);
  beforeGone(keeper.now);
}

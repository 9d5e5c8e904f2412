import type { Fault } from '../../../physics/case/index.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import { usualSize } from '../../../physics/stack/usual-size.js';
import { autosave } from '../../store/autosave.js';
import { chooseFiles, fileNameFor, readHanded, saveCase } from '../../store/case-files.js';
import { createCaseStore, type Sheet, type StoreState } from '../../store/case-store.js';
import { valueAtPath } from '../../store/path.js';
import { startEvaluator } from '../../workers/evaluator.js';
import { makeEvaluationWorker } from '../../workers/make-evaluation-worker.js';
import { makeSweepWorker } from '../../workers/make-sweep-worker.js';
import { sweepPool } from '../../workers/sweep-pool.js';
import type { DeskCommand } from '../desk-header/desk-header.js';
import { joinTransport } from '../transport-section/join-transport.js';
import { answering } from './answers.js';
import type { DeskPage } from './desk-page.js';
import { examples } from './examples.js';
import { keptPaper, papers, usePaper } from './paper.js';

const keepAfter_ms = 400;

/** Puts a case on the page, and joins page, store, files and evaluator for as long as it is open. */
export async function startDesk(page: DeskPage): Promise<void> {
  const recovered = await autosave.recover();
  const first: Sheet = { document: examples[0].document, files: {} };
  const store = createCaseStore(first, () => performance.now());
  let fileName: string | null = null;
  if (recovered && store.open(recovered).length === 0) {
    fileName = recovered.fileName;
    page.status = 'continued where you left off in this browser';
  }

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

  let keeping: ReturnType<typeof setTimeout> | undefined;
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
    clearTimeout(keeping);
    keeping = setTimeout(
      () => autosave.keep({ document: draft.document, files: draft.files, fileName }),
      keepAfter_ms,
    );
    askAgain();
  };
  show(store.state());
  store.subscribe(show);

  const openSheet = (sheet: Sheet, name: string | null) => {
    const faults = store.open(sheet);
    refused(faults, name ?? 'The case');
    if (faults.length === 0) {
      fileName = name;
      page.status = name ? `opened ${name}` : '';
    }
  };
  const refused = (faults: readonly Fault[], name: string) => {
    page.refused = faults.length > 0 ? { heading: `${name} was not opened`, faults } : null;
  };
  const handed = async (files: readonly File[]) => {
    const got = await readHanded(files);
    if (got.kind === 'case')
      openSheet({ document: got.sheet.document, files: { ...got.sheet.files } }, got.fileName);
    if (got.kind === 'tables') store.addFiles(got.files);
    if (got.kind === 'faults') refused(got.faults, got.fileName);
  };

  const commands: Record<DeskCommand, () => void | Promise<void>> = {
    open: async () => {
      const files = await chooseFiles();
      if (files) await handed(files);
    },
    save: async () => {
      const { document: saved } = store.state().draft;
      const name = fileName ?? fileNameFor(String(valueAtPath(saved, 'title') ?? ''));
      if (await saveCase(saved, name)) {
        fileName = name;
        page.status = `saved ${name}`;
      }
    },
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
  page.addEventListener('command', ({ detail }) => void commands[detail]());
  page.addEventListener('example', ({ detail }) => {
    const chosen = examples.find(({ name }) => name === detail);
    if (chosen) openSheet({ document: chosen.document, files: {} }, null);
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
  listenForKeys(commands);
  listenForDrops(handed);
}

/** Ctrl (or Command) with Z, Shift+Z, Y, S and O, wherever the focus is. */
function listenForKeys(commands: Record<DeskCommand, () => void | Promise<void>>): void {
  addEventListener('keydown', (event) => {
    if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
    const key = event.key.toLowerCase();
    const name = { z: event.shiftKey ? 'redo' : 'undo', y: 'redo', s: 'save', o: 'open' }[key] as
      | DeskCommand
      | undefined;
    if (!name) return;
    event.preventDefault();
    void commands[name]();
  });
}

/** A case file, and tables with it, may be dropped anywhere on the page. */
function listenForDrops(handed: (files: readonly File[]) => Promise<void>): void {
  addEventListener('dragover', (event) => event.preventDefault());
  addEventListener('drop', (event) => {
    event.preventDefault();
    const files = [...(event.dataTransfer?.files ?? [])];
    if (files.length > 0) void handed(files);
  });
}

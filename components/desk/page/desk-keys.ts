import type { DeskCommand } from '../desk-header/desk-header.js';

/** Ctrl (or Command) with Z, Shift+Z, Y, S and O, wherever the focus is. */
export function listenForKeys(act: (command: DeskCommand) => void): void {
  addEventListener('keydown', (event) => {
    if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
    const key = event.key.toLowerCase();
    const name = { z: event.shiftKey ? 'redo' : 'undo', y: 'redo', s: 'save', o: 'open' }[key] as
      | DeskCommand
      | undefined;
    if (!name) return;
    event.preventDefault();
    act(name);
  });
}

/** A case file, and tables with it, may be dropped anywhere on the page. */
export function listenForDrops(handed: (files: readonly File[]) => void): void {
  addEventListener('dragover', (event) => event.preventDefault());
  addEventListener('drop', (event) => {
    event.preventDefault();
    const files = [...(event.dataTransfer?.files ?? [])];
    if (files.length > 0) handed(files);
  });
}

/** Tells when the page may be gone in a moment: closed, left, or put behind another. */
export function beforeGone(act: () => void): void {
  addEventListener('pagehide', act);
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'hidden') act();
  });
}

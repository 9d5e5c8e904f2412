import { type CaseEdit, requestEdit } from '../fields/case-edit.js';
import { layerEdits } from './layer-edits.js';

/** Alt+ArrowUp/Down moves a layer, Alt+Delete removes it, Alt+Insert adds one below it. */
export function layerKeys(from: HTMLElement, event: KeyboardEvent, index: number): void {
  if (!event.altKey || event.ctrlKey || event.metaKey) return;
  const edits: Record<string, CaseEdit> = {
    ArrowUp: layerEdits.move(index, -1),
    ArrowDown: layerEdits.move(index, 1),
    Delete: layerEdits.remove(index),
    Insert: layerEdits.add(index),
  };
  const edit = edits[event.key];
  if (!edit) return;
  event.preventDefault();
  requestEdit(from, edit);
}

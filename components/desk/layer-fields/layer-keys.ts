import type { LitElement } from 'lit';
import { type CaseEdit, requestEdit } from '../fields/case-edit.js';
import { layerEdits } from './layer-edits.js';

/** Where the focus goes after an edit of layer `index`, by key. */
const steps: Record<string, { edit: (index: number) => CaseEdit; to: number }> = {
  ArrowUp: { edit: (index) => layerEdits.move(index, -1), to: -1 },
  ArrowDown: { edit: (index) => layerEdits.move(index, 1), to: 1 },
  Delete: { edit: layerEdits.remove, to: 0 },
  Insert: { edit: layerEdits.add, to: 1 },
};

/**
 * Alt+ArrowUp/Down moves a layer, Alt+Delete removes it, Alt+Insert adds one below it. The focus
 * goes along, to the same field of the layer moved or made.
 */
export function layerKeys(from: LitElement, event: KeyboardEvent, index: number): void {
  const step = event.altKey && !event.ctrlKey && !event.metaKey ? steps[event.key] : undefined;
  if (!step) return;
  event.preventDefault();
  const fields = [...from.renderRoot.querySelectorAll<HTMLElement>('[data-field]')];
  const field = fields.findIndex((candidate) => candidate.matches(':focus-within'));
  const parent = from.parentNode;
  requestEdit(from, step.edit(index));
  setTimeout(() => {
    const all = [...(parent?.querySelectorAll<LitElement>(from.localName) ?? [])];
    const target = all[Math.min(all.length - 1, Math.max(0, index + step.to))];
    const same =
      target?.renderRoot.querySelectorAll<LitElement>('[data-field]')[Math.max(0, field)];
    same?.renderRoot.querySelector<HTMLElement>('input, select')?.focus();
  });
}

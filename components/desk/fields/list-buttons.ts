import { html, type TemplateResult } from 'lit';
import { type Draft, listAt } from '../../store/draft.js';
import { addItem, removeItem } from '../../store/list-changes.js';
import type { Json } from '../../store/path.js';
import { requestEdit } from './case-edit.js';

/** Adds an item to a list of the case; `what` names it: `a filter`. */
export const addButton = (draft: Draft, path: string, item: Json, what: string): TemplateResult =>
  html`<button class="plain" type="button" @click=${(event: Event) =>
    requestEdit(event.target as HTMLElement, {
      change: addItem(path, item, listAt(draft, path)),
    })}>add ${what}</button>`;

/** Takes item `index` out of a list of the case; `what` names it for screen readers. */
export const removeButton = (
  draft: Draft,
  path: string,
  index: number,
  what: string,
  enabled = true,
): TemplateResult =>
  html`<button class="plain" type="button" aria-label="Remove ${what}" ?disabled=${!enabled} @click=${(
    event: Event,
  ) =>
    requestEdit(event.target as HTMLElement, {
      change: removeItem(path, index, listAt(draft, path)),
    })}>remove</button>`;

import type { Json } from '../../store/path.js';

/**
 * What an element asks of the desk: a value at a path, or a change of the whole document. Changes
 * with one `joins` in quick succession are undone together.
 */
export type CaseEdit =
  | { readonly path: string; readonly value: Json | undefined }
  | { readonly change: (document: Json) => Json; readonly joins?: string };

/** Sends an edit up to the desk, through shadow roots. */
export const requestEdit = (from: EventTarget, detail: CaseEdit): boolean =>
  from.dispatchEvent(
    new CustomEvent<CaseEdit>('case-edit', { detail, bubbles: true, composed: true }),
  );

declare global {
  interface HTMLElementEventMap {
    'case-edit': CustomEvent<CaseEdit>;
  }
}

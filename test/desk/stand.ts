import type { AxeResults, RunOptions } from 'axe-core';
import 'axe-core';
import type { LitElement } from 'lit';
import type { CaseEdit } from '../../components/desk/fields/case-edit.js';
import type { DeskModel } from '../../components/desk/model/desk-model.js';
import { createCaseStore } from '../../components/store/case-store.js';
import type { Json } from '../../components/store/path.js';
import { sampleDocument } from './sample/case.js';
import { sampleModel } from './sample/model.js';

/** The page's own style sheet, as `index.html` links it. */
const sheet = document.createElement('link');
sheet.rel = 'stylesheet';
sheet.href = '/components/desk/desk.css';
const isStyled = new Promise((done) => sheet.addEventListener('load', done));
document.head.append(sheet);

/** An element on the page of the test, taken away again by `clear`. */
export async function stand<Tag extends keyof HTMLElementTagNameMap>(
  tag: Tag,
  properties: Partial<HTMLElementTagNameMap[Tag]>,
): Promise<HTMLElementTagNameMap[Tag]> {
  await isStyled;
  const element = document.createElement(tag);
  Object.assign(element, properties);
  document.body.append(element);
  await settled(element);
  return element;
}

/** Waits until an element and what it holds have been drawn. */
export async function settled(element: Element): Promise<void> {
  for (let round = 0; round < 3; round += 1) {
    await (element as LitElement).updateComplete;
    await new Promise((done) => requestAnimationFrame(done));
  }
}

export const clear = (): void => document.body.replaceChildren();

/** What axe-core finds wrong with an element, one line each. */
export async function axeFaults(element: Element): Promise<string[]> {
  const { axe } = globalThis as unknown as {
    axe: { run: (at: Element, options: RunOptions) => Promise<AxeResults> };
  };
  const { violations } = await axe.run(element, { rules: { 'target-size': { enabled: true } } });
  return violations
    .filter(({ id }) => id !== 'region' && id !== 'page-has-heading-one')
    .flatMap(({ id, nodes }) =>
      nodes.map(
        ({ target, failureSummary }) => `${id}: ${target.flat().join(' ')}: ${failureSummary}`,
      ),
    );
}

/** Everything an element asks for by `case-edit`. */
export function editsOf(element: EventTarget): CaseEdit[] {
  const edits: CaseEdit[] = [];
  element.addEventListener('case-edit', (event) =>
    edits.push((event as CustomEvent<CaseEdit>).detail),
  );
  return edits;
}

/** Finds inside open shadow roots: each selector is looked up in the root of what was found before. */
export function deep<E extends Element = HTMLElement>(from: Element, ...selectors: string[]): E {
  const found = selectors.reduce<Element | null>(
    (at, selector) =>
      at && ((at.shadowRoot ?? at).querySelector(selector) ?? at.querySelector(selector)),
    from,
  );
  if (!found) throw new Error(`nothing at ${selectors.join(' → ')}`);
  return found as E;
}

export const press = (target: Element, key: string, more: KeyboardEventInit = {}): boolean =>
  target.dispatchEvent(
    new KeyboardEvent('keydown', { key, bubbles: true, composed: true, cancelable: true, ...more }),
  );

/** Types into a field and leaves it. */
export function type(input: HTMLInputElement, text: string): void {
  input.value = text;
  input.dispatchEvent(new Event('input', { bubbles: true }));
  input.dispatchEvent(new Event('change', { bubbles: true }));
}

/** The sample desk, its case edited as given. */
export function modelWith(...edits: [path: string, value: Json][]): DeskModel {
  const store = createCaseStore(
    { document: sampleDocument as unknown as Json, files: {}, fileName: null },
    () => 0,
  );
  for (const [path, value] of edits) store.setAt(path, value);
  return { ...sampleModel, draft: store.state().draft };
}

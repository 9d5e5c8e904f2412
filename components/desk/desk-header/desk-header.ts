import { css, html, LitElement, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import { formatEntry } from '../../charts/format.js';
import type { DeskModel } from '../model/desk-model.js';
import '../fields/text-field.js';

/** What the case menu can ask the desk to do. */
export type DeskCommand = 'open' | 'save' | 'undo' | 'redo' | 'paper';

/** A section of the working paper: its id and its name. */
export interface SectionLink {
  readonly id: string;
  readonly name: string;
}

/**
 * The head of the page: case title and question, the sections, the case menu and the size shown.
 *
 * Properties: `model`, `sections`, `here` (id of the section in view), `canUndo`, `canRedo`,
 * `examples` (names), `status` (a short sentence on saving), `isKept` (whether the browser keeps the case), `paper` (auto, light, dark).
 * Events: `command` (a DeskCommand), `example` (its name), `choose-size` (its name), `case-edit`.
 * Keyboard: native; the desk itself listens for Ctrl+Z, Ctrl+Shift+Z, Ctrl+S, Ctrl+O.
 * Parts: none.
 */
@customElement('desk-header')
export class DeskHeader extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) sections: readonly SectionLink[] = [];
  @property() here = '';
  @property({ type: Boolean }) canUndo = false;
  @property({ type: Boolean }) canRedo = false;
  @property({ attribute: false }) examples: readonly string[] = [];
  @property() status = '';
  /** False while the browser does not keep the case against a crash. */
  @property({ attribute: false }) isKept = true;
  @property() paper = 'auto';

  static override styles = css`
    :host {
      display: block;
      background: var(--paper);
      border-block-end: 1px solid var(--rule);
      padding: 0 1.75rem;
    }
    .line {
      display: flex;
      align-items: baseline;
      gap: 0.35rem 1.4rem;
      min-height: 2.5rem;
      padding-block-start: 0.65rem;
    }
    .mark {
      font-weight: 700;
      font-size: 0.875rem;
      margin: 0;
    }
    .title {
      font-size: 0.875rem;
      flex: 0 1 auto;
      min-width: 6rem;
    }
    .question {
      font-style: italic;
      color: var(--soft);
      flex: 1 1 12rem;
      min-width: 0;
    }
    nav {
      display: flex;
      gap: 0.3rem 1.1rem;
      flex-wrap: wrap;
      margin-inline-start: auto;
    }
    a {
      color: var(--soft);
      text-decoration: none;
      padding-block-end: 0.35rem;
      border-block-end: 2px solid transparent;
    }
    a:hover {
      color: var(--ink);
    }
    a[aria-current] {
      color: var(--ink);
      border-block-end-color: var(--ink);
    }
    .menu {
      display: flex;
      flex-wrap: wrap;
      align-items: baseline;
      gap: 0.2rem 1.1rem;
      padding-block: 0 0.25rem;
      font-size: var(--small);
      color: var(--soft);
    }
    button,
    select {
      font: inherit;
      color: var(--ink);
      background: none;
      border: 0;
      padding: 0;
      min-width: 24px;
      min-height: 24px;
      cursor: pointer;
    }
    select {
      appearance: none;
      field-sizing: content;
      border-block-end: 1px dotted var(--entry-rule);
    }
    option {
      background: var(--paper);
    }
    button:hover:not(:disabled) {
      text-decoration: underline;
      text-underline-offset: 3px;
    }
    button:disabled {
      color: var(--soft);
      opacity: 0.55;
      cursor: default;
    }
    .status {
      flex: 1;
    }
    :focus-visible {
      outline: 2px solid var(--ink);
      outline-offset: 3px;
      border-radius: 1px;
    }
    @media (max-width: 1099px) {
      .line {
        flex-wrap: wrap;
      }
      .question {
        flex-basis: 100%;
        order: 3;
      }
    }
    @media (max-width: 719px) {
      :host {
        padding-inline: 1rem;
      }
      nav {
        margin-inline-start: 0;
      }
    }
  `;

  private send(type: string, detail: string) {
    this.dispatchEvent(new CustomEvent(type, { detail, bubbles: true, composed: true }));
  }

  private command(name: DeskCommand, words: string, enabled = true, keys = '') {
    return html`<button type="button" ?disabled=${!enabled} title=${keys} @click=${() => this.send('command', name)}>${words}</button>`;
  }

  private chosen(type: string) {
    return (event: Event) => {
      const select = event.target as HTMLSelectElement;
      if (select.value) this.send(type, select.value);
      if (type === 'example') select.value = '';
    };
  }

  override render() {
    const { draft, sizeName } = this.model;
    return html`<header>
      <div class="line">
        <h1 class="mark">Stratabeam</h1>
        <text-field inline class="title" .draft=${draft} path="title" label="Title of the case" placeholder="untitled case"></text-field>
        <text-field inline class="question" .draft=${draft} path="question" label="Question" placeholder="what is asked?"></text-field>
        <nav aria-label="Sections">
          ${this.sections.map(({ id, name }) => html`<a href="#${id}" aria-current=${this.here === id ? 'true' : nothing}>${name}</a>`)}
        </nav>
      </div>
      <div class="menu">
        ${this.command('open', 'Open…', true, 'Ctrl+O')} ${this.command('save', 'Save', true, 'Ctrl+S')}
        <label>Examples <select @change=${this.chosen('example')}><option value="">choose</option>${this.examples.map((name) => html`<option value=${name}>${name}</option>`)}</select></label>
        ${this.command('undo', 'Undo', this.canUndo, 'Ctrl+Z')} ${this.command('redo', 'Redo', this.canRedo, 'Ctrl+Shift+Z')}
        <span class="status" role="status">${this.status}${this.isKept ? '' : `${this.status ? '; ' : ''}not kept in this browser: save to a file`}</span>
        <label>size <select @change=${this.chosen('choose-size')}>${sizesOf(draft.case.patient).map(
          ({ name, thickness_mm }) =>
            html`<option value=${name} ?selected=${name === sizeName} .selected=${name === sizeName}>${name}, ${formatEntry(thickness_mm)} mm</option>`,
        )}</select></label>
        ${this.command('paper', `paper: ${this.paper}`)}
      </div>
    </header>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'desk-header': DeskHeader;
  }
}

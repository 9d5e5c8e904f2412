import { html, type TemplateResult } from 'lit';
import { addItem } from '../../store/list-changes.js';
import type { Json } from '../../store/path.js';
import { requestEdit } from '../fields/case-edit.js';

/** A rule from the shipped tables: its name, and the rule as a case holds it. */
interface ShippedRule {
  readonly name: string;
  readonly rule: Json;
}

const found = import.meta.glob<ShippedRule>('../../examples/rules/*.json', {
  eager: true,
  import: 'default',
});

const shipped: readonly ShippedRule[] = Object.entries(found)
  .sort(([a], [b]) => a.localeCompare(b))
  .map(([, rule]) => rule);

/** Adds a rule of the shipped tables to the room, where it can be edited like any other. */
export const shippedRules = (): TemplateResult =>
  html`<select class="plain" aria-label="Add a rule from the shipped tables" @change=${(
    event: Event,
  ) => {
    const select = event.target as HTMLSelectElement;
    const chosen = shipped[Number(select.value)];
    if (chosen) requestEdit(select, { change: addItem('room.rules', chosen.rule) });
    select.value = '';
  }}><option value="" selected>add a rule from the shipped tables</option>${shipped.map(
    ({ name }, i) => html`<option value=${i}>${name}</option>`,
  )}</select>`;

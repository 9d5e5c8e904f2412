import { html, type TemplateResult } from 'lit';
import type { Draft } from '../../store/draft.js';
import type { Choice } from './choice-field.js';
import './choice-field.js';
import './number-field.js';
import './text-field.js';

/** One field of the case, described: where it is, what it is called, how it is entered. */
export type FieldSpec =
  | {
      readonly kind: 'number';
      readonly path: string;
      readonly label: string;
      readonly unit: string;
      readonly step: number;
      readonly empty: string | null;
    }
  | {
      readonly kind: 'choice';
      readonly path: string;
      readonly label: string;
      readonly choices: readonly Choice[];
      readonly numeric: boolean;
    }
  | { readonly kind: 'text'; readonly path: string; readonly label: string };

/** A number; `empty` is what an empty field stands for, where it may be empty. */
export const numberSpec = (
  path: string,
  label: string,
  unit: string,
  step = 1,
  empty: string | null = null,
): FieldSpec => ({
  kind: 'number',
  path,
  label,
  unit,
  step,
  empty,
});

/** A choice; `numeric` where the case holds the chosen figure as a number. */
export const choiceSpec = (
  path: string,
  label: string,
  choices: readonly (string | Choice)[],
  numeric = false,
): FieldSpec => ({
  kind: 'choice',
  numeric,
  path,
  label,
  choices: choices.map((choice) =>
    typeof choice === 'string' ? { value: choice, words: choice } : choice,
  ),
});

export const textSpec = (path: string, label: string): FieldSpec => ({ kind: 'text', path, label });

/** The field of a description. `inline` leaves its label to screen readers: in tables and sentences. */
export function fieldOf(draft: Draft, spec: FieldSpec, inline = false): TemplateResult {
  if (spec.kind === 'number') {
    return html`<number-field ?inline=${inline} .draft=${draft} path=${spec.path} label=${spec.label} unit=${spec.unit} step=${spec.step} .empty=${spec.empty}></number-field>`;
  }
  if (spec.kind === 'choice') {
    return html`<choice-field ?inline=${inline} .draft=${draft} path=${spec.path} label=${spec.label} .choices=${spec.choices}
      .toJson=${spec.numeric ? Number : String}></choice-field>`;
  }
  return html`<text-field ?inline=${inline} .draft=${draft} path=${spec.path} label=${spec.label}></text-field>`;
}

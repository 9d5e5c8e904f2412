import { html, type TemplateResult } from 'lit';
import type { Draft } from '../../store/draft.js';
import { setInPair } from '../../store/pair-changes.js';
import type { Json } from '../../store/path.js';
import './number-field.js';

/** Two numbers of the case that are given together or not at all. */
export interface PairSpec {
  readonly path: string;
  readonly keys: readonly [string, string] | readonly [0, 1];
  readonly labels: readonly [string, string];
  readonly unit: string;
  readonly step: number;
  /** What two empty fields stand for. */
  readonly empty: string;
}

/** The fields of a pair; emptying both takes it away, one alone is a fault at the other. */
export function pairFields(draft: Draft, spec: PairSpec): TemplateResult[] {
  const { path, keys, labels, unit, step, empty } = spec;
  return ([0, 1] as const).map((i) => {
    const at = typeof keys[i] === 'number' ? `${path}[${i}]` : `${path}.${keys[i]}`;
    const edit = (value: Json) => ({ change: setInPair(path, keys, i, value), joins: at });
    return html`<number-field .draft=${draft} path=${at} label=${labels[i]} unit=${unit} step=${step}
      .empty=${empty} .edit=${edit}></number-field>`;
  });
}

import { html, type TemplateResult } from 'lit';
import type { Rule } from '../../../physics/case/schema.js';
import type { Draft } from '../../store/draft.js';
import type { Json } from '../../store/path.js';
import { choiceSpec, fieldOf, numberSpec, textSpec } from '../fields/field-specs.js';
import { addButton, removeButton } from '../fields/list-buttons.js';
import { shippedRules } from './shipped-rules.js';

const provenances = ['measured', 'entered', 'assumed', 'published', 'recalled', 'computed'];

/** A new rule of each kind: the user fills it in from the text that applies where they work. */
const rate: Json = {
  kind: 'kerma-rate',
  limit_mGy_per_min: 88,
  source: 'enter the source',
  date: '',
  provenance: 'recalled',
};
const layer: Json = {
  kind: 'minimum-hvl',
  segments: [
    {
      from_kV: 40,
      to_kV: 150,
      points: [
        [40, 1],
        [150, 4],
      ],
    },
  ],
  source: 'enter the source',
  date: '',
  provenance: 'recalled',
};

function limitOf(draft: Draft, rule: Rule, path: string): TemplateResult {
  if (rule.kind === 'kerma-rate')
    return fieldOf(
      draft,
      numberSpec(`${path}.limit_mGy_per_min`, 'Greatest kerma rate', 'mGy/min'),
      true,
    );
  return html`${rule.segments.map(({ points }, s) =>
    points.map(
      (
        _,
        p,
      ) => html`<span>${fieldOf(draft, numberSpec(`${path}.segments[${s}].points[${p}][0]`, `Potential, point ${p + 1}`, 'kV'), true)}
        ${fieldOf(draft, numberSpec(`${path}.segments[${s}].points[${p}][1]`, `Half-value layer, point ${p + 1}`, 'mm Al', 0.1), true)}</span><br />`,
    ),
  )}`;
}

/** Rules that hold where the room stands: data with source, date and provenance, never a verdict. */
export function rulesTable(draft: Draft): TemplateResult {
  const { rules } = draft.case.room;
  return html`<p class="note">Rules are what you enter from the text that applies to this room; one that is only recalled never counts as met. Compliance is measured, not modelled.</p>
    ${
      rules.length > 0
        ? html`<div class="scroll" tabindex="0" role="region" aria-label="Rules"><table>
          <thead><tr>${['kind', 'bound', 'source', 'date', 'provenance'].map((heading) => html`<th scope="col">${heading}</th>`)}<td></td></tr></thead>
          <tbody>${rules.map((rule, i) => {
            const path = `room.rules[${i}]`;
            return html`<tr>
              <td>${rule.kind === 'kerma-rate' ? 'kerma rate' : 'minimum half-value layer'}</td>
              <td>${limitOf(draft, rule, path)}</td>
              <td>${fieldOf(draft, textSpec(`${path}.source`, `Source, rule ${i + 1}`), true)}</td>
              <td>${fieldOf(draft, textSpec(`${path}.date`, `Date, rule ${i + 1}`), true)}</td>
              <td>${fieldOf(draft, choiceSpec(`${path}.provenance`, `Provenance, rule ${i + 1}`, provenances), true)}</td>
              <td>${removeButton(draft, 'room.rules', i, `rule ${i + 1}`)}</td>
            </tr>`;
          })}</tbody></table></div>`
        : null
    }
    <p class="after">${addButton(draft, 'room.rules', rate, 'a kerma rate')} ${addButton(draft, 'room.rules', layer, 'a minimum half-value layer')} ${shippedRules()}</p>`;
}

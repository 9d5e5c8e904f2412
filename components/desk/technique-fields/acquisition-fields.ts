import { html, nothing, type TemplateResult } from 'lit';
import type { Acquisition } from '../../../physics/case/schema.js';
import { fixedOfKind } from '../../store/technique-changes.js';
import { type DeskModel, evaluationOf } from '../model/desk-model.js';

const modes = ['radiography', 'fluoroscopy', 'subtraction'].map((mode) => ({
  value: mode,
  words: mode,
}));
const splits = [
  { value: 'shortest', words: 'shortest time' },
  { value: 'exposureTime_ms', words: 'time' },
  { value: 'tubeCurrent_mA', words: 'current' },
];

const splitOf = (fixed: Acquisition['fixed']): string =>
  fixed === 'shortest'
    ? 'shortest'
    : 'exposureTime_ms' in fixed
      ? 'exposureTime_ms'
      : 'tubeCurrent_mA';

/**
 * Mode, frames, rate, mask, and which of current and time is fixed, as one sentence with fields.
 */
export function acquisitionFields(model: DeskModel, technique: number): TemplateResult {
  const { draft } = model;
  const { acquisition } = draft.case.techniques[technique];
  const path = `techniques[${technique}].acquisition`;
  const field = (key: string, label: string, unit = '') =>
    html`<number-field inline .draft=${draft} path="${path}.${key}" label=${label} unit=${unit}></number-field>`;
  const split = splitOf(acquisition.fixed);
  const exposure = evaluationOf(model, technique)?.exposure;
  const start: Record<string, number> = {
    exposureTime_ms: exposure?.exposureTime_ms ?? 100,
    tubeCurrent_mA: exposure?.tubeCurrent_mA ?? 100,
  };
  return html`<span class="name">Acquisition</span>
    <span class="sentence"
      ><choice-field inline .draft=${draft} path="${path}.mode" label="Mode" .choices=${modes}></choice-field>,
      ${field('frames', 'Frames')} ${acquisition.frames === 1 ? 'frame' : 'frames'}${
        acquisition.mode === 'radiography'
          ? nothing
          : html` at ${field('frameRate_per_s', 'Frame rate', '/s')}`
      }${
        acquisition.mode === 'subtraction'
          ? html`, ${field('maskFrames', 'Mask frames')} mask`
          : nothing
      };
      fixed
      <choice-field inline .draft=${draft} path="${path}.fixed" label="Fixed" .value=${split} .choices=${splits}
        .toJson=${(chosen: string) => fixedOfKind(chosen, start[chosen] ?? 1)}></choice-field>
      ${split === 'shortest' ? nothing : field(`fixed.${split}`, 'Value fixed', split === 'exposureTime_ms' ? 'ms' : 'mA')}</span
    >`;
}

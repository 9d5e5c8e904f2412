import { html, nothing, type TemplateResult } from 'lit';
import type { Control } from '../../../physics/case/schema.js';
import { formatNumber } from '../../charts/format.js';
import { quantity } from '../../charts/quantities.js';
import { controlOfKind } from '../../store/technique-changes.js';
import type { Choice } from '../fields/choice-field.js';
import { type DeskModel, evaluationOf } from '../model/desk-model.js';

/** What a control can hold, in the words of the case file. */
export type ControlKind =
  | 'detectorAirKerma_uGy'
  | 'detectorSignal'
  | 'incidentAirKerma_mGy'
  | 'tubeLoad_mAs'
  | 'curve';

const kinds: readonly (Choice & { unit: string; step: number })[] = [
  { value: 'detectorAirKerma_uGy', words: 'detector air kerma', unit: 'µGy', step: 0.1 },
  { value: 'detectorSignal', words: 'detector signal', unit: 'keV/mm²', step: 1000 },
  { value: 'incidentAirKerma_mGy', words: 'incident air kerma', unit: 'mGy', step: 0.01 },
  { value: 'tubeLoad_mAs', words: 'tube load', unit: 'mAs', step: 1 },
  { value: 'curve', words: 'control curve', unit: '', step: 1 },
];

/** Which kind of control a technique has. */
export const controlKind = (control: Control): ControlKind =>
  kinds.find(({ value }) => value in control)?.value as ControlKind;

/** What stands in for a number not entered: the value the evaluation found there. */
function found(model: DeskModel, technique: number, kind: ControlKind): number {
  const evaluation = evaluationOf(model, technique);
  const read: Record<ControlKind, number | undefined> = {
    detectorAirKerma_uGy: evaluation?.detector.airKerma_uGy,
    detectorSignal: evaluation?.detector.signal_keV_per_mm2,
    incidentAirKerma_mGy: evaluation?.dose.incidentAirKerma_mGy,
    tubeLoad_mAs: evaluation?.exposure.tubeLoad_mAs,
    curve: undefined,
  };
  return Number((read[kind] ?? 1).toPrecision(3));
}

/**
 * What the room's exposure control holds, and its value per frame. Choosing another kind starts
 * from the value that kind has now, so that nothing jumps.
 */
export function controlFields(model: DeskModel, technique: number): TemplateResult {
  const control = model.draft.case.techniques[technique].control;
  const kind = controlKind(control);
  const path = `techniques[${technique}].control`;
  const { unit, step } = kinds.find(({ value }) => value === kind) ?? kinds[0];
  const names = Object.keys(model.draft.files).filter((name) =>
    name.toLowerCase().endsWith('.csv'),
  );
  const offered = kinds.filter(
    ({ value }) => value !== 'curve' || kind === 'curve' || names.length > 0,
  );
  const evaluation = evaluationOf(model, technique);
  const kerma = evaluation ? quantity('detectorAirKerma').of(evaluation) : null;
  return html`<span class="name">Control holds, per frame</span
    ><span class="pair"
      ><choice-field inline .draft=${model.draft} path=${path} label="Control holds" .value=${kind} .choices=${offered}
        .toJson=${(chosen: string) => controlOfKind(chosen, found(model, technique, chosen as ControlKind), names[0] ?? '')}></choice-field>
      ${
        kind === 'curve'
          ? html`<text-field inline .draft=${model.draft} path="${path}.curve" label="File of the control curve"></text-field>`
          : html`<number-field inline style="--field-size:var(--value)" .draft=${model.draft} path="${path}.${kind}" label="Value held" unit=${unit} step=${step}></number-field>`
      }</span
    >${
      kind === 'detectorAirKerma_uGy'
        ? nothing
        : html`<span class="also">detector air kerma ${formatNumber(kerma)} µGy</span>`
    }`;
}

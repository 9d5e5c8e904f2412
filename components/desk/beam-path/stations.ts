import { html, nothing, type TemplateResult } from 'lit';
import type { Evaluation } from '../../../physics/results.js';
import { quantity } from '../../charts/quantities.js';
import type { SpineLayout } from '../../charts/spine-layout.js';
import { type DeskModel, evaluationOf } from '../model/desk-model.js';
import { acquisitionFields } from '../technique-fields/acquisition-fields.js';
import { controlFields } from '../technique-fields/control-fields.js';
import {
  filterField,
  gridField,
  potentialField,
  techniqueName,
} from '../technique-fields/setting-fields.js';

/** One thing set or read at a place along the beam, once for each side. */
export interface Station {
  readonly id: string;
  readonly anchor: (layout: SpineLayout) => number;
  /** Whether a thin line leads from the row to the place. */
  readonly leader: boolean;
  readonly content: (model: DeskModel, technique: number) => TemplateResult | typeof nothing;
}

/** A computed number with its name above it; the right-hand side also shows its ratio to the left. */
function figure(id: string, name?: string, unit: string | null = null) {
  return (model: DeskModel, technique: number): TemplateResult | typeof nothing => {
    const entry = quantity(id);
    const read = (index: number | null) => {
      const evaluation = evaluationOf(model, index);
      return evaluation ? entry.of(evaluation) : null;
    };
    const value = read(technique);
    const before = read(model.left);
    const compared =
      technique !== model.left && value !== null && before ? value / before : undefined;
    const per = entry.per ? `, ${entry.per}` : '';
    return html`<span class="name">${name ?? entry.name}${per}</span
      ><figure-value quantity=${id} .value=${value} .ratio=${compared} .unit=${unit} ?stale=${model.stale}
        technique=${model.draft.case.techniques[technique].name}></figure-value>`;
  };
}

/** The same, left out altogether while no technique has a value for it. */
function figureIfKnown(id: string) {
  const draw = figure(id);
  return (model: DeskModel, technique: number) =>
    model.weighing?.evaluations.some((evaluation) => quantity(id).of(evaluation) !== null)
      ? draw(model, technique)
      : nothing;
}

const scatterStation: Station['content'] = (model, technique) => {
  const unit = evaluationOf(model, technique)?.scatter.method ?? '';
  return figure('sprBehindGrid', 'Scatter to primary, behind grid', unit)(model, technique);
};

const loadStation: Station['content'] = (model, technique) => {
  const exposure = evaluationOf(model, technique)?.exposure;
  const name = model.draft.case.techniques[technique].name;
  const part = (id: string) =>
    html`<figure-value small quantity=${id} .value=${exposure ? quantity(id).of(evaluationOf(model, technique) as Evaluation) : null} ?stale=${model.stale} technique=${name}></figure-value>`;
  return html`${figure('tubeLoad')(model, technique)}
    <span class="also">${part('tubeCurrent')} · ${part('exposureTime')} · ${part('power')}</span>`;
};

/** From the focal spot down: what stands beside the beam. */
export const stations: readonly Station[] = [
  { id: 'name', anchor: () => 0, leader: false, content: techniqueName },
  { id: 'potential', anchor: (l) => l.tube, leader: true, content: potentialField },
  { id: 'load', anchor: (l) => l.tube + 44, leader: false, content: loadStation },
  { id: 'filter', anchor: (l) => l.filter, leader: true, content: filterField },
  {
    id: 'incident',
    anchor: (l) => l.patient.top,
    leader: true,
    content: figure('incidentAirKerma'),
  },
  {
    id: 'imparted',
    anchor: (l) => l.patient.top + 60,
    leader: false,
    content: figureIfKnown('energyImparted'),
  },
  {
    id: 'subject',
    anchor: (l) => l.detail ?? (l.patient.top + l.patient.bottom) / 2,
    leader: true,
    content: figure('subjectContrast'),
  },
  { id: 'scatter', anchor: (l) => l.patient.bottom, leader: true, content: scatterStation },
  { id: 'grid', anchor: (l) => l.grid, leader: true, content: gridField },
  { id: 'detector', anchor: (l) => l.detector.top, leader: true, content: controlFields },
  { id: 'sdnr', anchor: (l) => l.detector.bottom + 30, leader: false, content: figure('sdnr') },
  { id: 'acquisition', anchor: (l) => l.height, leader: false, content: acquisitionFields },
];

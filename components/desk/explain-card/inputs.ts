import { agent, namedMaterial } from '../../../materials/index.js';
import type { Case, Technique } from '../../../physics/case/schema.js';
import { quantity } from '../../charts/quantities.js';
import { type Draft, isAssumed, shownAt } from '../../store/draft.js';
import type { FieldSpec } from '../fields/field-specs.js';
import type { DeskModel } from '../model/desk-model.js';
import { detectorGroup, geometryGroup, gridGroup } from '../room-section/room-specs.js';

/** One thing a number was computed from, and where that came from. */
export interface InputSaid {
  readonly what: string;
  readonly from: string;
}

/** Quantities for which less than everything along the beam matters, and what does. */
const needs: Readonly<Record<string, readonly (keyof typeof inputs)[]>> = {
  halfValueLayer: ['beam', 'filter', 'attenuation'],
  meanEnergy: ['beam', 'filter', 'attenuation'],
  exitMeanEnergy: ['beam', 'filter', 'geometry', 'patient', 'attenuation'],
  primaryTransmission: ['beam', 'filter', 'geometry', 'patient', 'attenuation'],
  backscatterFactor: ['beam', 'filter', 'geometry', 'patient', 'attenuation'],
};

/**
 * What the quantity `id` of a technique is computed from, down the beam: each entered, assumed,
 * measured, published, recalled or computed, as far as the case can tell.
 */
export function inputsOf(id: string, model: DeskModel, techniqueName: string): InputSaid[] {
  const technique = model.draft.case.techniques.find(({ name }) => name === techniqueName);
  if (!technique) return [];
  const { group } = quantity(id);
  const seesDetail = group === 'detail' || group === 'merit' || id === 'noise' || id === 'sdnr';
  const all = Object.keys(inputs) as (keyof typeof inputs)[];
  const keys = needs[id] ?? all.filter((key) => key !== 'detail' || seesDetail);
  return keys.flatMap((key) => inputs[key](model, technique) ?? []);
}

const inputs = {
  beam: ({ draft, weighing }: DeskModel): InputSaid => {
    const { source, readings } = draft.case.room;
    if (source) return { what: 'Source', from: `entered: ${sourceWords[source.kind]}` };
    const tube = (key: string) => (isAssumed(draft, `room.tube.${key}`) ? 'assumed' : 'entered');
    const fitted = weighing?.calibration
      ? `fitted to ${readings.length === 1 ? 'one reading' : `${readings.length} readings`} of the room (measured)`
      : `output factor ${tube('outputFactor')}, inherent filter ${tube('inherentFilter')}`;
    return {
      what: 'Tube spectrum',
      from: `computed by the tube model, ${fitted}; anode angle ${tube('anodeAngle_deg')}`,
    };
  },
  filter: ({ draft }: DeskModel, technique: Technique): InputSaid => {
    const path = `techniques[${draft.case.techniques.indexOf(technique)}].filter`;
    return { what: 'Added filter', from: isAssumed(draft, path) ? 'assumed' : 'entered' };
  },
  control: (_: DeskModel, { control }: Technique): InputSaid => ({
    what: 'Exposure control',
    from: 'curve' in control ? `entered: curve ${control.curve}` : 'entered',
  }),
  geometry: ({ draft }: DeskModel): InputSaid => ({
    what: 'Geometry',
    from: fieldsSaid(draft, geometryGroup.fields),
  }),
  patient: ({ draft: { case: c } }: DeskModel): InputSaid => ({
    what: 'Patient',
    from: `layers entered; materials ${materialsSaid(c)}`,
  }),
  detail: ({ draft: { case: c } }: DeskModel): InputSaid => {
    const { agent: given } = c.task.detail;
    const known = given && agent(given.name);
    return {
      what: 'Detail',
      from: known ? `entered; its agent’s composition ${known.provenance}` : 'entered',
    };
  },
  grid: ({ draft }: DeskModel, technique: Technique): InputSaid | null => {
    const { grid } = draft.case.room;
    if (!grid || technique.grid === 'out') return null;
    return {
      what: 'Grid',
      from: grid.measured
        ? 'transmissions measured, as entered'
        : `computed from its make-up: ${fieldsSaid(draft, gridGroup.fields)}`,
    };
  },
  detector: ({ draft }: DeskModel): InputSaid => ({
    what: 'Detector',
    from: fieldsSaid(draft, detectorGroup.fields),
  }),
  attenuation: (): InputSaid => ({
    what: 'Attenuation',
    from: 'published: XCOM, NBSIR 87-3597 (1987)',
  }),
};

const sourceWords = {
  monoenergetic: 'photons of one energy',
  lines: 'lines',
  spectrum: 'a spectrum from a file',
} as const;

/** `entered`, `assumed`, or `entered, but assumed: pixel, glare`. */
function fieldsSaid(draft: Draft, fields: readonly FieldSpec[]): string {
  const given = fields.filter(({ path }) => (shownAt(draft, path) ?? null) !== null);
  const assumed = given.filter(({ path }) => isAssumed(draft, path));
  if (assumed.length === 0) return 'entered';
  if (assumed.length === given.length) return 'assumed';
  const few = assumed.length <= 3;
  const labels = assumed.map(({ label }) => label[0].toLowerCase() + label.slice(1));
  return `entered, but ${few ? labels.join(', ') : `${assumed.length} of ${given.length} values`} assumed`;
}

/** Where the compositions of the patient's materials come from, each kind once. */
function materialsSaid(c: Case): string {
  const own = c.materials.map(({ name }) => name);
  const said = c.patient.layers.map(({ material }) =>
    own.includes(material) ? 'entered' : (namedMaterial(material)?.provenance ?? 'entered'),
  );
  return [...new Set(said)].join(' and ');
}

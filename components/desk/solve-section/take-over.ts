import type { Case } from '../../../physics/case/schema.js';
import type { SolveAnswer, SolveQuestion } from '../../../physics/solve.js';
import { formatEntry } from '../../charts/format.js';
import { addItem } from '../../store/list-changes.js';
import { type Json, withValueAt } from '../../store/path.js';
import { adoptSetting } from '../sweep-section/adopt.js';

/** Taking an answer over into the case: what the button says, and the change it makes. */
export interface TakeOver {
  readonly words: string;
  readonly change: (document: Json) => Json;
}

const digits = (value: number): number => Number(value.toPrecision(4));

/** Rounded up, so that what is written still reaches the target. */
const roundedUp = (value: number): number => {
  const step = 10 ** (Math.floor(Math.log10(value)) - 3);
  return Number((Math.ceil(value / step - 1e-9) * step).toPrecision(6));
};

const withAmount =
  (amount: number) =>
  (document: Json): Json =>
    withValueAt(document, 'task.detail.agent.amount.value', amount);

/** How an answer becomes part of the case; null where there is nothing to take over. */
export function takeOver(
  c: Case,
  right: number | null,
  question: SolveQuestion,
  given: SolveAnswer,
): TakeOver | null {
  switch (given.what) {
    case 'bestSetting': {
      const { value } = given.answer;
      if (!value) return null;
      const { potential_kV, filter } = value.setting;
      const kerma_uGy = digits(value.detectorAirKerma_uGy);
      return {
        words: `adopt as ${c.techniques[right ?? 1]?.name ?? 'Proposed'}, its control holding ${formatEntry(kerma_uGy)} µGy`,
        change: adoptSetting(right, { potential_kV, filter, detectorAirKerma_uGy: kerma_uGy }),
      };
    }
    case 'leastAgent': {
      const { value } = given.answer;
      if (!value || value.amount <= 0) return null;
      const amount = roundedUp(value.amount);
      return {
        words: `write ${formatEntry(amount)} ${value.unit} into the task`,
        change: withAmount(amount),
      };
    }
    case 'lessAgent': {
      const { value } = given.answer;
      const { agent } = c.task.detail;
      if (!value || !agent || question.what !== 'lessAgent') return null;
      const amount = digits(agent.amount.value * question.agentShare);
      const { name, filter } = c.techniques[question.technique];
      const adopted = {
        potential_kV: value.roomPotential_kV,
        filter,
        detectorAirKerma_uGy: value.detectorAirKerma_uGy,
      };
      return {
        words: `write ${formatEntry(value.roomPotential_kV)} kV into ${name} and ${formatEntry(amount)} ${agent.amount.unit} into the task`,
        change: (document) =>
          withAmount(amount)(adoptSetting(question.technique, adopted)(document)),
      };
    }
    case 'thickestPatient': {
      const { value } = given.answer;
      if (!value) return null;
      const thickness_mm = Math.floor(value.thickness_mm);
      const { sizes } = c.patient;
      const own = 'file' in sizes ? [] : sizes;
      const name = `${thickness_mm} mm`;
      if (own.length === 0 || own.some((size) => size.name === name)) return null;
      return {
        words: `add ${name} to the size mix, with no weight`,
        change: addItem('patient.sizes', { name, thickness_mm, weight: 0 }),
      };
    }
  }
}

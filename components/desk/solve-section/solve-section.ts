import { html, LitElement, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { HoldConstant } from '../../../physics/results.js';
import type { SolveQuestion } from '../../../physics/solve.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import type { CostName } from '../../../physics/sweep/costs.js';
import { formatEntry } from '../../charts/format.js';
import type { SweepPool } from '../../workers/sweep-pool.js';
import { investigationalWords } from '../curve-panel/curve-data.js';
import { requestEdit } from '../fields/case-edit.js';
import type { Choice } from '../fields/choice-field.js';
import { readNumber } from '../fields/read-number.js';
import { type DeskModel, evaluationOf, sizeShown } from '../model/desk-model.js';
import { chartSheet } from '../sheets/chart-sheet.js';
import { runSheet } from '../sheets/run-sheet.js';
import { sectionSheet } from '../sheets/section-sheet.js';
import { sizesBasis } from '../sizes-section/sizes-ask.js';
import { costChoices, holdChoices } from '../sweep-section/sweep-choices.js';
import { answerWords } from './answer-words.js';
import type { Asked, QuestionKind } from './question-kinds.js';
import { solveSheet } from './solve-sheet.js';
import { takeOver } from './take-over.js';
import '../finding-list/finding-list.js';

/** What can be held equal when potential makes up for agent. */
const evenHolds = holdChoices.filter(({ value }) => value !== 'asSet' && value !== 'sdnr');

/**
 * Questions solved backwards, each run forward again: the best setting, the least agent, the
 * potential for less agent, the thickest patient.
 *
 * Properties: `model`; `pool`, the workers that solve. Events: `case-edit` when an answer is taken
 * over. Keyboard: native fields and buttons; Enter in a field asks. Parts: none.
 */
@customElement('solve-section')
export class SolveSection extends LitElement {
  @property({ attribute: false }) model!: DeskModel;
  @property({ attribute: false }) pool: SweepPool | null = null;

  /** Chosen by the person; null follows the desk. */
  @state() private size: string | null = null;
  @state() private technique: number | null = null;
  @state() private cost: CostName | null = null;
  @state() private hold: HoldConstant = 'sdnr';
  @state() private evenHold: HoldConstant = 'incidentAirKerma';
  @state() private target: number | null = null;
  @state() private share_percent = 95;
  @state() private thickTarget: number | null = null;
  @state() private thickest_mm = 400;
  @state() private asked: Readonly<Partial<Record<QuestionKind, Asked>>> = {};
  private readonly stops = new Map<QuestionKind, AbortController>();

  static override styles = [chartSheet, sectionSheet, runSheet, solveSheet];

  override disconnectedCallback() {
    super.disconnectedCallback();
    for (const stop of this.stops.values()) stop.abort();
  }

  private get techniqueShown(): number {
    const { right, left, draft } = this.model;
    const wanted = this.technique ?? right ?? left;
    return Math.min(wanted, draft.case.techniques.length - 1);
  }

  private get sizeOfQuestions() {
    const sizes = sizesOf(this.model.draft.case.patient);
    return sizes.find(({ name }) => name === this.size) ?? sizeShown(this.model);
  }

  /** What is asked for unless told otherwise: Current's SdNR at the size looked at. */
  private get sdnrWanted(): number {
    const current = evaluationOf(this.model, this.model.left)?.sdnr ?? null;
    return this.target ?? (current === null ? 5 : Number(current.toPrecision(3)));
  }

  private async ask(question: SolveQuestion) {
    const { pool, model } = this;
    const { what } = question;
    if (!pool) return;
    this.stops.get(what)?.abort();
    const stop = new AbortController();
    this.stops.set(what, stop);
    const basis = sizesBasis(model.draft.case);
    this.asked = { ...this.asked, [what]: { phase: 'running', question } };
    try {
      const tasks = [{ kind: 'solve', question } as const];
      const [answer] = await pool.run(model.draft, tasks, { signal: stop.signal, urgent: true });
      this.asked = { ...this.asked, [what]: { phase: 'done', question, answer, basis } };
    } catch (error) {
      if (stop.signal.aborted) return;
      const message = error instanceof Error ? error.message : String(error);
      this.asked = { ...this.asked, [what]: { phase: 'failed', question, message } };
    }
  }

  private cancel(what: QuestionKind) {
    this.stops.get(what)?.abort();
    const { [what]: _, ...others } = this.asked;
    this.asked = others;
  }

  private pick(
    label: string,
    choices: readonly Choice[],
    chosen: string,
    choose: (value: string) => void,
  ) {
    return html`<label class="bare"><span class="unseen">${label}</span><select @change=${(
      event: Event,
    ) => choose((event.target as HTMLSelectElement).value)}>${choices.map(
      ({ value, words }) =>
        html`<option value=${value} .selected=${value === chosen}>${words}</option>`,
    )}</select></label>`;
  }

  private figure(label: string, value: number, take: (value: number) => void) {
    const text = formatEntry(value);
    return html`<label class="bare"><span class="unseen">${label}</span><input type="text" inputmode="decimal" autocomplete="off" style="--chars:${Math.max(2, text.length)}" .value=${text} @change=${(
      event: Event,
    ) => {
      const input = event.target as HTMLInputElement;
      const read = readNumber(input.value, '');
      if (read !== null && read > 0) take(read);
      else input.value = text;
    }} /></label>`;
  }

  private techniques() {
    const choices = this.model.draft.case.techniques.map(({ name }, i) => ({
      value: String(i),
      words: name,
    }));
    return this.pick('Technique', choices, String(this.techniqueShown), (value) => {
      this.technique = Number(value);
    });
  }

  private sizes() {
    const choices = sizesOf(this.model.draft.case.patient).map(({ name }) => ({
      value: name,
      words: name,
    }));
    return this.pick('Size', choices, this.sizeOfQuestions.name, (value) => {
      this.size = value;
    });
  }

  private block(heading: string, sentence: TemplateResult, question: SolveQuestion) {
    const asked = this.asked[question.what];
    const isRunning = asked?.phase === 'running';
    return html`<div>
      <h3>${heading}</h3>
      <p class="ask" @keydown=${(event: KeyboardEvent) => {
        if (event.key === 'Enter' && event.target instanceof HTMLInputElement) event.target.blur();
      }}>${sentence}</p>
      <p class="go"><button type="button" class="plain" ?disabled=${this.pool === null} @click=${() =>
        isRunning
          ? this.cancel(question.what)
          : void this.ask(question)}>${isRunning ? 'Cancel' : 'Solve'}</button></p>
      <div aria-live="polite">${asked ? this.answer(asked) : nothing}</div>
    </div>`;
  }

  private answer(asked: Asked) {
    if (asked.phase === 'running') return html`<p class="answer incomplete">solving …</p>`;
    if (asked.phase === 'failed')
      return html`<p class="answer">Could not be solved: ${asked.message}</p>`;
    const { case: c } = this.model.draft;
    const { answer, question, basis } = asked;
    const isStale = basis !== sizesBasis(c);
    const { found, more, forward } = answerWords(c, question, answer);
    const over = isStale ? null : takeOver(c, this.model.right, question, answer);
    return html`<div class="answer ${isStale ? 'stale' : ''}">
      ${isStale ? html`<p class="incomplete">stale: the case has changed since</p>` : nothing}
      <p><span class="found">${found ?? 'No answer within the limits.'}</span> ${more}</p>
      ${forward ? html`<p class="forward">${forward}</p>` : nothing}
      ${over ? html`<p><button type="button" class="plain" @click=${() => requestEdit(this, { change: over.change })}>${over.words}</button></p>` : nothing}
      <finding-list .findings=${answer.answer.findings} ?stale=${isStale}></finding-list>
    </div>`;
  }

  override render() {
    const { case: c } = this.model.draft;
    const size = this.sizeOfQuestions;
    const technique = this.techniqueShown;
    const { agent } = c.task.detail;
    const investigational = investigationalWords(c);
    const cost = this.cost ?? c.compare.primaryDose;
    const thinnest_mm = Math.min(...sizesOf(c.patient).map(({ thickness_mm }) => thickness_mm));
    const thickTarget = this.thickTarget ?? c.task.roseThreshold;
    return html`<section aria-labelledby="heading">
      <h2 id="heading">Solve</h2>
      <div>
        <p class="note">Each answer is run forward again and shown beside its target; where a limit stops it, the limit is named.${investigational ? html` <b>${investigational}.</b>` : nothing}</p>
        <div class="questions">
          ${this.block(
            'Best setting',
            html`The allowed setting with most SdNR² per ${this.pick(
              'Cost',
              costChoices,
              cost,
              (value) => {
                this.cost = value as CostName;
              },
            )}, ${this.pick('Held constant', holdChoices, this.hold, (value) => {
              this.hold = value as HoldConstant;
            })}, size ${this.sizes()}`,
            { what: 'bestSetting', size, cost, holdConstant: this.hold },
          )}
          ${
            agent
              ? [
                  this.block(
                    `Least ${agent.name}`,
                    html`The smallest amount with which ${this.techniques()} as set reaches SdNR ${this.figure(
                      'Target SdNR',
                      this.sdnrWanted,
                      (value) => {
                        this.target = value;
                      },
                    )}, size ${this.sizes()}`,
                    { what: 'leastAgent', size, technique, targetSdnr: this.sdnrWanted },
                  ),
                  this.block(
                    `Potential for less ${agent.name}`,
                    html`The potential at which ${this.techniques()} with ${this.figure(
                      'Share of the agent in percent',
                      this.share_percent,
                      (value) => {
                        this.share_percent = value;
                      },
                    )} % of it keeps its SdNR, ${this.pick(
                      'Held constant',
                      evenHolds,
                      this.evenHold,
                      (value) => {
                        this.evenHold = value as HoldConstant;
                      },
                    )}, size ${this.sizes()}`,
                    {
                      what: 'lessAgent',
                      size,
                      technique,
                      agentShare: this.share_percent / 100,
                      holdConstant: this.evenHold as Exclude<HoldConstant, 'asSet' | 'sdnr'>,
                    },
                  ),
                ]
              : nothing
          }
          ${this.block(
            'Thickest patient',
            html`The thickest patient, up to ${this.figure(
              'Thickest looked for, in mm',
              this.thickest_mm,
              (value) => {
                this.thickest_mm = value;
              },
            )} mm, in whom ${this.techniques()} as set reaches SdNR ${this.figure(
              'Target SdNR for the thickest patient',
              thickTarget,
              (value) => {
                this.thickTarget = value;
              },
            )}`,
            {
              what: 'thickestPatient',
              technique,
              targetSdnr: thickTarget,
              thinnest_mm: Math.min(thinnest_mm, this.thickest_mm),
              thickest_mm: this.thickest_mm,
            },
          )}
        </div>
      </div>
    </section>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'solve-section': SolveSection;
  }
}

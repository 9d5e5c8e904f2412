import { html, nothing, type TemplateResult } from 'lit';
import type { Fault } from '../../../physics/case/fault.js';

/** A fault beneath its field: what must hold, and what to do. The path is said for search. */
export const faultNote = (fault: Fault | undefined): TemplateResult | typeof nothing =>
  fault
    ? html`<p class="fault" id="fault" role="alert" title=${fault.path}>${fault.rule}; ${fault.remedy}</p>`
    : nothing;

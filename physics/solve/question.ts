import type { Case, Size } from '../case/schema.js';
import type { HoldConstant } from '../results.js';
import type { CostName } from '../sweep/costs.js';
import type { Answer } from './answer.js';
import { type BestSetting, bestSetting } from './best-setting.js';
import { type LeastAgent, leastAgentAmount } from './least-agent.js';
import { type EqualPotential, potentialForLessAgent } from './less-agent.js';
import { type ThickestPatient, thickestPatient } from './thickest-patient.js';

/** What can be solved for; techniques by their number in the case. */
export type SolveQuestion =
  | {
      readonly what: 'bestSetting';
      readonly size: Size;
      readonly cost: CostName;
      readonly holdConstant: HoldConstant;
    }
  | {
      readonly what: 'leastAgent';
      readonly size: Size;
      readonly technique: number;
      readonly targetSdnr: number;
    }
  | {
      readonly what: 'lessAgent';
      readonly size: Size;
      readonly technique: number;
      readonly agentShare: number;
      readonly holdConstant: Exclude<HoldConstant, 'asSet' | 'sdnr'>;
    }
  | {
      readonly what: 'thickestPatient';
      readonly technique: number;
      readonly targetSdnr: number;
      readonly thinnest_mm: number;
      readonly thickest_mm: number;
    };

/** The answer, with the question it belongs to. */
export type SolveAnswer =
  | { readonly what: 'bestSetting'; readonly answer: Answer<BestSetting> }
  | { readonly what: 'leastAgent'; readonly answer: Answer<LeastAgent> }
  | { readonly what: 'lessAgent'; readonly answer: Answer<EqualPotential> }
  | { readonly what: 'thickestPatient'; readonly answer: Answer<ThickestPatient> };

/** Solves a question about a case. */
export const solve = (c: Case, question: SolveQuestion): SolveAnswer => {
  const { what } = question;
  switch (what) {
    case 'bestSetting': {
      const { size, cost, holdConstant } = question;
      return { what, answer: bestSetting(c, size, cost, holdConstant) };
    }
    case 'leastAgent': {
      const { size, technique, targetSdnr } = question;
      return { what, answer: leastAgentAmount(c, c.techniques[technique], size, targetSdnr) };
    }
    case 'lessAgent': {
      const { size, technique, agentShare, holdConstant } = question;
      const own = c.techniques[technique];
      return { what, answer: potentialForLessAgent(c, own, size, agentShare, holdConstant) };
    }
    case 'thickestPatient': {
      const { technique, targetSdnr, thinnest_mm, thickest_mm } = question;
      const own = c.techniques[technique];
      return { what, answer: thickestPatient(c, own, targetSdnr, thinnest_mm, thickest_mm) };
    }
  }
};

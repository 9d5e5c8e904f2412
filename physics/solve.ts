export type { Answer } from './solve/answer.js';
export { type BestSetting, bestSetting } from './solve/best-setting.js';
export { type LeastAgent, leastAgentAmount } from './solve/least-agent.js';
export { type EqualPotential, potentialForLessAgent } from './solve/less-agent.js';
export { type SolveAnswer, type SolveQuestion, solve } from './solve/question.js';
export { type ThickestPatient, thickestPatient } from './solve/thickest-patient.js';

/** Thrown after the answer is printed: a Proposed technique is forbidden or a check fell short. */
export class Shortfall extends Error {}

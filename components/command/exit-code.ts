/** Done; a Proposed technique is forbidden or a check fell short; bad input. */
export const exitCode = { done: 0, fellShort: 1, badInput: 2 } as const;

export type ExitCode = (typeof exitCode)[keyof typeof exitCode];

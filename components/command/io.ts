/** What a command may do to the outside world; tests hand in their own. */
export interface Io {
  readonly out: (text: string) => void;
  readonly err: (text: string) => void;
  /** Text of a file; throws when it cannot be read. */
  readonly readFile: (path: string) => string;
  /** How far a long command has come, in place of the line before; absent where nobody looks. */
  readonly progress?: (line: string) => void;
}

/** What a command may do to the outside world; tests hand in their own. */
export interface Io {
  readonly out: (text: string) => void;
  readonly err: (text: string) => void;
  /** Text of a file; throws when it cannot be read. */
  readonly readFile: (path: string) => string;
}

import type { Fault } from './fault.js';
import { deepestNesting } from './plain-json.js';
import { shortText } from './printed.js';

/**
 * JSON text (RFC 8259) into a value, or the first place where it is not JSON. Stricter than
 * `JSON.parse` in one thing, which would silently keep the last: a key must not stand twice in one
 * object. Faults carry line and column, which `JSON.parse` words differently in every engine.
 */
export const readJson = (text: string): { readonly value: unknown } | { readonly fault: Fault } => {
  const reader = new Reader(text.replace(/^\ufeff/, ''));
  try {
    return { value: reader.document() };
  } catch (error) {
    if (error instanceof Misread) return { fault: reader.faultOf(error) };
    throw error;
  }
};

class Misread extends Error {
  constructor(
    readonly at: number,
    readonly rule: string,
    readonly remedy: string,
  ) {
    super(rule);
  }
}

const number = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
// Up to the closing quote; `JSON.parse` then judges escapes and control characters.
const string = /"(?:[^"\\]|\\.)*"/sy;
const word = /[A-Za-z_+\-.\d]+/y;
const space = /[ \t\n\r]*/y;
const literals: Readonly<Record<string, unknown>> = { true: true, false: false, null: null };

/** Reads one text from front to back; a class because the place in the text runs through all of it. */
class Reader {
  private at = 0;

  constructor(private readonly text: string) {}

  document(): unknown {
    const value = this.value(0);
    if (this.at < this.text.length) {
      throw this.misread('must end after the closing bracket', 'remove what follows');
    }
    return value;
  }

  faultOf({ at, rule, remedy }: Misread): Fault {
    const before = this.text.slice(0, at).split('\n');
    const found = this.text.slice(at, at + 20).split('\n')[0];
    return {
      path: `line ${before.length}, column ${before[before.length - 1].length + 1}`,
      value: found === '' ? 'nothing more' : shortText(found),
      rule,
      remedy,
    };
  }

  private value(depth: number): unknown {
    this.skip(space);
    const next = this.text[this.at];
    if (next === undefined) throw this.cutShort();
    if (depth > deepestNesting) {
      throw this.misread(
        `must not nest deeper than ${deepestNesting} levels`,
        'take out the needless brackets',
      );
    }
    const value =
      next === '{'
        ? this.object(depth)
        : next === '['
          ? this.list(depth)
          : next === '"'
            ? this.string()
            : this.numberOrWord();
    this.skip(space);
    return value;
  }

  private object(depth: number): Record<string, unknown> {
    const entries = new Map<string, unknown>();
    this.members('}', () => {
      const start = this.at;
      if (this.text[start] !== '"')
        throw this.misread('must be a key', 'put the key in double quotes');
      const key = this.string();
      if (entries.has(key)) {
        throw this.misread('must not stand twice in one object', 'keep one of the two', start);
      }
      this.skip(space);
      if (this.text[this.at] !== ':') throw this.misread('must be a colon', 'write "key": value');
      this.at++;
      entries.set(key, this.value(depth + 1));
    });
    return Object.fromEntries(entries);
  }

  private list(depth: number): unknown[] {
    const items: unknown[] = [];
    this.members(']', () => {
      items.push(this.value(depth + 1));
    });
    return items;
  }

  /** What stands between brackets, separated by commas. */
  private members(close: '}' | ']', member: () => void): void {
    this.at++;
    this.skip(space);
    if (this.text[this.at] === close) {
      this.at++;
      return;
    }
    for (;;) {
      this.skip(space);
      if (this.text[this.at] === close) {
        throw this.misread('must be another entry', 'remove the comma before it');
      }
      if (this.at >= this.text.length) throw this.cutShort();
      member();
      this.skip(space);
      const mark = this.text[this.at];
      if (mark === undefined) throw this.cutShort();
      if (mark !== ',' && mark !== close) {
        throw this.misread(`must be "," or "${close}"`, 'put a comma between entries');
      }
      this.at++;
      if (mark === close) return;
    }
  }

  private string(): string {
    const start = this.at;
    const written = this.take(string);
    if (written === undefined)
      throw this.misread('must be text in double quotes', 'close the quotes');
    try {
      return JSON.parse(written) as string;
    } catch {
      throw this.misread('must be JSON text', 'write line breaks as \\n and \\ as \\\\', start);
    }
  }

  private numberOrWord(): unknown {
    const start = this.at;
    const written = this.take(word) ?? '';
    if (Object.hasOwn(literals, written)) return literals[written];
    number.lastIndex = 0;
    const digits = number.exec(written)?.[0];
    if (digits !== undefined && digits === written) return Number(digits);
    const remedy = /^\d+$/.test(written.replace(/^0+/, ''))
      ? 'write the number without leading zeros'
      : this.text[this.at] === ',' || written === ''
        ? 'enter a number, text in double quotes, true, false or null'
        : 'write numbers with digits and a decimal point, text in double quotes';
    throw this.misread('must be a value', remedy, start);
  }

  private take(pattern: RegExp): string | undefined {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.text)?.[0];
    if (found !== undefined) this.at += found.length;
    return found;
  }

  private skip(pattern: RegExp): void {
    this.take(pattern);
  }

  private cutShort(): Misread {
    return this.misread('must not end here', 'close every bracket, or save the file again');
  }

  private misread(rule: string, remedy: string, at = this.at): Misread {
    return new Misread(at, rule, remedy);
  }
}

/** Answers of the command line quoted in README.md: kept true by `npm run tables`. */

/** A block that begins with a command; lines of `…` stand for what is left out. */
const block = /(?<=^```\n\$ npm run --silent stratabeam -- )(?<words>.+)\n(?<quoted>[\s\S]*?)(?=^```$)/gm;

/** Words of a command line, double quotes taken off. */
export const wordsOf = (line: string): string[] =>
  [...line.matchAll(/"([^"]*)"|(\S+)/g)].map(([, quoted, bare]) => quoted ?? bare);

/** Every command quoted in a page, as its words. */
export const quotedCommands = (page: string): string[] =>
  [...page.matchAll(block)].map(({ groups }) => groups?.words ?? '');

/** The page with each quoted line replaced by the line of today's output that says the same thing. */
export const withOutputs = (page: string, outputs: ReadonlyMap<string, string>): string =>
  page.replace(block, (_, words: string, quoted: string) => {
    const output = (outputs.get(words) ?? '').split('\n');
    let from = 0;
    const lines = quoted
      .trimEnd()
      .split('\n')
      .map((line) => {
        if (line === '…') return line;
        const at = output.findIndex((other, index) => index >= from && sense(other) === sense(line));
        if (at < 0) throw new Error(`README.md, ${words}: nothing is printed like: ${line}`);
        from = at + 1;
        return output[at];
      });
    return `${words}\n${lines.join('\n')}\n`;
  });

/** What a line says without its numbers, rules and blanks. */
const sense = (line: string): string =>
  line
    .replace(/\b[0-9a-f]{64}\b/g, '#')
    .replace(/(?<![\w.])-?\d[\d.]*(e-?\d+)?(?!\w)/g, '#')
    .replace(/─+/g, '─')
    .replace(/\s+/g, ' ')
    .trim();

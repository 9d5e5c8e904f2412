import { readFileSync, writeFileSync } from 'node:fs';
import { caseJsonSchema, parseCaseText } from '../../physics/case/index.js';
import { weigh } from '../../physics/weigh.js';
import { runCommand } from '../command/run-command.js';
import { withCaseKeys } from './case-keys.js';
import { exampleTables, withExampleTables } from './example-tables.js';
import { packedReference } from './pack-reference.js';
import { quotedCommands, withOutputs, wordsOf } from './readme-outputs.js';

/**
 * `npm run tables`: writes what is shipped and made from something else: the JSON Schema of the case
 * file and the page of its keys, the reference values of the checks, the tables on the page of worked
 * cases, the answers quoted in README. A test of each says when it is out of date. What a page says
 * around its numbers must be read again by a person.
 */
const urlOf = (path: string): URL => new URL(`../../${path}`, import.meta.url);
const read = (path: string): string => readFileSync(urlOf(path), 'utf8');
const write = (path: string, text: string): void => writeFileSync(urlOf(path), text);

write('physics/case/case.schema.json', `${JSON.stringify(caseJsonSchema(), null, 2)}\n`);
write('physics/checks/packed-reference.ts', packedReference());

const page = 'components/examples/README.md';
write(
  page,
  withExampleTables(read(page), (name) => {
    const parsed = parseCaseText(read(`components/examples/${name}.case.json`));
    if ('faults' in parsed) throw new Error(`${name}: is not a sound case`);
    return exampleTables(weigh(parsed));
  }),
);

const keysPage = 'components/examples/MINIMAL.md';
write(keysPage, withCaseKeys(read(keysPage)));

const readme = read('README.md');
const outputs = new Map<string, string>();
for (const words of quotedCommands(readme)) {
  outputs.set(words, (await runCommand(wordsOf(words))).out);
}
write('README.md', withOutputs(readme, outputs));

import { readFileSync, writeFileSync } from 'node:fs';
import { caseJsonSchema, parseCaseText } from '../../physics/case/index.js';
import { weigh } from '../../physics/weigh.js';
import { exampleTables, withExampleTables } from './example-tables.js';
import { packedReference } from './pack-reference.js';

/**
 * `npm run tables`: writes what is shipped and made from something else: the JSON Schema of the case
 * file, the reference values of the checks, the tables on the page of worked cases. A test of each
 * says when it is out of date. What the page says around its tables must be read again by a person.
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

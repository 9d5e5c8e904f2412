import { writeFileSync } from 'node:fs';
import { caseJsonSchema } from '../../physics/case/index.js';
import { packedReference } from './pack-reference.js';

/**
 * `npm run tables`: writes the files that are shipped from what is kept elsewhere. A test of each
 * says when it is out of date.
 */
const write = (path: string, text: string): void =>
  writeFileSync(new URL(`../../${path}`, import.meta.url), text);

write('physics/case/case.schema.json', `${JSON.stringify(caseJsonSchema(), null, 2)}\n`);
write('physics/checks/packed-reference.ts', packedReference());

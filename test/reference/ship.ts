import { writeFileSync } from 'node:fs';
import { caseJsonSchema } from '../../physics/case/index.js';

/**
 * `npm run tables`: writes the files that are shipped from what is kept elsewhere. A test of each
 * says when it is out of date.
 */
const root = new URL('../../', import.meta.url);

writeFileSync(
  new URL('physics/case/case.schema.json', root),
  `${JSON.stringify(caseJsonSchema(), null, 2)}\n`,
);

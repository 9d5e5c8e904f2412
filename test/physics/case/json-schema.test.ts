import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { caseJsonSchema } from '../../../physics/case/index.js';

interface Node {
  readonly required?: readonly string[];
  readonly properties?: Readonly<Record<string, Node>>;
  readonly additionalProperties?: boolean;
  readonly default?: unknown;
  readonly anyOf?: readonly Node[];
}

const schema = caseJsonSchema() as Node;

describe('the JSON Schema of the case file', () => {
  it('that is shipped is the one the parser uses', () => {
    const url = new URL('../../../physics/case/case.schema.json', import.meta.url);
    expect(JSON.parse(readFileSync(url, 'utf8'))).toEqual(schema);
  });

  it('asks for no more than a file must say and refuses unknown keys', () => {
    expect(schema.required).toEqual(['format', 'version', 'patient', 'task', 'techniques']);
    expect(schema.additionalProperties).toBe(false);
  });

  it('tells the defaults', () => {
    const tube = schema.properties?.room.properties?.tube.properties;
    expect(tube?.anodeAngle_deg.default).toBe(12);
  });

  it('lets the sizes be rows or a file', () => {
    const sizes = schema.properties?.patient.properties?.sizes;
    expect(sizes?.anyOf?.[1].properties).toHaveProperty('file');
  });
});

import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { caseJsonSchema } from '../../../physics/case/index.js';

interface Node {
  readonly required?: readonly string[];
  readonly properties?: Readonly<Record<string, Node>>;
  readonly additionalProperties?: boolean;
  readonly default?: unknown;
  readonly description?: string;
  readonly anyOf?: readonly Node[];
  readonly oneOf?: readonly Node[];
  readonly items?: Node;
}

/** Every key of every object below a place in the schema. */
const keysBelow = (node: Node, path: string): { path: string; description: string }[] => [
  ...Object.entries(node.properties ?? {}).flatMap(([key, child]) => [
    { path: `${path}.${key}`, description: child.description ?? '' },
    ...keysBelow(child, `${path}.${key}`),
  ]),
  ...[...(node.anyOf ?? []), ...(node.oneOf ?? []), ...(node.items ? [node.items] : [])].flatMap(
    (child) => keysBelow(child, path),
  ),
];

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

  it('describes every key in a sentence', () => {
    const keys = keysBelow(schema, 'case');
    expect(keys.length).toBeGreaterThan(150);
    expect(keys.filter(({ description }) => !/^.{8,}\.$/.test(description))).toEqual([]);
  });

  it('names the unit of every key that ends in one', () => {
    const units: Readonly<Record<string, RegExp>> = {
      _mm: /\bmm\b/,
      _kV: /\bkV\b/,
      _mA: /\bmA\b/,
      _ms: /\bms\b/,
      _uGy: /µGy/,
      _percent: /percent/,
      _deg: /degrees/,
      _keV: /\bkeV\b/,
    };
    const keys = keysBelow(schema, 'case');
    const hasKeys = (at: string) => keys.some(({ path }) => path.startsWith(`${at}.`));
    for (const { path, description } of keys) {
      const unit = units[/_[A-Za-z]+$/.exec(path)?.[0] ?? ''];
      if (unit && !hasKeys(path)) expect(description, path).toMatch(unit);
    }
  });
});

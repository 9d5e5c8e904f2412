import type { Json } from '../../store/path.js';
import { valueAtPath } from '../../store/path.js';
import { newCase } from './new-case.js';

/** A worked case that comes with the desk. */
export interface Example {
  readonly name: string;
  readonly document: Json;
}

const found = import.meta.glob<Json>('../../examples/*.case.json', {
  eager: true,
  import: 'default',
});

/** The worked cases in order of their file names, then a new case. */
export const examples: readonly Example[] = [
  ...Object.entries(found)
    .sort(([a], [b]) => a.localeCompare(b))
    .map(([path, document]) => ({
      name: String(valueAtPath(document, 'title') || path),
      document,
    })),
  { name: 'New case', document: newCase },
];

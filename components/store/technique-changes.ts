import { type Json, valueAtPath, withValueAt } from './path.js';

type Change = (document: Json) => Json;

/** A control of another kind, holding `value`; a curve names its file. */
export const controlOfKind = (kind: string, value: number, file: string): Json =>
  kind === 'curve' ? { curve: file } : { [kind]: value };

/** What fixes the split of tube load: the shortest time, or a time or current of `value`. */
export const fixedOfKind = (kind: string, value: number): Json =>
  kind === 'shortest' ? 'shortest' : { [kind]: Number(value.toPrecision(3)) };

/** A technique under another name; measured checks that name it follow. */
export const renameTechnique =
  (index: number, name: string): Change =>
  (document) => {
    const before = valueAtPath(document, `techniques[${index}].name`);
    const checks = valueAtPath(document, 'measuredChecks');
    const renamed = withValueAt(document, `techniques[${index}].name`, name);
    if (!Array.isArray(checks)) return renamed;
    return checks.reduce<Json>(
      (json, _, i) =>
        valueAtPath(json, `measuredChecks[${i}].technique`) === before
          ? withValueAt(json, `measuredChecks[${i}].technique`, name)
          : json,
      renamed,
    );
  };

/** One more technique, beginning as a copy of number `from` under a name not yet taken. */
export const addTechnique =
  (from: number): Change =>
  (document) => {
    const techniques = valueAtPath(document, 'techniques');
    if (!Array.isArray(techniques)) return document;
    const names = techniques.map((entry) => valueAtPath(entry, 'name'));
    const wanted = ['Proposed', ...Array.from({ length: 99 }, (_, i) => `Proposed ${i + 2}`)];
    const name = wanted.find((candidate) => !names.includes(candidate)) ?? 'Proposed';
    return withValueAt(document, 'techniques', [
      ...techniques,
      withValueAt(techniques[from], 'name', name),
    ]);
  };

/** The techniques without number `index`; the last one stays. */
export const removeTechnique =
  (index: number): Change =>
  (document) => {
    const techniques = valueAtPath(document, 'techniques');
    if (!Array.isArray(techniques) || techniques.length < 2) return document;
    return withValueAt(
      document,
      'techniques',
      techniques.filter((_, i) => i !== index),
    );
  };

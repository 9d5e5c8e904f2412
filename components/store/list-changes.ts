import { type Json, valueAtPath, withValueAt } from './path.js';

type Change = (document: Json) => Json;

/** One more item at the end of the list at `path`; `known` is the list a silent case assumes there. */
export const addItem =
  (path: string, item: Json, known: readonly Json[] = []): Change =>
  (document) => {
    const list = valueAtPath(document, path) ?? known;
    return withValueAt(document, path, [...(Array.isArray(list) ? list : []), item]);
  };

/** More items at the end of the list at `path`. */
export const addItems =
  (path: string, items: readonly Json[]): Change =>
  (document) =>
    items.reduce<Json>((json, item) => addItem(path, item)(json), document);

/** The list at `path` without item `index`. */
export const removeItem =
  (path: string, index: number, known: readonly Json[] = []): Change =>
  (document) => {
    const list = valueAtPath(document, path) ?? known;
    return Array.isArray(list)
      ? withValueAt(
          document,
          path,
          list.filter((_, i) => i !== index),
        )
      : document;
  };

/** A filter of the room under another name; techniques and readings that use it follow. */
export const renameFilter =
  (index: number, name: string): Change =>
  (document) => {
    const before = valueAtPath(document, `room.filters[${index}].name`);
    const follow = (json: Json, list: string): Json => {
      const items = valueAtPath(json, list);
      if (!Array.isArray(items)) return json;
      const renamed = items.map((item) =>
        valueAtPath(item, 'filter') === before ? withValueAt(item, 'filter', name) : item,
      );
      return withValueAt(json, list, renamed);
    };
    const renamed = withValueAt(document, `room.filters[${index}].name`, name);
    return follow(follow(renamed, 'techniques'), 'room.readings');
  };

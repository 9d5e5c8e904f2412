/** A store of values that belong to several objects together. */
export class KeptBy<V> {
  private readonly root = new WeakMap<object, unknown>();

  /**
   * The value that belongs to these objects, made when first asked for. It lives as long as they
   * do, so nothing needs to be cleared. Identity decides: `sharedWith` gives unchanged parts of an
   * edited case their old identity.
   */
  get(keys: readonly object[], make: () => V): V {
    let node: WeakMap<object, unknown> = this.root;
    for (const key of keys.slice(0, -1)) {
      let next = node.get(key) as WeakMap<object, unknown> | undefined;
      if (!next) {
        next = new WeakMap();
        node.set(key, next);
      }
      node = next;
    }
    const last = keys[keys.length - 1];
    if (!node.has(last)) node.set(last, make());
    return node.get(last) as V;
  }
}

/** Stands for "nothing" where a key is needed. */
export const nothing: object = Object.freeze({});

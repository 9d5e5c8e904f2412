/** What `kept` needs of a Map or a WeakMap. */
interface Store<K, V> {
  get(key: K): V | undefined;
  set(key: K, value: V): unknown;
}

/** The value stored under a key; made and stored when first asked for. */
export function kept<K, V>(store: Store<K, V>, key: K, make: () => V): V {
  let value = store.get(key);
  if (value === undefined) {
    value = make();
    store.set(key, value);
  }
  return value;
}

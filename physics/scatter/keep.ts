interface Store<Key, Value> {
  get(key: Key): Value | undefined;
  set(key: Key, value: Value): unknown;
}

/** The value stored under a key, made and stored when first asked for. */
export function keep<Key, Value>(store: Store<Key, Value>, key: Key, make: () => Value): Value {
  const stored = store.get(key);
  if (stored !== undefined) return stored;
  const value = make();
  store.set(key, value);
  return value;
}

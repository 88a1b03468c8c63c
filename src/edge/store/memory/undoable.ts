/** What was changed, so that it can be taken back: the last change first. */
export interface Undoable {
  readonly set: <K, V>(map: Map<K, V>, key: K, value: V) => void;
  readonly remove: <K>(map: Map<K, unknown>, key: K) => void;
  readonly push: <V>(list: V[], value: V) => void;
  readonly undo: () => void;
}

/** Begins to remember changes of lists and maps. */
export function makeUndoable(): Undoable {
  const steps: (() => void)[] = [];
  const remember = <K, V>(map: Map<K, V>, key: K): void => {
    const before = map.get(key);
    const had = map.has(key);
    steps.push(() => (had ? void map.set(key, before as V) : void map.delete(key)));
  };
  return {
    set: (map, key, value) => {
      remember(map, key);
      map.set(key, value);
    },
    remove: (map, key) => {
      remember(map, key);
      map.delete(key);
    },
    push: (list, value) => {
      list.push(value);
      steps.push(() => void list.pop());
    },
    undo: () => {
      for (const step of steps.splice(0).toReversed()) step();
    },
  };
}

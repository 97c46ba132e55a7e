/** Whole numbers that come back lowest key first. */
export interface KeyHeap {
  push: (key: number, item: number) => void;
  /** The item with the lowest key; -1 when there is none. */
  pop: () => number;
}

/**
 * A binary heap on growing arrays.
 *
 * @returns an empty heap
 */
export function createKeyHeap(): KeyHeap {
  const keys: number[] = [];
  const items: number[] = [];
  const keyAt = (at: number): number => keys[at] ?? Infinity;
  function put(at: number, key: number, item: number): void {
    keys[at] = key;
    items[at] = item;
  }
  return {
    push(key, item) {
      let at = keys.length;
      while (at > 0) {
        const up = (at - 1) >> 1;
        if (keyAt(up) <= key) break;
        put(at, keyAt(up), items[up] ?? -1);
        at = up;
      }
      put(at, key, item);
    },
    pop() {
      const top = items[0] ?? -1;
      const key = keys.pop();
      const item = items.pop();
      if (key === undefined || item === undefined || keys.length === 0) return top;
      let at = 0;
      for (;;) {
        const left = 2 * at + 1;
        const least = keyAt(left + 1) < keyAt(left) ? left + 1 : left;
        if (keyAt(least) >= key) break;
        put(at, keyAt(least), items[least] ?? -1);
        at = least;
      }
      put(at, key, item);
      return top;
    },
  };
}

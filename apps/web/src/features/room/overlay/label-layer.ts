interface Size {
  width: number;
  height: number;
}

/** Elements of a layer by what they are and whose: found and measured once, however often they are moved. */
export interface LabelLayer {
  /** After the layer was drawn anew: its elements are others, or of another size. */
  renew: (root: Element | null) => void;
  find: <E extends Element>(kind: string, id: string) => E | null;
  sizeOf: (kind: string, id: string) => Size;
}

export function createLabelLayer(): LabelLayer {
  let root: Element | null = null;
  const elements = new Map<string, Element | null>();
  const sizes = new Map<string, Size>();
  const keyOf = (kind: string, id: string) => `${kind} ${id}`;

  function find<E extends Element>(kind: string, id: string): E | null {
    const key = keyOf(kind, id);
    const known = elements.get(key);
    if (known !== undefined) return known as E | null;
    const found = root?.querySelector<E>(`[data-${kind}="${CSS.escape(id)}"]`) ?? null;
    elements.set(key, found);
    return found;
  }

  function sizeOf(kind: string, id: string): Size {
    const key = keyOf(kind, id);
    const known = sizes.get(key);
    if (known) return known;
    const element = find<HTMLElement>(kind, id);
    const size = { width: element?.offsetWidth ?? 0, height: element?.offsetHeight ?? 0 };
    sizes.set(key, size);
    return size;
  }

  return {
    renew: (next) => {
      root = next;
      elements.clear();
      sizes.clear();
    },
    find,
    sizeOf,
  };
}

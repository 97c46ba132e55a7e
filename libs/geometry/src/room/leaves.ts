/** Values that only make sense together and are chosen as one. */
const WHOLE = new Set(['at', 'places', 'base', 'foam', 'buttons', 'lumbar', 'leaves', 'joints']);

/**
 * The single values of a piece, by path; a position, a base, a foam and the like count as one value.
 *
 * @param holder - a piece, or nothing
 * @returns values by paths such as `seatCushion.thicknessMm`
 */
export function leavesOf(holder: object | undefined): Map<string, unknown> {
  const leaves = new Map<string, unknown>();
  const walk = (inner: object, prefix: string) => {
    for (const [key, value] of Object.entries(inner) as [string, unknown][]) {
      if (typeof value === 'object' && value !== null && !WHOLE.has(key)) walk(value, `${prefix}${key}.`);
      else leaves.set(prefix + key, value);
    }
  };
  if (holder !== undefined) walk(holder, '');
  return leaves;
}

/**
 * Whether two plain JSON values are the same; the order of keys does not matter.
 *
 * @param one - plain JSON or undefined
 * @param other - plain JSON or undefined
 * @returns true when they are
 */
export function isSame(one: unknown, other: unknown): boolean {
  if (Object.is(one, other)) return true;
  if (typeof one !== 'object' || typeof other !== 'object' || one === null || other === null) return false;
  const [a, b] = [one as Record<string, unknown>, other as Record<string, unknown>];
  const keys = Object.keys(a);
  return keys.length === Object.keys(b).length && keys.every((key) => key in b && isSame(a[key], b[key]));
}

/**
 * A copy of a holder with the value at a path replaced; a value that is absent takes its key away.
 *
 * @param holder - plain JSON object
 * @param path - keys parted by dots; every key before the last must exist
 * @param value - the new value
 * @returns the copy; nothing else is copied deeply
 */
export function withPath<T>(holder: T, path: string, value: unknown): T {
  const [key = '', ...rest] = path.split('.');
  const inner = (holder as Record<string, unknown>)[key];
  if (rest.length === 0 && value === undefined) {
    const { [key]: _, ...others } = holder as Record<string, unknown>;
    return others as T;
  }
  return { ...holder, [key]: rest.length === 0 ? value : withPath(inner, rest.join('.'), value) };
}

type Point = readonly [number, number];

const turn = (a: Point, b: Point, c: Point): number =>
  (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);

/**
 * Cuts an outline into convex pieces: itself when it is convex; otherwise ears are cut off one by one and put together
 * again where what they make is convex.
 *
 * @param outline - corners in turning order, either way round; its sides do not cross
 * @returns the pieces as places in the outline, in turning order
 */
export function convexPieces(outline: readonly Point[]): number[][] {
  const n = outline.length;
  const at = (i: number): Point => outline[i]!;
  const area = outline.reduce((sum, [x, y], i) => {
    const [x1, y1] = at((i + 1) % n);
    return sum + x * y1 - x1 * y;
  }, 0);
  const way = area < 0 ? -1 : 1;
  const all = outline.map((_, i) => i);
  const left = (a: number, b: number, c: number) => way * turn(at(a), at(b), at(c));
  if (all.every((i) => left((i + n - 1) % n, i, (i + 1) % n) >= -1e-9)) return [all];
  const pieces: number[][] = [];
  const rest = [...all];
  while (rest.length > 3) {
    const size = rest.length;
    const ear = rest.findIndex((b, i) => {
      const [a, c] = [rest[(i + size - 1) % size]!, rest[(i + 1) % size]!];
      if (left(a, b, c) <= 1e-12) return false;
      return rest.every(
        (p) => p === a || p === b || p === c || left(a, b, p) < 0 || left(b, c, p) < 0 || left(c, a, p) < 0,
      );
    });
    // Only corners on straight lines are left over: they take no area with them.
    if (ear === -1) break;
    pieces.push([rest[(ear + size - 1) % size]!, rest[ear]!, rest[(ear + 1) % size]!]);
    rest.splice(ear, 1);
  }
  if (rest.length === 3) pieces.push(rest);
  return joined(pieces, (a, b, c) => left(a, b, c) >= -1e-9);
}

/** Both pieces in one, where they share a side; turning the same way. */
function across(one: readonly number[], other: readonly number[]): number[] | undefined {
  const size = other.length;
  for (const [i, a] of one.entries()) {
    const b = one[(i + 1) % one.length]!;
    const at = other.indexOf(b);
    if (at === -1 || other[(at + 1) % size] !== a) continue;
    const rest = Array.from({ length: size - 2 }, (_, n) => other[(at + 2 + n) % size]!);
    return [...one.slice(0, i + 1), ...rest, ...one.slice(i + 1)];
  }
  return undefined;
}

/** Puts pieces together as long as what they make turns one way only. */
function joined(pieces: number[][], turnsOn: (a: number, b: number, c: number) => boolean): number[][] {
  const done: number[][] = [];
  const open = [...pieces];
  for (let piece = open.pop(); piece; piece = open.pop()) {
    let grown = piece;
    for (let i = 0; i < open.length; i += 1) {
      const both = across(grown, open[i]!);
      const n = both?.length ?? 0;
      if (!both?.every((b, k) => turnsOn(both[(k + n - 1) % n]!, b, both[(k + 1) % n]!))) continue;
      grown = both;
      open.splice(i, 1);
      i = -1;
    }
    done.push(grown);
  }
  return done;
}

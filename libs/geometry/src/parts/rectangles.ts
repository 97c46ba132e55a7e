/** An upright rectangle in a plane. */
export interface Rectangle {
  x0: number;
  x1: number;
  y0: number;
  y1: number;
}

/**
 * What is left of a rectangle when holes are cut out of it, as rectangles that do not overlap.
 *
 * @param whole - the rectangle, x0 < x1 and y0 < y1
 * @param holes - openings, which may reach beyond it and overlap each other
 * @param smallest - strips narrower than this are dropped, millimetres
 * @returns the pieces left, each at least `smallest` in both directions
 */
export function cutOut(whole: Rectangle, holes: readonly Rectangle[], smallest: number): Rectangle[] {
  let left = [whole];
  for (const hole of holes) left = left.flatMap((one) => around(one, hole));
  return left.filter((one) => one.x1 - one.x0 >= smallest && one.y1 - one.y0 >= smallest);
}

function around(one: Rectangle, hole: Rectangle): Rectangle[] {
  const x0 = Math.max(one.x0, hole.x0);
  const x1 = Math.min(one.x1, hole.x1);
  const y0 = Math.max(one.y0, hole.y0);
  const y1 = Math.min(one.y1, hole.y1);
  if (x0 >= x1 || y0 >= y1) return [one];
  return [
    { ...one, x1: x0 },
    { ...one, x0: x1 },
    { x0, x1, y0: one.y0, y1: y0 },
    { x0, x1, y0: y1, y1: one.y1 },
  ].filter((piece) => piece.x1 > piece.x0 && piece.y1 > piece.y0);
}

/** A box of the page. */
export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** Smallest box around points; empty and at the origin without any. */
export function boxAround(points: readonly (readonly [number, number])[]): Box {
  let [x0, y0, x1, y1] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const [x, y] of points) {
    [x0, y0, x1, y1] = [Math.min(x0, x), Math.min(y0, y), Math.max(x1, x), Math.max(y1, y)];
  }
  return points.length === 0
    ? { x: 0, y: 0, width: 0, height: 0 }
    : { x: x0, y: y0, width: x1 - x0, height: y1 - y0 };
}

type Point = readonly [across: number, up: number];

/**
 * Lines along which a grid of numbers crosses a level.
 *
 * @param grid - rows from the foot up; not finite where nothing is known
 * @param level - where to draw
 * @returns pieces of line in cells of the grid, [across, up]; straight interpolation along the sides of each cell
 */
export function contours(grid: readonly (readonly number[])[], level: number): [Point, Point][] {
  const found: [Point, Point][] = [];
  for (let up = 0; up + 1 < grid.length; up += 1) {
    const [low, high] = [grid[up] ?? [], grid[up + 1] ?? []];
    for (let across = 0; across + 1 < low.length; across += 1) {
      const corners: [Point, number][] = [
        [[across, up], (low[across] ?? NaN) - level],
        [[across + 1, up], (low[across + 1] ?? NaN) - level],
        [[across + 1, up + 1], (high[across + 1] ?? NaN) - level],
        [[across, up + 1], (high[across] ?? NaN) - level],
      ];
      const crossings = corners.flatMap(([point, value], n) => {
        const [next, other] = corners[(n + 1) % 4] as [Point, number];
        const crosses = Number.isFinite(value) && Number.isFinite(other) && value >= 0 !== other >= 0;
        return crosses ? [between(point, next, value / (value - other))] : [];
      });
      for (let n = 0; n + 1 < crossings.length; n += 2) {
        found.push([crossings[n] as Point, crossings[n + 1] as Point]);
      }
    }
  }
  return found;
}

const between = ([x, y]: Point, [toX, toY]: Point, share: number): Point => [
  x + share * (toX - x),
  y + share * (toY - y),
];

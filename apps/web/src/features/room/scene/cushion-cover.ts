import type { Vec3 } from '@settlewright/geometry';
import { leanedInBy } from './back-print.ts';
import { pressedBy, type SeatPrint } from './seat-print.ts';
import type { SoftPart } from './soft-part.ts';
import { addEdge, addPoint, type SolidSink } from './solid-arrays.ts';
import { add, cross, dot, normalise, scale, subtract } from './vectors.ts';

/** Edge of the cover, its crown over the panel and the width over which the crown rises, mm. */
const ROUND_MM = 20;
const CROWN_MM = 9;
const CROWN_RUN_MM = 150;
/** A pressed panel stays so far over the deck, mm. */
export const LEAST_MM = 8;
/** Where the lines of a rounded edge lie: 0 is the rim, 1 the level panel. */
export const ROUNDING = [1, 0.75, 0] as const;

/** Points of a stretch of cover, line by line. */
export type Sheet = Vec3[][];

/** How far the edge of a cushion is rounded where the narrowest half of it is `half`, mm. */
export const roundOf = (thickMm: number, ...half: number[]): number =>
  Math.min(ROUND_MM, thickMm * 0.35, ...half.map((mm) => mm * 0.4));

/** How far a panel lies under its crown, so far within its edge, mm. */
export const sagAt = (thickMm: number, withinMm: number): number =>
  Math.min(CROWN_MM, thickMm * 0.12) * (1 - Math.min(1, withinMm / CROWN_RUN_MM)) ** 2;

/** How far the panel of a cushion goes in at a point of its free face. */
export function pressOf(prints: readonly SeatPrint[], { kind, outward }: SoftPart): (point: Vec3) => number {
  if (kind === 'seat') return (point) => pressedBy(prints, point);
  const backs = prints.flatMap((print) => print.backs);
  const inward = scale(outward, -1);
  return (point) => leanedInBy(backs, point, inward);
}

/** The point of a cushion so far across, outwards and down from its middle. */
export function placerOf({ centre, across, outward, down }: SoftPart) {
  const [cx, cy, cz] = centre;
  return (u: number, w: number, v: number): Vec3 => [
    cx + across[0] * u + outward[0] * w + down[0] * v,
    cy + across[1] * u + outward[1] * w + down[1] * v,
    cz + across[2] * u + outward[2] * w + down[2] * v,
  ];
}

/** Points of a stretch of cover that stand in a sink: line by line, from the first of them. */
export interface Grid {
  first: number;
  rows: number;
  width: number;
}

/**
 * Triangles on the points of a stretch of cover. Its outline is drawn round the edges alone: inside them a panel is never
 * seen against anything but itself.
 */
export function addGrid({ indices, roundIndices }: SolidSink, { first, rows, width }: Grid) {
  for (let row = 0; row + 1 < rows; row++) {
    for (let column = 0; column + 1 < width; column++) {
      const at = first + row * width + column;
      indices.push3(at, at + width, at + width + 1);
      indices.push3(at, at + width + 1, at + 1);
      if (Math.min(row, column, rows - 2 - row, width - 2 - column) >= ROUNDING.length) continue;
      roundIndices.push3(at, at + width, at + width + 1);
      roundIndices.push3(at, at + width + 1, at + 1);
    }
  }
}

export function addSheet(out: SolidSink, sheet: Sheet, normals: Sheet, material: number) {
  const grid: Grid = { first: out.materials.length, rows: sheet.length, width: sheet[0]!.length };
  sheet.forEach((points, row) =>
    points.forEach((point, column) => addPoint(out, point, normals[row]![column]!, material)),
  );
  addGrid(out, grid);
}

function addLoop(out: SolidSink, loop: readonly Vec3[], weight: number) {
  for (let n = 1; n < loop.length; n++) addEdge(out, loop[n - 1]!, loop[n]!, weight);
}

/** The boxing below the rim of a panel, a closed line, with its welts. Seen from outside the rim runs clockwise. */
export function addBoxing(
  out: SolidSink,
  { centre, outward, thickMm }: SoftPart,
  rim: readonly Vec3[],
  material: number,
): Vec3[] {
  const foot = rim.map((point) =>
    add(point, scale(outward, -thickMm / 2 - dot(subtract(point, centre), outward))),
  );
  const sideways = rim.map((_, n) => {
    const run = subtract(rim[n + 1] ?? rim[1]!, rim[n - 1] ?? rim.at(-2)!);
    return normalise(cross(outward, run));
  });
  addSheet(out, [foot, [...rim]], [sideways, sideways], material);
  addLoop(out, rim, 1);
  addLoop(out, foot, 1);
  return foot;
}

import type { Vec3 } from '@settlewright/geometry';
import { leanedInBy } from './back-print.ts';
import { pressedBy, type SeatPrint } from './seat-print.ts';
import type { SoftPart } from './soft-part.ts';
import type { SolidSink } from './solid-arrays.ts';
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

/** Corners of the two triangles between two lines of a sheet: how far down and across. */
const CORNERS = [0, 0, 1, 0, 1, 1, 0, 0, 1, 1, 0, 1] as const;

/**
 * Made anew for each frame of a pull: plain loops, as lists and spreads cost ten times as much. Its outline is drawn round
 * the edges alone: inside them a panel is never seen against anything but itself.
 */
export function addSheet(out: SolidSink, sheet: Sheet, normals: Sheet, material: number) {
  const { positions, normals: facing, materials, roundPositions, roundNormals } = out;
  for (let row = 0; row + 1 < sheet.length; row++) {
    const width = sheet[row]!.length;
    for (let column = 0; column + 1 < width; column++) {
      const border = Math.min(row, column, sheet.length - 2 - row, width - 2 - column) < ROUNDING.length;
      for (let n = 0; n < CORNERS.length; n += 2) {
        const [r, c] = [row + CORNERS[n]!, column + CORNERS[n + 1]!];
        const [at, normal] = [sheet[r]![c]!, normals[r]![c]!];
        positions.push(at[0], at[1], at[2]);
        facing.push(normal[0], normal[1], normal[2]);
        materials.push(material);
        if (!border) continue;
        roundPositions.push(at[0], at[1], at[2]);
        roundNormals.push(normal[0], normal[1], normal[2]);
      }
    }
  }
}

function addLoop(out: SolidSink, loop: readonly Vec3[], weight: number) {
  loop.slice(1).forEach((point, n) => {
    out.edges.push(...loop[n]!, ...point);
    out.edgeWeights.push(weight);
  });
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

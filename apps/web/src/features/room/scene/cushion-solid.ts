import type { Vec3 } from '@settlewright/geometry';
import {
  addBoxing,
  addGrid,
  addSheet,
  LEAST_MM,
  placerOf,
  pressOf,
  ROUNDING,
  roundOf,
  sagAt,
  type Grid,
} from './cushion-cover.ts';
import { addOutlinedCushion } from './outlined-cushion.ts';
import type { SeatPrint } from './seat-print.ts';
import type { SoftPart } from './soft-part.ts';
import type { SolidSink } from './solid-arrays.ts';
import { scale } from './vectors.ts';

/** Distances of the lines of a panel: close where somebody sits or leans on it and down a curve, mm. */
const PRESSED_STEP_MM = 56;
const LEANED_STEP_MM = 100;
const CURVED_STEP_MM = 26;
const FREE_STEP_MM = 240;
/** Lines across a panel of half width `half`: close at the rounded edges. */
function lines(half: number, round: number, step: number): number[] {
  const edge = ROUNDING.map((share) => half - round * (1 - share));
  const shoulder = [half - round - 40, half - round - 100].filter((at) => at > step / 2);
  const inner = shoulder.at(-1) ?? half - round;
  const count = Math.max(1, Math.ceil((2 * inner) / step));
  const between = Array.from({ length: count - 1 }, (_, n) => inner - ((n + 1) * 2 * inner) / count);
  const outer = [...edge, ...shoulder];
  return [...outer.map((at) => -at), ...between, ...outer].sort((a, b) => a - b);
}

/** Writes the normal of each point of a grid, from the points next to it. */
function addNormals({ positions, normals }: SolidSink, { first, rows, width }: Grid) {
  const at = normals.take(rows * width * 3);
  const [points, facing] = [positions.memory, normals.memory];
  for (let row = 0; row < rows; row++) {
    const over = first + Math.max(0, row - 1) * width;
    const under = first + Math.min(rows - 1, row + 1) * width;
    for (let column = 0; column < width; column++) {
      const line = first + row * width;
      const left = 3 * (line + Math.max(0, column - 1));
      const right = 3 * (line + Math.min(width - 1, column + 1));
      const [high, low] = [3 * (over + column), 3 * (under + column)];
      const ax = points[low]! - points[high]!;
      const ay = points[low + 1]! - points[high + 1]!;
      const az = points[low + 2]! - points[high + 2]!;
      const bx = points[right]! - points[left]!;
      const by = points[right + 1]! - points[left + 1]!;
      const bz = points[right + 2]! - points[left + 2]!;
      const [x, y, z] = [ay * bz - az * by, az * bx - ax * bz, ax * by - ay * bx];
      const length = Math.sqrt(x * x + y * y + z * z) || 1;
      const to = at + 3 * (row * width + column);
      facing[to] = x / length;
      facing[to + 1] = y / length;
      facing[to + 2] = z / length;
    }
  }
}

/** Points round the rim of a panel, closed. */
function rimOf({ positions }: SolidSink, { first, rows, width }: Grid): Vec3[] {
  const point = (row: number, column: number): Vec3 => {
    const at = 3 * (first + row * width + column);
    return [positions.memory[at]!, positions.memory[at + 1]!, positions.memory[at + 2]!];
  };
  const round: Vec3[] = [];
  for (let column = 0; column < width; column++) round.push(point(0, column));
  for (let row = 1; row < rows; row++) round.push(point(row, width - 1));
  for (let column = width - 2; column >= 0; column--) round.push(point(rows - 1, column));
  for (let row = rows - 2; row >= 0; row--) round.push(point(row, 0));
  return round;
}

/** Distances of the lines across and down a panel. */
function stepsOf({ kind, hollowAt }: SoftPart, prints: readonly SeatPrint[]): [number, number] {
  if (prints.length === 0) return [FREE_STEP_MM, hollowAt ? CURVED_STEP_MM : FREE_STEP_MM];
  return kind === 'seat' ? [PRESSED_STEP_MM, PRESSED_STEP_MM] : [LEANED_STEP_MM, LEANED_STEP_MM];
}

/**
 * A cushion as it is upholstered: a crowned panel over a boxing with a welt between, all inside the measured box, and
 * pressed in where somebody sits or leans. The seat's panel looks up, the back's forwards.
 */
export function addCushion(out: SolidSink, soft: SoftPart, material: number, prints: readonly SeatPrint[]) {
  const { outward, thickMm: thick, hollowAt, outlineMm } = soft;
  if (outlineMm) {
    addOutlinedCushion(out, { ...soft, outlineMm }, material, prints);
    return;
  }
  const [a, b] = [soft.widthMm / 2, soft.lengthMm / 2];
  const round = roundOf(thick, a, b);
  const [stepAcross, stepDown] = stepsOf(soft, prints);
  const press = pressOf(prints, soft);
  const place = placerOf(soft);

  const columns = lines(a, round, stepAcross);
  const rows = lines(b, round, stepDown);
  const grid: Grid = { first: out.materials.length, rows: rows.length, width: columns.length };
  for (const v of rows) {
    for (const u of columns) {
      const eu = Math.max(0, Math.abs(u) - a + round) / round;
      const ev = Math.max(0, Math.abs(v) - b + round) / round;
      const du = eu * Math.sqrt(1 - (ev * ev) / 2);
      const dv = ev * Math.sqrt(1 - (eu * eu) / 2);
      const sag = sagAt(thick, Math.min(a - Math.abs(u), b - Math.abs(v)));
      const rise = round * Math.sqrt(Math.max(0, 1 - du * du - dv * dv));
      const across = eu > 0 ? Math.sign(u) * (a - round + round * du) : u;
      const down = ev > 0 ? Math.sign(v) * (b - round + round * dv) : v;
      const top = thick / 2 - round + rise - sag - (hollowAt?.(down) ?? 0);
      const at = place(across, Math.max(LEAST_MM - thick / 2, top - press(place(across, top, down))), down);
      out.positions.push3(at[0], at[1], at[2]);
      out.materials.push(material);
    }
  }
  addNormals(out, grid);
  addGrid(out, grid);

  const foot = addBoxing(out, soft, rimOf(out, grid), material);
  const under = foot.map(() => place(0, -thick / 2, 0));
  const away = foot.map(() => scale(outward, -1));
  addSheet(out, [under, foot], [away, away], material);
}

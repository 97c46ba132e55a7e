import {
  outlineBox,
  outlineExtent,
  type OutlineCorner,
  outlinePoints,
  type Point2,
} from '@settlewright/geometry';
import { tilesOf } from '@settlewright/geometry/export';

/** A sheet of a template at full size. */
export interface TemplateTile {
  /** "B2": column letter from the left, row number from above. */
  name: string;
  column: number;
  row: number;
  /** Corner of the template in the upper left corner of the sheet's free space; y down. */
  xMm: number;
  yMm: number;
  /** Something is drawn on it. */
  used: boolean;
}

/** Lines of a template, y down, from its own upper left corner. */
export interface TemplateLines {
  finished: Point2[];
  cut: Point2[];
  buttons: Point2[];
  widthMm: number;
  heightMm: number;
}

const SAG_MM = 0.05;

/** The seam line, the line to cut and the buttons of a plan, turned to the page. */
export function templateLines(
  finished: readonly OutlineCorner[],
  cut: readonly OutlineCorner[],
  buttons: readonly Point2[],
): TemplateLines {
  const { x0: left, y1: top } = outlineBox(cut);
  const turned = ([x, y]: Point2): Point2 => [x - left, top - y];
  const { widthMm, depthMm } = outlineExtent(cut);
  return {
    finished: outlinePoints(finished, SAG_MM).map(turned),
    cut: outlinePoints(cut, SAG_MM).map(turned),
    buttons: buttons.map(turned),
    widthMm,
    heightMm: depthMm,
  };
}

/** The sheets of a template, row by row; those that no line crosses are left out of print, not out of the key. */
export function templateTiles(
  lines: TemplateLines,
  space: { widthMm: number; heightMm: number },
): TemplateTile[] {
  const bounds = { x: 0, y: 0, width: lines.widthMm, height: lines.heightMm };
  return tilesOf(bounds, 1, space).map(({ column, row, xMm, yMm }) => {
    const box = { x: xMm, y: yMm, width: space.widthMm, height: space.heightMm };
    const used =
      crosses(lines.finished, box) ||
      crosses(lines.cut, box) ||
      lines.buttons.some((spot) => isIn(spot, box));
    return { name: `${letters(column)}${row + 1}`, column, row, xMm, yMm, used };
  });
}

/** A, B … Z, AA, AB … */
export function letters(column: number): string {
  const last = String.fromCharCode(65 + (column % 26));
  return column < 26 ? last : letters(Math.floor(column / 26) - 1) + last;
}

interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

const isIn = ([x, y]: Point2, box: Box): boolean =>
  x >= box.x && x <= box.x + box.width && y >= box.y && y <= box.y + box.height;

/** Stretches of a closed line within a box. */
export function stretchesIn(points: readonly Point2[], box: Box): [Point2, Point2][] {
  return points.flatMap((a, i) => {
    const inside = clipped(a, points[(i + 1) % points.length]!, box);
    return inside ? [inside] : [];
  });
}

const crosses = (points: readonly Point2[], box: Box): boolean => stretchesIn(points, box).length > 0;

/** The part of a line within a box (Liang and Barsky). */
function clipped(a: Point2, b: Point2, box: Box): [Point2, Point2] | undefined {
  let [from, to] = [0, 1];
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  for (const [p, q] of [
    [-dx, a[0] - box.x],
    [dx, box.x + box.width - a[0]],
    [-dy, a[1] - box.y],
    [dy, box.y + box.height - a[1]],
  ] as const) {
    if (Math.abs(p) < 1e-12) {
      if (q < 0) return undefined;
      continue;
    }
    const t = q / p;
    if (p < 0) from = Math.max(from, t);
    else to = Math.min(to, t);
    if (from > to) return undefined;
  }
  const at = (t: number): Point2 => [a[0] + t * dx, a[1] + t * dy];
  return [at(from), at(to)];
}

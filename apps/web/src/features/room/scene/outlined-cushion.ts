import type { Vec3 } from '@settlewright/geometry';
import { ShapeUtils, Vector2 } from 'three';
import {
  addBoxing,
  addSheet,
  LEAST_MM,
  placerOf,
  pressOf,
  ROUNDING,
  roundOf,
  sagAt,
} from './cushion-cover.ts';
import type { SeatPrint } from './seat-print.ts';
import type { SoftPart } from './soft-part.ts';
import { addPoint, type SolidSink } from './solid-arrays.ts';
import { between, crossings, holds, inset, strips, withinMm, type Point } from './panel-outline.ts';
import { add, normalise, scale } from './vectors.ts';

/** Sides of the squares a panel is laid in: close where somebody sits or leans on it, mm. */
const PRESSED_STEP_MM = 56;
const FREE_STEP_MM = 110;
/** The slope of the panel is read over this, mm. */
const SLOPE_MM = 2;

/**
 * A cushion cut to a plan of its own, as it is upholstered: see `addCushion`. Its rounded edge follows the outline; within
 * it the panel is laid in squares, cut where the edge begins, so that it can be pressed in anywhere.
 */
export function addOutlinedCushion(
  out: SolidSink,
  soft: SoftPart & Required<Pick<SoftPart, 'outlineMm'>>,
  material: number,
  prints: readonly SeatPrint[],
): void {
  const { outlineMm: outline, outward, thickMm: thick } = soft;
  const place = placerOf(soft);
  const press = pressOf(prints, soft);
  const step = prints.length > 0 ? PRESSED_STEP_MM : FREE_STEP_MM;
  const widest = roundOf(thick, soft.widthMm / 2, soft.lengthMm / 2);
  const round =
    [1, 0.5, 0.25].map((share) => widest * share).find((mm) => holds(outline, inset(outline, mm))) ?? 1;
  const inner = inset(outline, round);

  /** Height of the cover over the middle of the cushion; `edge` is 0 on the rim, 1 from where the panel is level. */
  const heightAt = ([u, v]: Point, edge: number): number => {
    const rise = round * Math.sqrt(Math.max(0, 1 - (1 - edge) ** 2));
    const top = thick / 2 - round + rise - sagAt(thick, withinMm(outline, u, v));
    return Math.max(LEAST_MM - thick / 2, top - press(place(u, top, v)));
  };
  /** A way in the room, of so much across, outwards and down. */
  const directed = (across: number, out: number, down: number): Vec3 =>
    add(add(scale(soft.across, across), scale(outward, out)), scale(soft.down, down));
  const levelNormal = ([u, v]: Point): Vec3 => {
    const [low, across, along] = [
      heightAt([u, v], 1),
      heightAt([u + SLOPE_MM, v], 1),
      heightAt([u, v + SLOPE_MM], 1),
    ];
    return normalise(directed((low - across) / SLOPE_MM, 1, (low - along) / SLOPE_MM));
  };

  // The rounded edge, from the rim inwards.
  const sides = outline.flatMap((a, n) => {
    const next = (n + 1) % outline.length;
    const [ia, ib] = [inner[n]!, inner[next]!];
    return crossings(ia, ib, step).map((t) => [between(a, outline[next]!, t), between(ia, ib, t)] as const);
  });
  const around = [...sides, sides[0]!];
  const edges = ROUNDING.map((share) => 1 - share);
  const rings = edges.map((edge) => around.map(([rim, level]) => between(rim, level, edge)));
  const cover = rings.map((ring, n) =>
    ring.map((point) => place(point[0], heightAt(point, edges[n]!), point[1])),
  );
  const facing = edges.map((edge, n) =>
    around.map(([rim, level], m) => {
      if (edge === 1) return levelNormal(rings[n]![m]!);
      const [du, dv] = [rim[0] - level[0], rim[1] - level[1]];
      const lean = (1 - edge) / (Math.hypot(du, dv) || 1);
      const up = Math.sqrt(1 - (1 - edge) ** 2);
      return normalise(directed(du * lean, up, dv * lean));
    }),
  );
  addSheet(out, cover, facing, material);

  for (const piece of strips(inner, 0, step).flatMap((strip) => strips(strip, 1, step))) {
    const corners = piece.map((point) => place(point[0], heightAt(point, 1), point[1]));
    const normals = piece.map(levelNormal);
    addTriangles(out, piece, corners, normals, material);
  }

  const foot = addBoxing(out, soft, cover[0]!, material);
  const away = scale(outward, -1);
  addTriangles(
    out,
    around.slice(1).map(([rim]) => rim),
    foot.slice(1),
    foot.map(() => away),
    material,
    true,
  );
}

/** Fills an outline whose corners stand in the room. Triangles look at whoever sees the outline run clockwise. */
function addTriangles(
  out: SolidSink,
  outline: readonly Point[],
  corners: readonly Vec3[],
  normals: readonly Vec3[],
  material: number,
  fromBelow = false,
) {
  // The filler takes outlines either way round and gives them back anticlockwise in its own plane: mirrored here, so clockwise.
  const flat = outline.map(([u, v]) => new Vector2(u, -v));
  const points = outline.map((_, n) => addPoint(out, corners[n]!, normals[n]!, material));
  for (const [a, b, c] of ShapeUtils.triangulateShape(flat, []) as [number, number, number][]) {
    const [first, last] = fromBelow ? [c, a] : [a, c];
    out.indices.push3(points[first]!, points[b]!, points[last]!);
  }
}

/** A point on the drawing, in millimetres: x to the right, y down from the top of the sheet. */
export type Point = readonly [x: number, y: number];

const at = (point: Point, angle: number, radius: number): string =>
  `${(point[0] + Math.cos(angle) * radius).toFixed(1)} ${(point[1] + Math.sin(angle) * radius).toFixed(1)}`;

/** Outline of a limb that tapers from one round end to the other: two arcs and their common tangents. */
export function limbPath(from: Point, fromRadius: number, to: Point, toRadius: number): string {
  const dx = to[0] - from[0];
  const dy = to[1] - from[1];
  const length = Math.hypot(dx, dy);
  const along = Math.atan2(dy, dx);
  const spread = Math.acos(Math.max(-1, Math.min(1, (fromRadius - toRadius) / length)));
  const left = along + spread;
  const right = along - spread;
  return (
    `M${at(from, left, fromRadius)}` +
    `A${fromRadius} ${fromRadius} 0 1 1 ${at(from, right, fromRadius)}` +
    `L${at(to, right, toRadius)}` +
    `A${toRadius} ${toRadius} 0 0 1 ${at(to, left, toRadius)}Z`
  );
}

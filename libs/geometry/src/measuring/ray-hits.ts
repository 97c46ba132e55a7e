import { add, cross, dot, scale, sub } from '../mannequin/vector.ts';
import type { MannequinMesh } from '../mannequin/mesh.ts';
import type { Bounds } from '../distance/shape.ts';
import type { Part, Solid, Vec3 } from '../parts/part.ts';
import { partFrame } from './part-frame.ts';

/** A half line; `direction` has length 1. */
export interface SightLine {
  origin: Vec3;
  direction: Vec3;
}

/**
 * A point along a line of sight.
 *
 * @param line - the line
 * @param mm - how far along
 */
export const pointAlong = ({ origin, direction }: SightLine, mm: number): Vec3 =>
  add(origin, scale(direction, mm));

const FLAT = 1e-9;

/** Where the line passes through the outline of a bar along z, and through its two ends. */
function hitsOfPrism(
  outline: readonly (readonly [number, number])[],
  halfDepth: number,
  [ox, oy, oz]: Vec3,
  [dx, dy, dz]: Vec3,
): number[] {
  const hits: number[] = [];
  outline.forEach(([ax, ay], i) => {
    const [bx, by] = outline[(i + 1) % outline.length]!;
    const [ex, ey] = [bx - ax, by - ay];
    const area = dx * ey - dy * ex;
    if (Math.abs(area) < FLAT) return;
    const t = ((ax - ox) * ey - (ay - oy) * ex) / area;
    const u = ((ax - ox) * dy - (ay - oy) * dx) / area;
    if (u >= 0 && u <= 1 && Math.abs(oz + t * dz) <= halfDepth) hits.push(t);
  });
  if (Math.abs(dz) < FLAT) return hits;
  for (const end of [-halfDepth, halfDepth]) {
    const t = (end - oz) / dz;
    if (isWithin(outline, ox + t * dx, oy + t * dy)) hits.push(t);
  }
  return hits;
}

/** Whether a point lies inside an outline, hollow or not. */
function isWithin(outline: readonly (readonly [number, number])[], x: number, y: number): boolean {
  let inside = false;
  outline.forEach(([ax, ay], i) => {
    const [bx, by] = outline[(i + 1) % outline.length]!;
    if (ay > y !== by > y && x < ax + ((y - ay) / (by - ay)) * (bx - ax)) inside = !inside;
  });
  return inside;
}

function hitsOfCylinder(radius: number, half: number, [ox, oy, oz]: Vec3, [dx, dy, dz]: Vec3): number[] {
  const [a, b] = [dx * dx + dz * dz, ox * dx + oz * dz];
  const root = b * b - a * (ox * ox + oz * oz - radius * radius);
  const round = a < FLAT || root < 0 ? [] : [-1, 1].map((sign) => (-b + sign * Math.sqrt(root)) / a);
  const hits = round.filter((t) => Math.abs(oy + t * dy) <= half);
  if (Math.abs(dy) < FLAT) return hits;
  for (const end of [-half, half]) {
    const t = (end - oy) / dy;
    if (Math.hypot(ox + t * dx, oz + t * dz) <= radius) hits.push(t);
  }
  return hits;
}

function hitsOf(solid: Solid, origin: Vec3, direction: Vec3): number[] {
  if (solid.shape === 'cylinder')
    return hitsOfCylinder(solid.radiusMm, solid.heightMm / 2, origin, direction);
  if (solid.shape === 'prism') return hitsOfPrism(solid.outlineMm, solid.depthMm / 2, origin, direction);
  const [x, y, z] = [solid.sizeMm[0] / 2, solid.sizeMm[1] / 2, solid.sizeMm[2] / 2];
  const outline = [
    [-x, -y],
    [x, -y],
    [x, y],
    [-x, y],
  ] as const;
  return hitsOfPrism(outline, z, origin, direction);
}

/**
 * Where a line of sight first meets a part.
 *
 * @param part - placed in the room
 * @param line - where it is looked along
 * @param fromMm - what lies nearer is passed over, as where a section has taken it away
 * @returns millimetres along the line; `undefined` when it passes by
 */
export function hitPart(part: Part, line: SightLine, fromMm = 0): number | undefined {
  const frame = partFrame(part);
  const hits = hitsOf(part.solid, frame.toPart(line.origin), frame.turned(line.direction));
  const ahead = hits.filter((t) => t >= fromMm);
  // An odd number is left where the section runs through the part: its cut face is met.
  if (fromMm > 0 && ahead.length % 2 === 1) return fromMm;
  return ahead.length === 0 ? undefined : Math.min(...ahead);
}

const boxes = new WeakMap<Float32Array, Bounds>();

function boxOf(positions: Float32Array): Bounds {
  const known = boxes.get(positions);
  if (known) return known;
  const minMm: [number, number, number] = [Infinity, Infinity, Infinity];
  const maxMm: [number, number, number] = [-Infinity, -Infinity, -Infinity];
  positions.forEach((value, i) => {
    const n = (i % 3) as 0 | 1 | 2;
    minMm[n] = Math.min(minMm[n], value);
    maxMm[n] = Math.max(maxMm[n], value);
  });
  boxes.set(positions, { minMm, maxMm });
  return { minMm, maxMm };
}

function passesBox({ minMm, maxMm }: Bounds, { origin, direction }: SightLine): boolean {
  let [near, far] = [-Infinity, Infinity];
  for (const n of [0, 1, 2] as const) {
    const [a, b] = [(minMm[n] - origin[n]) / direction[n], (maxMm[n] - origin[n]) / direction[n]];
    // Along the box the shares are infinite, of one sign where the line runs beside it.
    if (Number.isNaN(a) || Number.isNaN(b)) continue;
    near = Math.max(near, Math.min(a, b));
    far = Math.min(far, Math.max(a, b));
  }
  return near <= far && far >= 0;
}

/**
 * Where a line of sight first meets a body's skin.
 *
 * @param mesh - room frame
 * @param line - where it is looked along
 * @param fromMm - what lies nearer is passed over
 * @returns millimetres along the line; `undefined` when it passes by
 */
export function hitSkin(
  { positions, indices }: Pick<MannequinMesh, 'positions' | 'indices'>,
  { origin, direction }: SightLine,
  fromMm = 0,
): number | undefined {
  if (!passesBox(boxOf(positions), { origin, direction })) return undefined;
  const at = (v: number): Vec3 => [positions[v * 3]!, positions[v * 3 + 1]!, positions[v * 3 + 2]!];
  let best: number | undefined;
  for (let i = 0; i < indices.length; i += 3) {
    const a = at(indices[i]!);
    const [e, f] = [sub(at(indices[i + 1]!), a), sub(at(indices[i + 2]!), a)];
    const p = cross(direction, f);
    const area = dot(e, p);
    if (Math.abs(area) < FLAT) continue;
    const s = sub(origin, a);
    const u = dot(s, p) / area;
    if (u < 0 || u > 1) continue;
    const q = cross(s, e);
    const v = dot(direction, q) / area;
    if (v < 0 || u + v > 1) continue;
    const t = dot(f, q) / area;
    if (t >= fromMm && (best === undefined || t < best)) best = t;
  }
  return best;
}

import type { MaterialKey, Part, Solid, Vec3 } from '@settlewright/geometry';
import { BufferAttribute, BufferGeometry, ShapeUtils, Vector2 } from 'three';
import { addCushion } from './cushion-solid';
import type { SeatPrint } from './seat-print';
import { softPart } from './soft-part';
import { addEdge, addPoint, createSink, packSink, type PackedSolids, type SolidSink } from './solid-arrays';
import { addGrains } from './timber';
import { add, normalise, partAxes, scale } from './vectors';

/** Order of the materials in the palette of the shaders. */
export const MATERIALS: readonly MaterialKey[] = ['oak', 'walnut', 'cloth', 'wall', 'glass', 'ply'];

/** How strongly an edge is inked: 1 is the edge of a piece, less is a seam between boards. */
const SEAMS: Partial<Record<Part['role'], number>> = { 'wall-board': 0.17, 'back-board': 0.4 };
const ROUND_SIDES = 32;

type Place = (x: number, y: number, z: number) => Vec3;

function placer(part: Part): { at: Place; along: Place } {
  const [ax, ay, az] = partAxes(part.rotationRad);
  const along: Place = (x, y, z) => add(add(scale(ax, x), scale(ay, y)), scale(az, z));
  return { along, at: (x, y, z) => add(part.positionMm, along(x, y, z)) };
}

/** A flat face with four corners. */
function addFace(out: SolidSink, corners: readonly [Vec3, Vec3, Vec3, Vec3], normal: Vec3, material: number) {
  const first = out.materials.length;
  for (const corner of corners) addPoint(out, corner, normal, material);
  out.indices.push3(first, first + 1, first + 2);
  out.indices.push3(first, first + 2, first + 3);
}

function addBox(out: SolidSink, part: Part, size: Vec3, material: number, weight: number) {
  const { at, along } = placer(part);
  const [x, y, z] = [size[0] / 2, size[1] / 2, size[2] / 2];
  addFace(out, [at(-x, y, z), at(x, y, z), at(x, y, -z), at(-x, y, -z)], along(0, 1, 0), material);
  addFace(out, [at(-x, -y, -z), at(x, -y, -z), at(x, -y, z), at(-x, -y, z)], along(0, -1, 0), material);
  addFace(out, [at(-x, -y, z), at(x, -y, z), at(x, y, z), at(-x, y, z)], along(0, 0, 1), material);
  addFace(out, [at(x, -y, -z), at(-x, -y, -z), at(-x, y, -z), at(x, y, -z)], along(0, 0, -1), material);
  addFace(out, [at(x, -y, z), at(x, -y, -z), at(x, y, -z), at(x, y, z)], along(1, 0, 0), material);
  addFace(out, [at(-x, -y, -z), at(-x, -y, z), at(-x, y, z), at(-x, y, -z)], along(-1, 0, 0), material);
  for (const s of [-1, 1]) {
    for (const t of [-1, 1]) {
      addEdge(out, at(-x, s * y, t * z), at(x, s * y, t * z), weight);
      addEdge(out, at(s * x, -y, t * z), at(s * x, y, t * z), weight);
      addEdge(out, at(s * x, t * y, -z), at(s * x, t * y, z), weight);
    }
  }
}

function addCylinder(out: SolidSink, part: Part, radius: number, height: number, material: number) {
  const { at, along } = placer(part);
  const h = height / 2;
  const start = out.indices.length;
  const corner = (point: Vec3, normal: Vec3) => addPoint(out, point, normal, material);
  const [up, down] = [along(0, 1, 0), along(0, -1, 0)];
  for (let n = 0; n < ROUND_SIDES; n++) {
    const [a, b] = [(n / ROUND_SIDES) * Math.PI * 2, ((n + 1) / ROUND_SIDES) * Math.PI * 2];
    const [xa, za, xb, zb] = [Math.cos(a), Math.sin(a), Math.cos(b), Math.sin(b)];
    const [pa, pb] = [at(xa * radius, -h, za * radius), at(xb * radius, -h, zb * radius)];
    const [qa, qb] = [at(xa * radius, h, za * radius), at(xb * radius, h, zb * radius)];
    const [na, nb] = [along(xa, 0, za), along(xb, 0, zb)];
    const [low, high, lowNext, highNext] = [corner(pa, na), corner(qa, na), corner(pb, nb), corner(qb, nb)];
    out.indices.push3(low, high, lowNext);
    out.indices.push3(lowNext, high, highNext);
    out.indices.push3(corner(at(0, h, 0), up), corner(qb, up), corner(qa, up));
    out.indices.push3(corner(at(0, -h, 0), down), corner(pa, down), corner(pb, down));
    addEdge(out, qa, qb, 1);
    addEdge(out, pa, pb, 1);
  }
  for (let n = start; n < out.indices.length; n++) out.roundIndices.push(out.indices.memory[n]!);
}

/** Sides that meet at less than this are one curved face: no ink runs between them, radians. */
const CORNER_RAD = 0.35;

const turns = ([ax, ay]: [number, number], [bx, by]: [number, number]): boolean =>
  Math.abs(Math.atan2(ax * by - ay * bx, ax * bx + ay * by)) > CORNER_RAD;

function addPrism(out: SolidSink, part: Part, solid: Extract<Solid, { shape: 'prism' }>, material: number) {
  const { at, along } = placer(part);
  const outline = solid.outlineMm;
  const z = solid.depthMm / 2;
  const flat = outline.map(([x, y]) => new Vector2(x, y));
  const [over, under] = [z, -z].map((side) => {
    const normal = along(0, 0, Math.sign(side));
    return outline.map(([x, y]) => addPoint(out, at(x, y, side), normal, material));
  }) as [number[], number[]];
  for (const [a, b, c] of ShapeUtils.triangulateShape(flat, []) as [number, number, number][]) {
    out.indices.push3(over[a]!, over[b]!, over[c]!);
    out.indices.push3(under[c]!, under[b]!, under[a]!);
  }
  outline.forEach(([x0, y0], n) => {
    const [x1, y1] = outline[(n + 1) % outline.length] ?? [0, 0];
    const normal = normalise(along(y1 - y0, x0 - x1, 0));
    addFace(out, [at(x0, y0, z), at(x0, y0, -z), at(x1, y1, -z), at(x1, y1, z)], normal, material);
    addEdge(out, at(x0, y0, z), at(x1, y1, z), 1);
    addEdge(out, at(x0, y0, -z), at(x1, y1, -z), 1);
    const [xb, yb] = outline.at(n - 1) ?? [0, 0];
    if (turns([x0 - xb, y0 - yb], [x1 - x0, y1 - y0])) addEdge(out, at(x0, y0, -z), at(x0, y0, z), 1);
  });
}

/** Writes triangles and edges of parts behind those that are there. Seats are pressed in by those who sit on their piece. */
export function addParts(
  out: SolidSink,
  parts: readonly Part[],
  printsOn: (pieceId: string) => readonly SeatPrint[],
): void {
  for (const part of parts) {
    const material = MATERIALS.indexOf(part.material);
    const weight = SEAMS[part.role] ?? 1;
    const start = out.materials.length;
    const soft = softPart(part);
    if (soft) addCushion(out, soft, material, printsOn(part.pieceId));
    else if (part.solid.shape === 'box') addBox(out, part, part.solid.sizeMm, material, weight);
    else if (part.solid.shape === 'cylinder') {
      addCylinder(out, part, part.solid.radiusMm, part.solid.heightMm, material);
    } else addPrism(out, part, part.solid, material);
    addGrains(out, part, start);
  }
}

/** Triangles and edges of parts in one. */
export function mergeParts(
  parts: readonly Part[],
  printsOn: (pieceId: string) => readonly SeatPrint[] = () => [],
): PackedSolids {
  const out = createSink();
  addParts(out, parts, printsOn);
  return packSink(out);
}

/** Triangles as they go to the card. */
export function surfaceOf({
  positions,
  normals,
  materials,
  grains,
  indices,
}: Pick<PackedSolids, 'positions' | 'normals'> & Partial<PackedSolids>): BufferGeometry {
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(positions, 3));
  geometry.setAttribute('normal', new BufferAttribute(normals, 3));
  if (materials) geometry.setAttribute('tone', new BufferAttribute(materials, 1));
  if (grains) geometry.setAttribute('grain', new BufferAttribute(grains, 4));
  if (indices) geometry.setIndex(new BufferAttribute(indices, 1));
  return geometry;
}

/** Some of the triangles of a surface, on the very same points. Both are freed together. */
export function someOf(surface: BufferGeometry, indices: Uint32Array): BufferGeometry {
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', surface.getAttribute('position'));
  geometry.setAttribute('normal', surface.getAttribute('normal'));
  geometry.setIndex(new BufferAttribute(indices, 1));
  return geometry;
}

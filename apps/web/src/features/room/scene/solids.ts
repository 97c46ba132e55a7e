import type { MaterialKey, Part, Solid, Vec3 } from '@settlewright/geometry';
import { BufferAttribute, BufferGeometry, ShapeUtils, Vector2 } from 'three';
import { addCushion } from './cushion-solid';
import type { SeatPrint } from './seat-print';
import { softPart } from './soft-part';
import { eachSolidList, type SolidArrays, type SolidSink } from './solid-arrays';
import { grainsOf, hasGrain } from './timber';
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

/** Outline of a solid in its own x-y or x-z plane, with what is needed to extrude it. */
function addFace(out: SolidSink, corners: Vec3[], normal: Vec3, material: number) {
  const [a, b, c, d] = corners as [Vec3, Vec3, Vec3, Vec3];
  for (const corner of [a, b, c, a, c, d]) {
    out.positions.push(...corner);
    out.normals.push(...normal);
    out.materials.push(material);
  }
}

function addEdge(out: SolidSink, a: Vec3, b: Vec3, weight: number) {
  out.edges.push(...a, ...b);
  out.edgeWeights.push(weight);
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
  const start = out.positions.length;
  for (let n = 0; n < ROUND_SIDES; n++) {
    const [a, b] = [(n / ROUND_SIDES) * Math.PI * 2, ((n + 1) / ROUND_SIDES) * Math.PI * 2];
    const [xa, za, xb, zb] = [Math.cos(a), Math.sin(a), Math.cos(b), Math.sin(b)];
    const [pa, pb] = [at(xa * radius, -h, za * radius), at(xb * radius, -h, zb * radius)];
    const [qa, qb] = [at(xa * radius, h, za * radius), at(xb * radius, h, zb * radius)];
    const [na, nb] = [along(xa, 0, za), along(xb, 0, zb)];
    out.positions.push(...pa, ...qa, ...pb, ...pb, ...qa, ...qb);
    out.normals.push(...na, ...na, ...nb, ...nb, ...na, ...nb);
    out.positions.push(...at(0, h, 0), ...qb, ...qa, ...at(0, -h, 0), ...pa, ...pb);
    for (const face of [along(0, 1, 0), along(0, -1, 0)]) out.normals.push(...face, ...face, ...face);
    for (let m = 0; m < 12; m++) out.materials.push(material);
    addEdge(out, qa, qb, 1);
    addEdge(out, pa, pb, 1);
  }
  for (const [list, again] of [
    [out.positions, out.roundPositions],
    [out.normals, out.roundNormals],
  ] as const) {
    const made = list.slice(start);
    for (let n = 0; n < made.length; n++) again.push(made[n]!);
  }
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
  for (const [a, b, c] of ShapeUtils.triangulateShape(flat, [])) {
    const corners = [a, b, c].map((n) => outline[n ?? 0] ?? [0, 0]);
    for (const [x, y] of corners) out.positions.push(...at(x, y, z));
    for (const [x, y] of [...corners].reverse()) out.positions.push(...at(x, y, -z));
    for (const face of [along(0, 0, 1), along(0, 0, -1)]) out.normals.push(...face, ...face, ...face);
    for (let m = 0; m < 6; m++) out.materials.push(material);
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

function addGrains({ positions, grains }: SolidSink, part: Part, start: number) {
  if (!hasGrain(part)) {
    for (let n = start; n < positions.length; n += 3) grains.push(0, 0, 0, 0);
    return;
  }
  const made = grainsOf(part, positions.slice(start));
  for (let n = 0; n < made.length; n++) grains.push(made[n]!);
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
    const start = out.positions.length;
    const soft = softPart(part);
    if (soft) addCushion(out, soft, material, printsOn(part.pieceId));
    else if (part.solid.shape === 'box') addBox(out, part, part.solid.sizeMm, material, weight);
    else if (part.solid.shape === 'cylinder') {
      addCylinder(out, part, part.solid.radiusMm, part.solid.heightMm, material);
    } else addPrism(out, part, part.solid, material);
    addGrains(out, part, start);
  }
}

/** Merges parts into one list of triangles and one of edges. */
export function mergeParts(
  parts: readonly Part[],
  printsOn: (pieceId: string) => readonly SeatPrint[] = () => [],
): SolidArrays {
  const out = eachSolidList((): number[] => []);
  addParts(out, parts, printsOn);
  return out;
}

type Numbers = readonly number[] | Float32Array;

const packed = (numbers: Numbers): Float32Array =>
  numbers instanceof Float32Array ? numbers : new Float32Array(numbers);

/** Triangles as they go to the card; those that have a material and no grain are plain. */
export function surfaceOf(
  positions: Numbers,
  normals: Numbers,
  materials?: Numbers,
  grains: Numbers = new Float32Array((materials?.length ?? 0) * 4),
): BufferGeometry {
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(packed(positions), 3));
  geometry.setAttribute('normal', new BufferAttribute(packed(normals), 3));
  if (materials) {
    geometry.setAttribute('tone', new BufferAttribute(packed(materials), 1));
    geometry.setAttribute('grain', new BufferAttribute(packed(grains), 4));
  }
  return geometry;
}

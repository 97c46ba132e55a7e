import { turnToRoom } from './body-placement.ts';
import type { Cage } from './cage.ts';
import type { FigureMeans } from './figure.ts';
import { giveWay } from './give-way.ts';
import { keepLegsApart } from './keep-apart.ts';
import type { MannequinPose } from './pose.ts';
import { press } from './press.ts';
import type { MannequinTag } from './segments.ts';
import { fitCage, skin, skinPoints, type SkinLevel } from './skin.ts';
import { solvedFigure } from './solve.ts';
import { measuringStance } from './stance.ts';
import { stretchesOfFaces } from './stretches.ts';
import { faceTriangles, gridsOf, outwardFlips } from './triangles.ts';

/** How finely a body is drawn: near for looking at and measuring on, far for a figure small in the picture. */
export type MannequinDetail = 'near' | 'far';

const level = (detail: MannequinDetail): { at: SkinLevel; size: number } =>
  detail === 'near' ? { at: skin().fine, size: 4 } : { at: skin().coarse, size: 2 };
/** Order of the tags in a mesh; `tags` holds places in this list. */
export const MANNEQUIN_TAGS: readonly MannequinTag[] = ['suit', 'head', 'hand', 'shoe'];

/** A closed, smooth, indexed triangle mesh of one sitter in the room frame, millimetres. */
export interface MannequinMesh {
  positions: Float32Array;
  normals: Float32Array;
  indices: Uint32Array;
  /** For every vertex its place in `MANNEQUIN_TAGS`; vertices on a border are doubled so that colours stay crisp. */
  tags: Uint8Array;
  /** Stretches of `indices` with one tag each. */
  groups: { tag: MannequinTag; start: number; count: number }[];
  /** Tailored seams as pairs of vertices. */
  seams: Uint32Array;
}

/** What every mesh has in common. */
interface Template {
  /** Skin point of every vertex. */
  source: Uint32Array;
  indices: Uint32Array;
  /** The triangles in skin points. */
  triangles: Uint32Array;
  /** The stretch of every triangle, by its place in `STRETCH_NAMES`. */
  stretches: Uint8Array;
  tags: Uint8Array;
  groups: MannequinMesh['groups'];
  seams: Uint32Array;
}

const TAG_OF_REGION = { trunk: 0, arm: 0, leg: 0, head: 1, hand: 2, shoe: 3 } as const;

/** Cage edges that carry a seam: centre lines, princess lines, waist, neck, armholes, hips, elbows, knees, wrists, ankles. */
function seamEdges(cage: Cage): [number, number][] {
  const edges: [number, number][] = [];
  const loop = (ids: readonly number[]): void =>
    ids.forEach((a, i) => {
      const b = ids[(i + 1) % ids.length]!;
      if (a >= 0 && b >= 0) edges.push([a, b]);
    });
  const chain = (ids: readonly number[]): void => {
    for (let i = 0; i + 1 < ids.length; i++)
      if (ids[i]! >= 0 && ids[i + 1]! >= 0) edges.push([ids[i]!, ids[i + 1]!]);
  };
  loop(cage.trunk[3]!);
  loop(cage.trunk[8]!);
  for (const column of [0, 1, 11, 6, 5, 7]) chain(cage.trunk.slice(1, 9).map((ring) => ring[column]!));
  for (const side of [0, 1] as const) {
    loop(cage.arms[side][0]!);
    for (const ring of [4, 6]) loop(cage.arms[side][ring]!);
    for (const ring of [4, 7]) loop(cage.legs[side][ring]!);
    chain(cage.legs[side][0]!.slice(0, 4));
  }
  return edges;
}

function buildTemplate(detail: MannequinDetail): Template {
  const { cage } = skin();
  const { at, size } = level(detail);
  const grids = gridsOf(at.level, cage.faces.length, size);
  const flips = outwardFlips(cage);
  const stretchOf = stretchesOfFaces(cage);
  const stretches: number[] = [];
  const source: number[] = [];
  const tags: number[] = [];
  const triangles: number[] = [];
  const indices: number[] = [];
  const groups: Template['groups'] = [];
  const suitVertex = new Map<number, number>();
  MANNEQUIN_TAGS.forEach((tag, place) => {
    const vertexOf = new Map<number, number>();
    const start = indices.length;
    cage.faces.forEach((face, f) => {
      if (TAG_OF_REGION[face.region] !== place) return;
      const own = faceTriangles(face, grids[f]!, size, flips[f]!);
      for (let t = 0; t < own.length; t += 3) stretches.push(stretchOf[f]!);
      for (const id of own) {
        let vertex = vertexOf.get(id);
        if (vertex === undefined) {
          vertex = source.length;
          vertexOf.set(id, vertex);
          source.push(id);
          tags.push(place);
          if (!suitVertex.has(id)) suitVertex.set(id, vertex);
        }
        triangles.push(id);
        indices.push(vertex);
      }
    });
    groups.push({ tag, start, count: indices.length - start });
  });
  return {
    source: Uint32Array.from(source),
    indices: Uint32Array.from(indices),
    triangles: Uint32Array.from(triangles),
    stretches: Uint8Array.from(stretches),
    tags: Uint8Array.from(tags),
    groups,
    seams: seamVertices(cage, grids, size, suitVertex),
  };
}

/** Seam edges refined along the skin, as pairs of mesh vertices. */
function seamVertices(
  cage: Cage,
  grids: Uint32Array[],
  size: number,
  vertexOf: Map<number, number>,
): Uint32Array {
  const wanted = new Set(seamEdges(cage).map(([a, b]) => (a < b ? `${a},${b}` : `${b},${a}`)));
  const pairs: number[] = [];
  cage.faces.forEach((face, f) => {
    const sides = [
      (i: number) => i,
      (i: number) => i * (size + 1) + size,
      (i: number) => size * (size + 1) + size - i,
      (i: number) => (size - i) * (size + 1),
    ];
    sides.forEach((at, s) => {
      const a = face.corners[s]!;
      const b = face.corners[(s + 1) % 4]!;
      if (!wanted.delete(a < b ? `${a},${b}` : `${b},${a}`)) return;
      const run = Array.from({ length: size + 1 }, (_, i) => vertexOf.get(grids[f]![at(i)]!)).filter(
        (v) => v !== undefined,
      );
      for (let i = 0; i + 1 < run.length; i++) pairs.push(run[i]!, run[i + 1]!);
    });
  });
  return Uint32Array.from(pairs);
}

const templates: Partial<Record<MannequinDetail, Template>> = {};
const templateOf = (detail: MannequinDetail): Template => (templates[detail] ??= buildTemplate(detail));

/** The stretch of every triangle of a near mesh, by its place in `STRETCH_NAMES`. */
export const nearStretches = (): Uint8Array => templateOf('near').stretches;

/** Unit normals of the skin points, weighted by the area of the triangles around them. */
function skinNormals(points: Float64Array, triangles: Uint32Array): Float64Array {
  const normals = new Float64Array(points.length);
  for (let t = 0; t < triangles.length; t += 3) {
    const a = triangles[t]! * 3;
    const b = triangles[t + 1]! * 3;
    const c = triangles[t + 2]! * 3;
    const ux = points[b]! - points[a]!;
    const uy = points[b + 1]! - points[a + 1]!;
    const uz = points[b + 2]! - points[a + 2]!;
    const vx = points[c]! - points[a]!;
    const vy = points[c + 1]! - points[a + 1]!;
    const vz = points[c + 2]! - points[a + 2]!;
    const nx = uy * vz - uz * vy;
    const ny = uz * vx - ux * vz;
    const nz = ux * vy - uy * vx;
    normals[a]! += nx;
    normals[a + 1]! += ny;
    normals[a + 2]! += nz;
    normals[b]! += nx;
    normals[b + 1]! += ny;
    normals[b + 2]! += nz;
    normals[c]! += nx;
    normals[c + 1]! += ny;
    normals[c + 2]! += nz;
  }
  return normals;
}

/**
 * Skin of a posed body.
 *
 * The surface is the limit of a subdivision cage lofted through sections of the body, shaped so that in
 * the measuring posture its extents are the person's measures.
 *
 * @param pose - from `poseMannequin`
 * @param detail - near: about 15 000 triangles, the only one to measure on; far: 4352, off by 1 mm on average and
 * 12 mm at most
 * @returns one merged mesh in the room frame, millimetres, with unit normals
 * @source E. Catmull, J. Clark 1978 for the surface; sections by eye over ANSUR II measures
 */
export function mannequinMesh(
  pose: Pick<MannequinPose, 'means' | 'stance' | 'placement'>,
  detail: MannequinDetail = 'near',
): MannequinMesh {
  const { at } = level(detail);
  const { source, indices, triangles, tags, groups, seams } = templateOf(detail);
  const { drawn } = solvedFigure(pose.means);
  const points = skinPoints(at, fitCage(drawn, pose.stance));
  press(points, at, drawn, pose.stance);
  keepLegsApart(points, at, drawn, pose.stance);
  giveWay(points, at, drawn, pose.stance);
  const normals = skinNormals(points, triangles);

  const [ax, ay, az] = [
    turnToRoom(pose.placement, [1, 0, 0]),
    turnToRoom(pose.placement, [0, 1, 0]),
    turnToRoom(pose.placement, [0, 0, 1]),
  ];
  const origin = pose.placement.originMm;
  const outPositions = new Float32Array(source.length * 3);
  const outNormals = new Float32Array(source.length * 3);
  for (let v = 0; v < source.length; v++) {
    const s = source[v]! * 3;
    const px = points[s]!;
    const py = points[s + 1]!;
    const pz = points[s + 2]!;
    const nx = normals[s]!;
    const ny = normals[s + 1]!;
    const nz = normals[s + 2]!;
    const size = Math.sqrt(nx * nx + ny * ny + nz * nz) || 1;
    for (let i = 0; i < 3; i++) {
      outPositions[v * 3 + i] = origin[i]! + ax[i]! * px + ay[i]! * py + az[i]! * pz;
      outNormals[v * 3 + i] = (ax[i]! * nx + ay[i]! * ny + az[i]! * nz) / size;
    }
  }
  return { positions: outPositions, normals: outNormals, indices, tags, groups, seams };
}

/**
 * Skin of a body in the posture in which its measures are defined: upright on the plane y = 0 with the rearmost buttock
 * at z = 0, facing +z, shins upright, upper arms hanging, forearms level, without shoes.
 *
 * @param means - body measures in millimetres, weight in kilograms
 * @returns the near mesh; throws a RangeError naming the measure when one is missing
 * @source posture of ISO 7250-1
 */
export function measuringMesh(means: FigureMeans): MannequinMesh {
  const placement = { originMm: [0, 0, 0] as const, facingRad: 0, tiltRad: 0 };
  return mannequinMesh({ means, stance: measuringStance(solvedFigure(means).drawn), placement });
}

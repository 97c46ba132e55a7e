import { partEdges } from '../drawing/solid-outline.ts';
import { along as stepAlong, dot, length, sub } from '../mannequin/vector.ts';
import { toPiece } from '../parts/placement.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { bodyPoint, type MeasuredBody } from './body-points.ts';
import { BODY_POINT_KEYS, type MeasureEnd } from './dimension.ts';
import type { MeasuringScene } from './measuring-scene.ts';
import { hitPart, hitSkin, pointAlong, type SightLine } from './ray-hits.ts';

/** What a tape looks for under the pointer. */
export interface SnapInput {
  line: SightLine;
  /** How near the line of sight a corner, edge or body point must be at that way from the eye, millimetres. */
  reachMm: (alongMm: number) => number;
  /** Nearer than this along the line nothing is seen: a section took it away. */
  fromMm?: number;
  /** Takes the whole part or body under the pointer, for the shortest way between two. */
  whole?: boolean;
  /** Parts that are drawn; others are passed over. */
  parts: readonly Part[];
}

interface Near {
  end: MeasureEnd;
  pointMm: Vec3;
  /** From the line of sight, in parts of the reach there: at most 1. */
  off: number;
  alongMm: number;
}

/** Parts and skin are met this much deeper than a corner of theirs that still counts as seen, in parts of the reach. */
const BEHIND = 1.5;

/** As near as makes no difference to the hand, in parts of the reach: then what is nearer the eye is taken. */
const ALIKE = 0.15;

const isNearer = (one: Near, best: Near): boolean =>
  Math.abs(one.off - best.off) > ALIKE ? one.off < best.off : one.alongMm < best.alongMm;

/** How far along the line of sight a point stands, and how far off it. */
function seen({ origin, direction }: SightLine, point: Vec3): { alongMm: number; offMm: number } {
  const out = sub(point, origin);
  const alongMm = dot(out, direction);
  return {
    alongMm,
    offMm: length(sub(out, [direction[0] * alongMm, direction[1] * alongMm, direction[2] * alongMm])),
  };
}

/** Where an edge comes nearest to the line of sight, 0 to 1. */
function nearestOn(a: Vec3, b: Vec3, { origin, direction }: SightLine): number {
  const [edge, out] = [sub(b, a), sub(a, origin)];
  const [ee, ed, eo, od] = [dot(edge, edge), dot(edge, direction), dot(edge, out), dot(out, direction)];
  const area = ee - ed * ed;
  if (area < 1e-6 * ee) return 0;
  return Math.min(1, Math.max(0, (ed * od - eo) / area));
}

const placeOf = ({ pieceId, place }: MeasuredBody) => ({ on: 'body' as const, pieceId, place });

/**
 * What stands under the pointer: a corner before an edge before a face, a named point of a body before the part
 * behind it. What is hidden behind something nearer is not taken.
 *
 * @param scene - the set and who sits in it
 * @param input - where is looked, and how near is near enough
 * @returns the end and where it lies, room frame; `undefined` over paper
 */
export function snapEnd(
  scene: MeasuringScene,
  { line, reachMm, fromMm = 0, whole = false, parts }: SnapInput,
): { end: MeasureEnd; pointMm: Vec3 } | undefined {
  let depth = Infinity;
  let hit: Part | MeasuredBody | undefined;
  for (const thing of [...parts, ...scene.bodies]) {
    const t = 'mesh' in thing ? hitSkin(thing.mesh, line, fromMm) : hitPart(thing, line, fromMm);
    if (t !== undefined && t < depth) [depth, hit] = [t, thing];
  }
  const surface = hit && { thing: hit, pointMm: pointAlong(line, depth) };
  if (whole) return surface && { pointMm: surface.pointMm, end: wholeOf(surface.thing) };

  const near = (point: Vec3): Pick<Near, 'off' | 'alongMm'> | undefined => {
    const { alongMm, offMm } = seen(line, point);
    const reach = reachMm(alongMm);
    if (alongMm < fromMm || offMm > reach || alongMm > depth + BEHIND * reach) return undefined;
    return { off: offMm / reach, alongMm };
  };
  const nearest = (found: readonly Near[]): Near | undefined =>
    found.reduce<Near | undefined>((best, one) => (best && !isNearer(one, best) ? best : one), undefined);

  const onBodies = scene.bodies.flatMap((body) =>
    BODY_POINT_KEYS.flatMap((point): Near[] => {
      const pointMm = bodyPoint(body, point);
      const how = near(pointMm);
      return how === undefined ? [] : [{ end: { ...placeOf(body), point }, pointMm, ...how }];
    }),
  );
  const onCorners: Near[] = [];
  const onEdges: Near[] = [];
  for (const part of parts) {
    const { corners, edges } = partEdges(part);
    const { pieceId, id: partId } = part;
    if (part.solid.shape !== 'cylinder') {
      corners.forEach((pointMm, corner) => {
        const how = near(pointMm);
        if (how !== undefined)
          onCorners.push({ end: { on: 'corner', pieceId, partId, corner }, pointMm, ...how });
      });
    }
    edges.forEach(([i, j], edge) => {
      const [a, b] = [corners[i]!, corners[j]!];
      const share = nearestOn(a, b, line);
      const pointMm = stepAlong(a, sub(b, a), share);
      const how = near(pointMm);
      if (how !== undefined)
        onEdges.push({ end: { on: 'edge', pieceId, partId, edge, along: share }, pointMm, ...how });
    });
  }
  const taken = nearest([...onCorners, ...onBodies]) ?? nearest(onEdges);
  if (taken) return { end: taken.end, pointMm: taken.pointMm };
  if (!surface) return undefined;
  if ('mesh' in surface.thing) return nearestOfBody(surface.thing, surface.pointMm);
  const piece = scene.pieces.get(surface.thing.pieceId);
  if (!piece) return undefined;
  const [x, y, z] = toPiece(piece.at, surface.pointMm);
  const { pieceId, id: partId } = surface.thing;
  return { end: { on: 'spot', pieceId, partId, atMm: [x, y, z] }, pointMm: surface.pointMm };
}

function wholeOf(thing: Part | MeasuredBody): MeasureEnd {
  if ('mesh' in thing) return { ...placeOf(thing), point: 'whole' };
  return { on: 'part', pieceId: thing.pieceId, partId: thing.id };
}

/** On bare skin the nearest named point is taken: a line never keeps a spot of somebody's body. */
function nearestOfBody(body: MeasuredBody, at: Vec3): { end: MeasureEnd; pointMm: Vec3 } {
  const points = BODY_POINT_KEYS.map((point) => ({ point, pointMm: bodyPoint(body, point) }));
  const away = ({ pointMm }: { pointMm: Vec3 }): number => length(sub(pointMm, at));
  const { point, pointMm } = points.reduce((best, one) => (away(one) < away(best) ? one : best));
  return { end: { ...placeOf(body), point }, pointMm };
}

import type { MannequinMesh } from '../mannequin/mesh.ts';
import type { MannequinPose } from '../mannequin/pose.ts';
import type { Part, PartRole, Vec3 } from '../parts/part.ts';
import { gapBetween, type Gap } from './gap.ts';
import { boundsAround, boundsGap, type Bounds, type Shape } from './shape.ts';
import { skinGap } from './skin-gap.ts';
import { partShape, segmentShape } from './solids.ts';

/** A body in its posture at its place. */
export interface PlacedBody {
  placeId: string;
  /** The piece it sits on. */
  pieceId: string;
  pose: Pick<MannequinPose, 'segments'>;
  /** The near mesh; where it is given, distances from parts are measured on it. */
  mesh?: MannequinMesh;
}

/** What a body comes near to. */
export type Thing =
  | { kind: 'part'; partId: string; pieceId: string; role: PartRole }
  | { kind: 'body'; placeId: string; segment: string };

/** One distance of a sitter. */
export interface SitterGap extends Gap {
  /** The place of the body, such as `left forearm`. */
  segment: string;
  thing: Thing;
  /** Solids stand for the body within 3 mm, elbows and shoulders of raised arms within 10. */
  measuredOn: 'skin' | 'solids';
}

/** What a sitter touches and how much room there is beyond that. */
export interface SitterDistances {
  placeId: string;
  /** Further in than 3 mm, deepest first. */
  overlaps: SitterGap[];
  /** Within 3 mm of each other. */
  contacts: SitterGap[];
  /** The smallest gap to anything the sitter does not touch; absent where nothing is within the reach. */
  smallest?: SitterGap;
}

/** Nearer than this, up to as much inside, two things touch: the accuracy of the body. */
export const CONTACT_MM = 3;
/** Gaps wider than this are in nobody's way. */
const REACH_MM = 1500;
/** What a sitter rests on by sitting there. */
const SEAT_ROLES: readonly PartRole[] = [
  'seat-cushion',
  'back-cushion',
  'seat',
  'deck',
  'lip',
  'back-board',
  'back-frame',
];

interface Solid {
  shape: Shape;
  thing: Thing;
}

interface Body {
  of: PlacedBody;
  solids: { name: string; shape: Shape }[];
  bounds: Bounds;
}

/** A part or a neighbour as a whole. */
interface Other {
  bounds: Bounds;
  solids: readonly Solid[];
}

/**
 * Contacts, overlaps and the smallest gap of every sitter, to parts and to the other sitters. The seat and the back that
 * a sitter rests on are left out: how far a cushion gives way is the posture's matter.
 *
 * @param bodies - the sitters of a set
 * @param parts - its parts
 * @returns one entry a sitter, in the same order; millimetres, room frame
 */
export function sitterDistances(bodies: readonly PlacedBody[], parts: readonly Part[]): SitterDistances[] {
  const made = bodies.map((of): Body => {
    const solids = of.pose.segments.map((segment) => ({ name: segment.name, shape: segmentShape(segment) }));
    return { of, solids, bounds: boundsAround(solids.map(({ shape }) => shape)) };
  });
  const neighbours = made.map(({ of, solids, bounds }): Other => ({
    bounds,
    solids: solids.map(({ name, shape }) => ({
      shape,
      thing: { kind: 'body', placeId: of.placeId, segment: name },
    })),
  }));
  const furniture = parts.map(({ id, pieceId, role, ...part }) => {
    const shape = partShape({ id, pieceId, role, ...part });
    const thing: Thing = { kind: 'part', partId: id, pieceId, role };
    return { pieceId, role, bounds: shape, solids: [{ shape, thing }] };
  });
  return made.map((body, i) => {
    const others: Other[] = [
      ...furniture.filter(({ pieceId, role }) => pieceId !== body.of.pieceId || !SEAT_ROLES.includes(role)),
      ...neighbours.filter((_, j) => j !== i),
    ];
    return distancesOf(body, others);
  });
}

/** Goes through what is there by the least distance it can have, so that most of it is never looked at. */
function distancesOf(body: Body, others: readonly Other[]): SitterDistances {
  const byBounds = others
    .map((other) => ({ other, atLeast: boundsGap(body.bounds, other.bounds) }))
    .filter(({ atLeast }) => atLeast < REACH_MM)
    .sort((a, b) => a.atLeast - b.atLeast);
  const found: SitterDistances = { placeId: body.of.placeId, overlaps: [], contacts: [] };
  let smallest: SitterGap | undefined;
  for (const { other, atLeast } of byBounds) {
    const limit = smallest?.distanceMm ?? REACH_MM;
    if (atLeast > limit) break;
    for (const gap of gapsTo(body, other, limit)) {
      if (gap.distanceMm < -CONTACT_MM) found.overlaps.push(gap);
      else if (gap.distanceMm <= CONTACT_MM) found.contacts.push(gap);
      else if (!smallest || gap.distanceMm < smallest.distanceMm) smallest = gap;
    }
  }
  found.overlaps.sort((a, b) => a.distanceMm - b.distanceMm);
  return smallest ? { ...found, smallest } : found;
}

/** Every contact and overlap with one thing, a stretch of the body each; where there is none, the smallest gap. */
function gapsTo(body: Body, other: Other, limit: number): SitterGap[] {
  const met: SitterGap[] = [];
  let nearest: SitterGap | undefined;
  for (const { name, shape } of body.solids) {
    if (boundsGap(shape, other.bounds) > Math.min(limit, nearest?.distanceMm ?? limit)) continue;
    let deepest: SitterGap | undefined;
    for (const solid of other.solids) {
      const atMost = Math.max(CONTACT_MM, Math.min(limit, nearest?.distanceMm ?? limit));
      const gap = gapBetween(shape, solid.shape, atMost);
      if (!gap) continue;
      const one: SitterGap = { ...gap, segment: name, thing: solid.thing, measuredOn: 'solids' };
      if (gap.distanceMm > CONTACT_MM) {
        if (!nearest || gap.distanceMm < nearest.distanceMm) nearest = one;
      } else if (!deepest || gap.distanceMm < deepest.distanceMm) deepest = one;
    }
    if (deepest) met.push(deepest);
  }
  if (met.length === 0) return nearest ? [onSkin(body, other, nearest)] : [];
  met.sort((a, b) => a.distanceMm - b.distanceMm);
  return met.map((gap, i) => (i === 0 ? onSkin(body, other, gap) : gap));
}

/** The same distance measured on the mesh, where there is one. */
function onSkin(body: Body, other: Other, gap: SitterGap): SitterGap {
  const { mesh } = body.of;
  const [only] = other.solids;
  if (!mesh || only?.thing.kind !== 'part') return gap;
  const measured = skinGap(mesh, only.shape, gap.distanceMm + SKIN_BEYOND_MM);
  if (!measured) return gap;
  const segment = stretchAt(body, measured.fromMm) ?? gap.segment;
  return { ...measured, segment, thing: only.thing, measuredOn: 'skin' };
}

/** The skin may be further off than the solids by this much. */
const SKIN_BEYOND_MM = 20;

/** The stretch of a body nearest to a point of its skin. */
function stretchAt(body: Body, at: Vec3): string | undefined {
  const point: Shape = {
    minMm: at,
    maxMm: at,
    marginMm: 0,
    support: (_x, _y, _z, out) => out.set(at),
  };
  let best: { name: string; distanceMm: number } | undefined;
  for (const { name, shape } of body.solids) {
    const gap = gapBetween(shape, point, best?.distanceMm);
    if (gap && (!best || gap.distanceMm < best.distanceMm)) best = { name, distanceMm: gap.distanceMm };
  }
  return best?.name;
}

import type { Part, PartRole, Vec3 } from '../parts/part.ts';
import { gapBetween } from './gap.ts';
import { boundsAround, boundsGap, type Bounds, type Shape } from './shape.ts';
import {
  CONTACT_MM,
  type PlacedBody,
  type SitterDistances,
  type SitterGap,
  type Thing,
} from './sitter-gap.ts';
import { skinGap, skinsGap } from './skin-gap.ts';
import { partShape, segmentShape } from './solids.ts';

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
  /** Set where it is a neighbour. */
  body?: Body;
}

/** A stretch of a body and a solid it may come near to. */
interface Pair {
  segment: string;
  shape: Shape;
  solid: Solid;
  /** Least distance that their boxes leave open. */
  atLeast: number;
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
  const neighbours = made.map((body): Other => {
    const { of, solids, bounds } = body;
    return {
      bounds,
      body,
      solids: solids.map(({ name, shape }): Solid => ({
        shape,
        thing: { kind: 'body', placeId: of.placeId, segment: name },
      })),
    };
  });
  const furniture = parts.map((part) => {
    const { id, pieceId, role } = part;
    const solid: Solid = { shape: partShape(part), thing: { kind: 'part', partId: id, pieceId, role } };
    return { pieceId, role, bounds: solid.shape, solids: [solid] };
  });
  return made.map((body, i) => {
    const own = body.of.pieceId;
    const others = [
      ...furniture.filter(({ pieceId, role }) => pieceId !== own || !SEAT_ROLES.includes(role)),
      ...neighbours.filter((_, j) => j !== i),
    ];
    return distancesOf(body, others);
  });
}

function distancesOf(body: Body, others: readonly Other[]): SitterDistances {
  const found: SitterDistances = { placeId: body.of.placeId, overlaps: [], contacts: [] };
  const clear: Other[] = [];
  for (const other of others) {
    const met = meetings(body, other).sort((a, b) => a.distanceMm - b.distanceMm);
    if (met.length === 0) clear.push(other);
    met.forEach((gap, i) => {
      const measured = i === 0 ? onSkin(body, gap, other) : gap;
      (measured.distanceMm < -CONTACT_MM ? found.overlaps : found.contacts).push(measured);
    });
  }
  found.overlaps.sort((a, b) => a.distanceMm - b.distanceMm);
  const nearest = smallestGap(body, clear);
  return nearest ? { ...found, smallest: onSkin(body, nearest.gap, nearest.other) } : found;
}

/** Contacts and overlaps with one thing: for each stretch of the body the deepest. */
function meetings(body: Body, other: Other): SitterGap[] {
  if (boundsGap(body.bounds, other.bounds) > CONTACT_MM) return [];
  return body.solids.flatMap(({ name, shape }) => {
    if (boundsGap(shape, other.bounds) > CONTACT_MM) return [];
    let deepest: SitterGap | undefined;
    for (const { shape: theirs, thing } of other.solids) {
      const gap = gapBetween(shape, theirs, CONTACT_MM);
      if (gap && (!deepest || gap.distanceMm < deepest.distanceMm)) {
        deepest = { ...gap, segment: name, thing, measuredOn: 'solids' };
      }
    }
    return deepest ? [deepest] : [];
  });
}

/** Goes through the pairs by the least distance they can have, so that most are never looked at. */
function smallestGap(body: Body, others: readonly Other[]): { gap: SitterGap; other: Other } | undefined {
  const byBounds = others
    .map((other) => ({ other, atLeast: boundsGap(body.bounds, other.bounds) }))
    .filter(({ atLeast }) => atLeast < REACH_MM)
    // Parts before bodies: one solid each soon says how near is near.
    .sort((a, b) => a.atLeast - b.atLeast || a.other.solids.length - b.other.solids.length);
  let best: { gap: SitterGap; other: Other } | undefined;
  let limit = REACH_MM;
  for (const { other, atLeast: whole } of byBounds) {
    if (whole > limit) break;
    const pairs: Pair[] = [];
    const theirs = other.solids.filter(({ shape }) => boundsGap(body.bounds, shape) <= limit);
    for (const { name: segment, shape } of body.solids) {
      if (boundsGap(shape, other.bounds) > limit) continue;
      for (const solid of theirs) {
        const atLeast = boundsGap(shape, solid.shape);
        if (atLeast <= limit) pairs.push({ segment, shape, solid, atLeast });
      }
    }
    pairs.sort((a, b) => a.atLeast - b.atLeast);
    for (const { segment, shape, solid, atLeast } of pairs) {
      if (atLeast > limit) break;
      const gap = gapBetween(shape, solid.shape, limit);
      if (!gap || gap.distanceMm >= limit) continue;
      limit = gap.distanceMm;
      best = { gap: { ...gap, segment, thing: solid.thing, measuredOn: 'solids' }, other };
    }
  }
  return best;
}

/** The same distance measured on the meshes, where there are any; of bodies that meet the solids say how deep. */
function onSkin(body: Body, gap: SitterGap, other: Other): SitterGap {
  const { mesh } = body.of;
  const [only] = other.solids;
  if (!mesh || !only) return gap;
  const limit = gap.distanceMm + SKIN_BEYOND_MM;
  if (only.thing.kind === 'part') {
    const measured = skinGap(mesh, only.shape, limit);
    if (!measured) return gap;
    const segment = stretchAt(body, measured.fromMm) ?? gap.segment;
    return { ...measured, segment, thing: only.thing, measuredOn: 'skin' };
  }
  const theirs = other.body?.of.mesh;
  const measured = theirs && skinsGap(mesh, theirs, limit);
  if (!measured || !other.body || gap.thing.kind !== 'body') return gap;
  const segment = stretchAt(body, measured.fromMm) ?? gap.segment;
  const theirSegment = stretchAt(other.body, measured.toMm) ?? gap.thing.segment;
  return { ...measured, segment, thing: { ...gap.thing, segment: theirSegment }, measuredOn: 'skin' };
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

import type { Part, PartRole } from '../parts/part.ts';
import type { Gap } from './gap.ts';
import { boundsAround, boundsGap, type Bounds } from './shape.ts';
import {
  CONTACT_MM,
  type PlacedBody,
  type SitterDistances,
  type SitterGap,
  type Thing,
} from './sitter-gap.ts';
import { skinPatches } from './skin-patches.ts';
import { partSurface, segmentShape } from './solids.ts';
import { solidSurface, surfaceGap, type Surface } from './surface.ts';

/** Gaps wider than this are in nobody's way. */
const REACH_MM = 1500;
/** What a sitter rests on by sitting there. */
export const SEAT_ROLES: readonly PartRole[] = [
  'seat-cushion',
  'back-cushion',
  'seat',
  'deck',
  'lip',
  'back-board',
  'back-frame',
];

/** A stretch of a body: its skin, or a simple solid where there is no mesh. */
interface Stretch {
  name: string;
  surface: Surface;
}

interface Body {
  of: PlacedBody;
  stretches: readonly Stretch[];
  bounds: Bounds;
}

/** A surface that a body may come near to. */
interface Near {
  surface: Surface;
  thing: Thing;
}

/** A part or a neighbour as a whole. */
interface Other {
  bounds: Bounds;
  surfaces: readonly Near[];
  /** Of a body without a mesh. */
  onSolids: boolean;
}

/** A stretch of a body and a surface it may come near to. */
interface Pair {
  segment: string;
  surface: Surface;
  near: Near;
  /** Least distance that their boxes leave open. */
  atLeast: number;
}

const solidsOf = ({ pose }: PlacedBody): Stretch[] =>
  pose.segments.map((segment) => ({ name: segment.name, surface: solidSurface(segmentShape(segment)) }));

/** The stretches that distances of a body are measured on. */
const stretchesOf = (body: PlacedBody): Stretch[] =>
  body.mesh ? skinPatches(body.mesh).map((patch) => ({ name: patch.name, surface: patch })) : solidsOf(body);

/**
 * Contacts, overlaps and the smallest gap of every sitter, to parts and to the other sitters. The seat and the back that
 * a sitter rests on are left out: how far a cushion gives way is the posture's matter.
 *
 * @param bodies - the sitters of a set; measured on their meshes where they have one, else on their simple solids
 * @param parts - its parts
 * @returns one entry a sitter, in the same order; millimetres, room frame
 */
export function sitterDistances(bodies: readonly PlacedBody[], parts: readonly Part[]): SitterDistances[] {
  const made = bodies.map((of): Body => {
    const stretches = stretchesOf(of);
    return { of, stretches, bounds: boundsAround(stretches.map(({ surface }) => surface)) };
  });
  const neighbours = made.map(({ of, stretches, bounds }): Other => ({
    bounds,
    onSolids: !of.mesh,
    surfaces: stretches.map(({ name, surface }): Near => ({
      surface,
      thing: { kind: 'body', placeId: of.placeId, segment: name },
    })),
  }));
  const furniture = parts.map((part) => {
    const { id, pieceId, role } = part;
    const surface = partSurface(part);
    const thing: Thing = { kind: 'part', partId: id, pieceId, role };
    return { pieceId, role, bounds: surface, surfaces: [{ surface, thing }], onSolids: false };
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
    const met = meetings(body, other);
    if (met.length === 0) clear.push(other);
    for (const gap of met) (gap.distanceMm < -CONTACT_MM ? found.overlaps : found.contacts).push(gap);
  }
  found.overlaps.sort((a, b) => a.distanceMm - b.distanceMm);
  const smallest = smallestGap(body, clear);
  return smallest ? { ...found, smallest } : found;
}

const gapOf = (body: Body, segment: string, gap: Gap, thing: Thing, onSolids: boolean): SitterGap => ({
  ...gap,
  segment,
  thing,
  measuredOn: body.of.mesh && !onSolids ? 'skin' : 'solids',
});

const isWithin = (inner: Bounds, outer: Bounds): boolean =>
  [0, 1, 2].every((n) => inner.minMm[n]! > outer.minMm[n]! && inner.maxMm[n]! < outer.maxMm[n]!);

/** Contacts and overlaps with one thing: for each stretch of the body the deepest. */
function meetings(body: Body, other: Other): SitterGap[] {
  if (boundsGap(body.bounds, other.bounds) > CONTACT_MM) return [];
  const met = meetingsOf(body, body.stretches, other);
  if (met.length > 0 || !body.of.mesh || !isWithin(other.bounds, body.bounds)) return met;
  // What lies wholly inside the flesh meets no skin.
  const inside = meetingsOf(body, solidsOf(body.of), { ...other, onSolids: true });
  return inside.filter(({ distanceMm }) => distanceMm < -SOLIDS_OFF_MM);
}

/** Solids reach at most so far beyond the skin, but for crossed legs. */
const SOLIDS_OFF_MM = 10;

function meetingsOf(
  body: Body,
  stretches: readonly Stretch[],
  { bounds, surfaces, onSolids }: Other,
): SitterGap[] {
  return stretches.flatMap(({ name, surface }) => {
    if (boundsGap(surface, bounds) > CONTACT_MM) return [];
    let deepest: SitterGap | undefined;
    for (const { surface: theirs, thing } of surfaces) {
      const gap = surfaceGap(surface, theirs, CONTACT_MM);
      if (gap && (!deepest || gap.distanceMm < deepest.distanceMm)) {
        deepest = gapOf(body, name, gap, thing, onSolids);
      }
    }
    return deepest ? [deepest] : [];
  });
}

/** Goes through the pairs by the least distance they can have, so that most are never looked at. */
function smallestGap(body: Body, others: readonly Other[]): SitterGap | undefined {
  const byBounds = others
    .map((other) => ({ other, atLeast: boundsGap(body.bounds, other.bounds) }))
    .filter(({ atLeast }) => atLeast < REACH_MM)
    // Parts before bodies: one solid each soon says how near is near.
    .sort((a, b) => a.atLeast - b.atLeast || a.other.surfaces.length - b.other.surfaces.length);
  let best: SitterGap | undefined;
  let limit = REACH_MM;
  for (const { other, atLeast: whole } of byBounds) {
    if (whole > limit) break;
    const pairs: Pair[] = [];
    const theirs = other.surfaces.filter(({ surface }) => boundsGap(body.bounds, surface) <= limit);
    for (const { name: segment, surface } of body.stretches) {
      if (boundsGap(surface, other.bounds) > limit) continue;
      for (const near of theirs) {
        const atLeast = boundsGap(surface, near.surface);
        if (atLeast <= limit) pairs.push({ segment, surface, near, atLeast });
      }
    }
    pairs.sort((a, b) => a.atLeast - b.atLeast);
    for (const { segment, surface, near, atLeast } of pairs) {
      if (atLeast > limit) break;
      const gap = surfaceGap(surface, near.surface, limit);
      if (!gap || gap.distanceMm >= limit) continue;
      limit = gap.distanceMm;
      best = gapOf(body, segment, gap, near.thing, other.onSolids);
    }
  }
  return best;
}

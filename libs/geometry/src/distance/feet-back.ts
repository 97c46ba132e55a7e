import type { MannequinPose } from '../mannequin/pose.ts';
import type { MannequinSegment } from '../mannequin/segments.ts';
import { add, dot, scale, sub } from '../mannequin/vector.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { gapBetween } from './gap.ts';
import { boundsAround, boundsGap, type Bounds, type Shape } from './shape.ts';
import { partSurface, segmentShape } from './solids.ts';
import { solidSurface, surfaceGap, type Surface } from './surface.ts';

/** What is kept between feet and what is before them. By eye. */
const AIR_MM = 10;
const STEP_MM = 5;
/** Nobody draws shins further back than this from upright. By eye, well within the range of a knee. */
const FURTHEST_RAD = (15 * Math.PI) / 180;

type Limb = Extract<MannequinSegment, { kind: 'rounded-cone' }>;

/** The lower legs of a sitter, and how far they have gone back. */
interface Legs {
  ahead: Vec3;
  limbs: readonly Limb[];
  /** Feet and shins where they are now. */
  shapes: Shape[];
  bounds: Bounds;
  backMm: number;
  mostMm: number;
}

/** Feet go back whole; shins turn about the knee. */
function shapesAt(limbs: readonly Limb[], ahead: Vec3, backMm: number): Shape[] {
  const by = scale(ahead, -backMm);
  return limbs.map((limb) =>
    segmentShape({
      ...limb,
      fromMm: limb.tag === 'shoe' ? add(limb.fromMm, by) : limb.fromMm,
      toMm: add(limb.toMm, by),
    }),
  );
}

function legsOf({ segments, placement, notes }: FootedPose): Legs {
  const { facingRad } = placement;
  const ahead: Vec3 = [Math.sin(facingRad), 0, Math.cos(facingRad)];
  const limbs = segments.filter(
    (segment): segment is Limb => segment.kind === 'rounded-cone' && /shin|foot/.test(segment.name),
  );
  const shapes = shapesAt(limbs, ahead, 0);
  const shins = limbs.filter(({ tag }) => tag !== 'shoe').map(({ fromMm, toMm }) => sub(toMm, fromMm));
  const least = Math.min(
    ...shins.map((shin) => dot(shin, ahead) + Math.hypot(...shin) * Math.sin(FURTHEST_RAD)),
  );
  const placed = notes.some(({ kind }) => PLACED.includes(kind));
  return {
    ahead,
    limbs,
    shapes,
    bounds: boundsAround(shapes),
    backMm: 0,
    mostMm: placed ? 0 : Math.max(0, least),
  };
}

/** Feet that lie where somebody put them. */
const PLACED: readonly MannequinPose['notes'][number]['kind'][] = [
  'feet-on-rail',
  'ankles-crossed',
  'knees-crossed',
];

type FootedPose = Pick<MannequinPose, 'segments' | 'placement' | 'notes'>;

const middle = ({ minMm, maxMm }: Bounds): Vec3 => scale(add(minMm, maxMm), 0.5);

/** How near lower legs come to a surface, as far as it matters here. */
const gapTo = (shapes: readonly Shape[], surface: Surface): number =>
  Math.min(
    AIR_MM,
    ...shapes.map((shape) => surfaceGap(solidSurface(shape), surface, AIR_MM)?.distanceMm ?? AIR_MM),
  );

/** A step back, unless it goes too far or into something. */
function stepBack(legs: Legs, parts: readonly Surface[]): boolean {
  const backMm = legs.backMm + STEP_MM;
  if (backMm > legs.mostMm) return false;
  const shapes = shapesAt(legs.limbs, legs.ahead, backMm);
  const stops = parts.some((part) => {
    const gap = gapTo(shapes, part);
    return gap < AIR_MM && gap < gapTo(legs.shapes, part);
  });
  if (stops) return false;
  Object.assign(legs, { backMm, shapes, bounds: boundsAround(shapes) });
  return true;
}

/** Goes back until a part is clear; where that cannot be had nothing is gained by going. */
function clearOf(part: Surface, legs: Legs, parts: readonly Surface[]): void {
  const before = { ...legs };
  while (gapTo(legs.shapes, part) < AIR_MM) {
    if (!stepBack(legs, parts)) {
      Object.assign(legs, before);
      return;
    }
  }
}

/** Which of two pairs of legs are to go back as they are too near: those that have the other before them. */
function tooNear(one: Legs, other: Legs): Legs[] {
  if (boundsGap(one.bounds, other.bounds) >= AIR_MM) return [];
  for (const a of one.shapes) {
    for (const b of other.shapes) {
      if ((gapBetween(a, b, AIR_MM)?.distanceMm ?? AIR_MM) >= AIR_MM) continue;
      const way = sub(middle(b), middle(a));
      return [...(dot(way, one.ahead) > 0 ? [one] : []), ...(dot(way, other.ahead) < 0 ? [other] : [])];
    }
  }
  return [];
}

/**
 * How far sitters draw their feet back so that they keep clear of the feet of those opposite and of what stands before
 * them; those opposite each other go back alike. Feet that somebody put somewhere stay there.
 *
 * @param poses - the sitters of a set, as they sit each for themselves; room frame
 * @param parts - the parts of the set
 * @returns millimetres, in steps of 5, in the order of the poses; 0 where feet are clear or nothing is gained by going
 */
export function feetBack(poses: readonly FootedPose[], parts: readonly Part[]): number[] {
  const sitters = poses.map(legsOf);
  const surfaces = parts.map(partSurface);
  const near = sitters.map(({ bounds, mostMm }) =>
    surfaces.filter((surface) => boundsGap(bounds, surface) < AIR_MM + mostMm),
  );
  sitters.forEach((legs, i) => near[i]!.forEach((part) => clearOf(part, legs, near[i]!)));
  const pairs = sitters.flatMap((one, i) =>
    sitters.slice(i + 1).flatMap((other) => {
      const reach = AIR_MM + one.mostMm + other.mostMm;
      return boundsGap(one.bounds, other.bounds) < reach ? [[one, other] as const] : [];
    }),
  );
  for (let went = true; went;) {
    const going = new Set(pairs.flatMap(([one, other]) => tooNear(one, other)));
    went = false;
    for (const legs of going) went = stepBack(legs, near[sitters.indexOf(legs)]!) || went;
  }
  return sitters.map(({ backMm }) => backMm);
}

import { SHINS_BACK_RAD, type FeetMoved } from '../mannequin/leg-posture.ts';
import type { MannequinPose } from '../mannequin/pose.ts';
import { feetPlaced } from '../mannequin/pose-note.ts';
import type { MannequinSegment } from '../mannequin/segments.ts';
import { add, along, dot, scale, sub } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';
import { gapBetween } from './gap.ts';
import { boundsAround, boundsGap, type Bounds, type Shape } from './shape.ts';
import { CONTACT_MM } from './sitter-gap.ts';
import { segmentShape } from './solids.ts';
import { solidSurface, surfaceGap, type Surface } from './surface.ts';

/** What is kept between feet and what is before them. By eye. */
export const AIR_MM = 10;
/** What is kept behind feet that go back: toes dip then, and heels rise and go further. By eye. */
export const BEHIND_MM = 25;
/** Gaps that differ by less are the same. */
const NOTHING_MM = 0.1;
export const STEP_MM = 10;

type Limb = Extract<MannequinSegment, { kind: 'rounded-cone' }>;
export type FootedPose = Pick<MannequinPose, 'segments' | 'placement' | 'notes' | 'heelGapMm'>;

/** How long a shin is, and how far it leans forwards, from the knee down. */
interface Reach {
  lengthMm: number;
  aheadMm: number;
}

/** The legs of a sitter, and how far their feet have gone. */
export interface Legs {
  at: Vec3;
  ahead: Vec3;
  left: Vec3;
  limbs: readonly Limb[];
  shin: Reach;
  heelGapMm: number;
  /** Feet that somebody put somewhere stay there. */
  placed: boolean;
  mostBackMm: number;
  gone: FeetMoved;
  /** Feet, shins and thighs where they are now, as in `limbs`. */
  shapes: readonly Shape[];
  /** Feet and shins alone, and the box around them. */
  lower: readonly Shape[];
  bounds: Bounds;
}

const isThigh = ({ name }: Limb): boolean => name.endsWith('thigh');
const isShin = ({ name }: Limb): boolean => name.endsWith('shin');

function reachOf(limbs: readonly Limb[], ahead: Vec3): Reach {
  const shins = limbs.filter(isShin).map(({ fromMm, toMm }) => sub(toMm, fromMm));
  return {
    lengthMm: Math.min(...shins.map((shin) => Math.hypot(...shin))),
    aheadMm: Math.min(...shins.map((shin) => dot(shin, ahead))),
  };
}

/** Legs whose feet have gone so far: feet go whole, shins with them from the knee, which rises where a shin stands up. */
function moved(legs: Omit<Legs, 'gone' | 'shapes' | 'lower' | 'bounds'>, gone: FeetMoved): Legs {
  const {
    limbs,
    ahead,
    left,
    heelGapMm,
    shin: { lengthMm, aheadMm },
  } = legs;
  const stands = (reachMm: number): number => Math.sqrt(Math.max(0, lengthMm ** 2 - reachMm ** 2));
  const rise: Vec3 = [0, Math.max(0, stands(aheadMm - gone.backMm) - stands(aheadMm) - heelGapMm), 0];
  const by = along(scale(left, gone.leftMm), ahead, -gone.backMm);
  const shapes = limbs.map((limb) => {
    const { fromMm, toMm } = limb;
    if (isThigh(limb)) return segmentShape({ ...limb, toMm: add(toMm, rise) });
    return segmentShape({ ...limb, fromMm: add(fromMm, isShin(limb) ? rise : by), toMm: add(toMm, by) });
  });
  const lower = shapes.filter((_, n) => !isThigh(limbs[n]!));
  return { ...legs, gone, shapes, lower, bounds: boundsAround(lower) };
}

export function legsOf({ segments, placement: { originMm, facingRad }, notes, heelGapMm }: FootedPose): Legs {
  const [s, c] = [Math.sin(facingRad), Math.cos(facingRad)];
  const ahead: Vec3 = [s, 0, c];
  const limbs = segments.filter(
    (segment): segment is Limb =>
      segment.kind === 'rounded-cone' && / (thigh|shin|foot|foot inside)$/.test(segment.name),
  );
  const shin = reachOf(limbs, ahead);
  const legs = {
    at: originMm,
    ahead,
    left: [c, 0, -s] as Vec3,
    limbs,
    shin,
    heelGapMm,
    placed: feetPlaced(notes),
    mostBackMm: Math.max(0, shin.aheadMm + shin.lengthMm * Math.sin(SHINS_BACK_RAD)),
  };
  return moved(legs, { backMm: 0, leftMm: 0 });
}

/** How near feet and shins come to a surface, as far as it matters here. */
const gapTo = ({ lower }: Legs, surface: Surface): number =>
  Math.min(
    AIR_MM,
    ...lower.map((shape) => surfaceGap(solidSurface(shape), surface, AIR_MM)?.distanceMm ?? AIR_MM),
  );

/** The same of two sitters' feet and shins. */
export function gapOf(one: Legs, other: Legs): number {
  if (boundsGap(one.bounds, other.bounds) >= AIR_MM) return AIR_MM;
  return Math.min(
    AIR_MM,
    ...one.lower.flatMap((a) => other.lower.map((b) => gapBetween(a, b, AIR_MM)?.distanceMm ?? AIR_MM)),
  );
}

/** Legs that have gone so far; `undefined` where that is too far or brings them nearer to something than it should. */
export function goneTo(
  legs: Legs,
  gone: FeetMoved,
  parts: readonly Surface[],
  others: readonly Legs[] = [],
): Legs | undefined {
  if (legs.placed || gone.backMm > legs.mostBackMm) return undefined;
  const after = moved(legs, gone);
  const meetsPart = parts.some((part) =>
    legs.limbs.some((limb, n) => {
      const air = limb.tag === 'shoe' ? BEHIND_MM : isThigh(limb) ? CONTACT_MM : AIR_MM;
      const gap = ({ shapes }: Legs) =>
        surfaceGap(solidSurface(shapes[n]!), part, air)?.distanceMm ?? Infinity;
      const room = gap(after);
      return room < air && room < gap(legs) - NOTHING_MM;
    }),
  );
  if (meetsPart) return undefined;
  const meetsSomebody = others.some((other) => {
    const gap = gapOf(after, other);
    return gap < AIR_MM && gap < gapOf(legs, other) - NOTHING_MM;
  });
  return meetsSomebody ? undefined : after;
}

/** The same for one step back. */
export const stepBack = (legs: Legs, parts: readonly Surface[], others?: readonly Legs[]) =>
  goneTo(legs, { ...legs.gone, backMm: legs.gone.backMm + STEP_MM }, parts, others);

/** Back until a part is clear; where that cannot be had nothing is gained by going. */
export function clearOf(part: Surface, legs: Legs, parts: readonly Surface[]): Legs {
  let going: Legs | undefined = legs;
  while (going && gapTo(going, part) < AIR_MM) going = stepBack(going, parts);
  return going ?? legs;
}

import { SHINS_BACK_RAD, type FeetMoved } from '../mannequin/leg-posture.ts';
import type { MannequinPose } from '../mannequin/pose.ts';
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

/** The legs of a sitter, and how far their feet have gone. */
export interface Legs {
  at: Vec3;
  ahead: Vec3;
  left: Vec3;
  limbs: readonly Limb[];
  heelGapMm: number;
  /** Feet that somebody put somewhere stay there. */
  placed: boolean;
  mostBackMm: number;
  gone: FeetMoved;
  /** Feet, shins and thighs where they are now, as in `limbs`. */
  shapes: readonly Shape[];
  /** Of feet and shins. */
  bounds: Bounds;
}

const PLACED: readonly MannequinPose['notes'][number]['kind'][] = [
  'feet-on-rail',
  'ankles-crossed',
  'knees-crossed',
];

const isThigh = ({ name }: Limb): boolean => name.endsWith('thigh');
const isShin = ({ name }: Limb): boolean => name.endsWith('shin');

/** How far and how high a shin reaches, from the knee down. */
function reachOf(limbs: readonly Limb[], ahead: Vec3): { lengthMm: number; aheadMm: number } {
  const shins = limbs.filter(isShin).map(({ fromMm, toMm }) => sub(toMm, fromMm));
  return {
    lengthMm: Math.min(...shins.map((shin) => Math.hypot(...shin))),
    aheadMm: Math.min(...shins.map((shin) => dot(shin, ahead))),
  };
}

/** Legs whose feet have gone so far: feet go whole, shins with them from the knee, which rises where a shin stands up. */
function moved(legs: Omit<Legs, 'gone' | 'shapes' | 'bounds'>, gone: FeetMoved): Legs {
  const { limbs, ahead, left, heelGapMm } = legs;
  const { lengthMm, aheadMm } = reachOf(limbs, ahead);
  const stands = (reachMm: number): number => Math.sqrt(Math.max(0, lengthMm ** 2 - reachMm ** 2));
  const rise: Vec3 = [0, Math.max(0, stands(aheadMm - gone.backMm) - stands(aheadMm) - heelGapMm), 0];
  const by = along(scale(left, gone.leftMm), ahead, -gone.backMm);
  const shapes = limbs.map((limb) => {
    const { fromMm, toMm } = limb;
    if (isThigh(limb)) return segmentShape({ ...limb, toMm: add(toMm, rise) });
    return segmentShape({ ...limb, fromMm: add(fromMm, isShin(limb) ? rise : by), toMm: add(toMm, by) });
  });
  return { ...legs, gone, shapes, bounds: boundsAround(shapes.filter((_, n) => !isThigh(limbs[n]!))) };
}

export function legsOf({ segments, placement: { originMm, facingRad }, notes, heelGapMm }: FootedPose): Legs {
  const [s, c] = [Math.sin(facingRad), Math.cos(facingRad)];
  const ahead: Vec3 = [s, 0, c];
  const limbs = segments.filter(
    (segment): segment is Limb =>
      segment.kind === 'rounded-cone' && / (thigh|shin|foot|foot inside)$/.test(segment.name),
  );
  const { lengthMm, aheadMm } = reachOf(limbs, ahead);
  const legs = {
    at: originMm,
    ahead,
    left: [c, 0, -s] as Vec3,
    limbs,
    heelGapMm,
    placed: notes.some(({ kind }) => PLACED.includes(kind)),
    mostBackMm: Math.max(0, aheadMm + lengthMm * Math.sin(SHINS_BACK_RAD)),
  };
  return moved(legs, { backMm: 0, leftMm: 0 });
}

/** How near feet and shins come to a surface, as far as it matters here. */
const gapTo = ({ limbs, shapes }: Legs, surface: Surface): number =>
  Math.min(
    AIR_MM,
    ...shapes.flatMap((shape, n) =>
      isThigh(limbs[n]!) ? [] : (surfaceGap(solidSurface(shape), surface, AIR_MM)?.distanceMm ?? AIR_MM),
    ),
  );

/** The same of two sitters' feet and shins. */
export function gapOf(one: Legs, other: Legs): number {
  if (boundsGap(one.bounds, other.bounds) >= AIR_MM) return AIR_MM;
  const lower = ({ limbs, shapes }: Legs): Shape[] => shapes.filter((_, n) => !isThigh(limbs[n]!));
  const theirs = lower(other);
  return Math.min(
    AIR_MM,
    ...lower(one).flatMap((a) => theirs.map((b) => gapBetween(a, b, AIR_MM)?.distanceMm ?? AIR_MM)),
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
      const left = gap(after);
      return left < air && left < gap(legs) - NOTHING_MM;
    }),
  );
  if (meetsPart) return undefined;
  const meetsSomebody = others.some((other) => {
    const gap = gapOf(after, other);
    return gap < AIR_MM && gap < gapOf(legs, other) - NOTHING_MM;
  });
  return meetsSomebody ? undefined : after;
}

export const back = ({ gone }: Legs): FeetMoved => ({ ...gone, backMm: gone.backMm + STEP_MM });

/** Back until a part is clear; where that cannot be had nothing is gained by going. */
export function clearOf(part: Surface, legs: Legs, parts: readonly Surface[]): Legs {
  let going: Legs | undefined = legs;
  while (going && gapTo(going, part) < AIR_MM) going = goneTo(going, back(going), parts);
  return going ?? legs;
}

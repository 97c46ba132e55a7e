import type { FeetMoved } from '../mannequin/leg-posture.ts';
import type { MannequinPose } from '../mannequin/pose.ts';
import type { MannequinSegment } from '../mannequin/segments.ts';
import { add, along, dot, scale, sub } from '../mannequin/vector.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { gapBetween } from './gap.ts';
import { boundsAround, boundsGap, type Bounds, type Shape } from './shape.ts';
import { partSurface, segmentShape } from './solids.ts';
import { solidSurface, surfaceGap, type Surface } from './surface.ts';

/** What is kept between feet and what is before them. By eye. */
const AIR_MM = 10;
const STEP_MM = 5;
/** Nobody draws shins further back than this from upright. By eye, well within the range of a knee. */
const FURTHEST_BACK_RAD = (15 * Math.PI) / 180;
/** Ways past each other, the shortest first, the left before the right. By eye. */
const ASIDE_MM = Array.from({ length: 16 }, (_, i) => STEP_MM * (i + 1)).flatMap((mm) => [mm, -mm]);
/** Facings whose cosine is below this look at each other. */
const OPPOSITE = -0.7;

type Limb = Extract<MannequinSegment, { kind: 'rounded-cone' }>;
type FootedPose = Pick<MannequinPose, 'segments' | 'placement' | 'notes'>;

/** The lower legs of a sitter, and how far they have gone. */
interface Legs {
  ahead: Vec3;
  left: Vec3;
  limbs: readonly Limb[];
  /** Feet that somebody put somewhere stay there. */
  placed: boolean;
  mostBackMm: number;
  gone: FeetMoved;
  /** Feet and shins where they are now. */
  shapes: Shape[];
  bounds: Bounds;
}

const PLACED: readonly MannequinPose['notes'][number]['kind'][] = [
  'feet-on-rail',
  'ankles-crossed',
  'knees-crossed',
];

/** Feet go whole; shins turn about the knee. */
function shapesAt({ limbs, ahead, left }: Omit<Legs, 'shapes' | 'bounds'>, { backMm, leftMm }: FeetMoved) {
  const by = along(scale(left, leftMm), ahead, -backMm);
  return limbs.map((limb) =>
    segmentShape({
      ...limb,
      fromMm: limb.tag === 'shoe' ? add(limb.fromMm, by) : limb.fromMm,
      toMm: add(limb.toMm, by),
    }),
  );
}

function legsOf({ segments, placement: { facingRad }, notes }: FootedPose): Legs {
  const [s, c] = [Math.sin(facingRad), Math.cos(facingRad)];
  const ahead: Vec3 = [s, 0, c];
  const limbs = segments.filter(
    (segment): segment is Limb => segment.kind === 'rounded-cone' && /shin|foot/.test(segment.name),
  );
  const shins = limbs.filter(({ tag }) => tag !== 'shoe').map(({ fromMm, toMm }) => sub(toMm, fromMm));
  const furthest = shins.map((shin) => dot(shin, ahead) + Math.hypot(...shin) * Math.sin(FURTHEST_BACK_RAD));
  const legs = {
    ahead,
    left: [c, 0, -s] as Vec3,
    limbs,
    placed: notes.some(({ kind }) => PLACED.includes(kind)),
    mostBackMm: Math.max(0, Math.min(...furthest)),
    gone: { backMm: 0, leftMm: 0 },
  };
  const shapes = shapesAt(legs, legs.gone);
  return { ...legs, shapes, bounds: boundsAround(shapes) };
}

const middle = ({ minMm, maxMm }: Bounds): Vec3 => scale(add(minMm, maxMm), 0.5);

/** How near lower legs come to a surface, as far as it matters here. */
const gapTo = (shapes: readonly Shape[], surface: Surface): number =>
  Math.min(
    AIR_MM,
    ...shapes.map((shape) => surfaceGap(solidSurface(shape), surface, AIR_MM)?.distanceMm ?? AIR_MM),
  );

/** Legs that have gone so far; `undefined` where that is too far or runs into something. */
function goneTo(legs: Legs, gone: FeetMoved, parts: readonly Surface[]): Legs | undefined {
  if (legs.placed || gone.backMm > legs.mostBackMm) return undefined;
  const shapes = shapesAt(legs, gone);
  const stopped = parts.some((part) => {
    const gap = gapTo(shapes, part);
    return gap < AIR_MM && gap < gapTo(legs.shapes, part);
  });
  return stopped ? undefined : { ...legs, gone, shapes, bounds: boundsAround(shapes) };
}

const stepBack = (legs: Legs, parts: readonly Surface[]): Legs | undefined =>
  goneTo(legs, { ...legs.gone, backMm: legs.gone.backMm + STEP_MM }, parts);

/** Back until a part is clear; where that cannot be had nothing is gained by going. */
function clearOf(part: Surface, legs: Legs, parts: readonly Surface[]): Legs {
  let going: Legs | undefined = legs;
  while (going && gapTo(going.shapes, part) < AIR_MM) going = stepBack(going, parts);
  return going ?? legs;
}

/** From the one to the other where two pairs of legs are too near; `undefined` where they are clear. */
function tooNear(one: Legs, other: Legs): Vec3 | undefined {
  if (boundsGap(one.bounds, other.bounds) >= AIR_MM) return undefined;
  for (const a of one.shapes) {
    for (const b of other.shapes) {
      if ((gapBetween(a, b, AIR_MM)?.distanceMm ?? AIR_MM) < AIR_MM) return sub(middle(b), middle(a));
    }
  }
  return undefined;
}

/**
 * How far sitters move their feet so that they keep clear of the feet of those opposite and of what stands before them:
 * back, those opposite each other alike; and where that is not enough, each to their own left, or each to their own right, past the other. Feet that
 * somebody put somewhere stay there.
 *
 * @param poses - the sitters of a set, as they sit each for themselves; room frame
 * @param parts - the parts of the set
 * @returns in steps of 5 mm, in the order of the poses; nothing where feet are clear or nothing is gained by going
 */
export function feetClear(poses: readonly FootedPose[], parts: readonly Part[]): FeetMoved[] {
  const sitters = poses.map(legsOf);
  const surfaces = parts.map(partSurface);
  const near = sitters.map(({ bounds, mostBackMm }) =>
    surfaces.filter((surface) => boundsGap(bounds, surface) < AIR_MM + mostBackMm),
  );
  sitters.forEach((legs, i) => {
    sitters[i] = near[i]!.reduce((gone, part) => clearOf(part, gone, near[i]!), legs);
  });
  const pairs = sitters.flatMap((one, i) =>
    sitters.flatMap((other, j) => {
      const reach = AIR_MM + one.mostBackMm + other.mostBackMm;
      return j > i && boundsGap(one.bounds, other.bounds) < reach ? [[i, j] as const] : [];
    }),
  );

  for (let went = true; went;) {
    const going = new Set(
      pairs.flatMap(([i, j]) => {
        const way = tooNear(sitters[i]!, sitters[j]!);
        if (!way) return [];
        return [
          ...(dot(way, sitters[i]!.ahead) > 0 ? [i] : []),
          ...(dot(way, sitters[j]!.ahead) < 0 ? [j] : []),
        ];
      }),
    );
    went = false;
    for (const i of going) {
      const gone = stepBack(sitters[i]!, near[i]!);
      if (gone) [sitters[i], went] = [gone, true];
    }
  }

  for (const [i, j] of pairs) {
    const [one, other] = [sitters[i]!, sitters[j]!];
    if (dot(one.ahead, other.ahead) > OPPOSITE || !tooNear(one, other)) continue;
    for (const leftMm of ASIDE_MM) {
      const [a, b] = [i, j].map((n) => {
        const { gone } = sitters[n]!;
        if (Math.abs(gone.leftMm) >= Math.abs(leftMm)) return sitters[n]!;
        return goneTo(sitters[n]!, { ...gone, leftMm }, near[n]!) ?? sitters[n]!;
      }) as [Legs, Legs];
      if (tooNear(a, b)) continue;
      [sitters[i], sitters[j]] = [a, b];
      break;
    }
  }
  return sitters.map(({ gone }) => gone);
}

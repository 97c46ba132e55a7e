import { toRoom } from '../mannequin/body-placement.ts';
import { readFigure } from '../mannequin/figure.ts';
import type { JointRanges, JointSweep } from '../mannequin/joint-ranges.ts';
import { legLine } from '../mannequin/leg-line.ts';
import type { MannequinPose } from '../mannequin/pose.ts';
import {
  bendPoint,
  chestRad,
  kneeRadius,
  mirror,
  restElbowFlesh,
  restShoulder,
} from '../mannequin/stance.ts';
import { add, length, scale, sub, turnAboutX, turnAboutY } from '../mannequin/vector.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import type { Gap } from './gap.ts';
import { hullOfBalls, type Shape } from './shape.ts';
import type { Thing } from './sitter-gap.ts';
import { partSurface } from './solids.ts';
import { solidSurface, surfaceGap } from './surface.ts';

/** The room that one elbow or knee needs while its limb moves. */
export interface JointEnvelope {
  joint: JointSweep['joint'];
  side: 'left' | 'right';
  /** What movement, how far, and who says so. */
  sweep: JointSweep;
  /** Places of the joint's middle, room frame. */
  centresMm: Vec3[];
  radiusMm: number;
  /** Convex solid around all of them. */
  shape: Shape;
}

/** The smallest gap of an envelope, and the part it is to. */
export interface EnvelopeGap extends Gap {
  thing: Extract<Thing, { kind: 'part' }>;
}

const STEPS = 4;
const ZERO: Vec3 = [0, 0, 0];

/** Every step of both turns of a sweep, radians. */
function turnsOf({ forwardsDeg, outwardsDeg }: JointSweep): { forwards: number; outwards: number }[] {
  const between = ([from, to]: readonly [number, number]): number[] =>
    Array.from({ length: STEPS + 1 }, (_, i) => ((from + ((to - from) * i) / STEPS) * Math.PI) / 180);
  return between(forwardsDeg).flatMap((forwards) =>
    between(outwardsDeg).map((outwards) => ({ forwards, outwards })),
  );
}

/**
 * What elbows and knees sweep at a place, from the body as it sits.
 *
 * @param pose - a posed body
 * @param ranges - from `readJointRanges`: what sweep, and its source
 * @returns one envelope a sweep and side, millimetres, room frame
 */
export function jointEnvelopes(pose: MannequinPose, { sweeps }: JointRanges): JointEnvelope[] {
  const f = readFigure(pose.means);
  const { stance, placement } = pose;
  const shoulder = bendPoint(f, stance, restShoulder(f));
  // What is swept is the flesh of the elbow, round its middle.
  const upperMm = length(sub(restElbowFlesh(f), restShoulder(f)));
  const legs = stance.legs.map((leg) => legLine(f, leg));
  const elbowAt = (forwards: number, outwards: number): Vec3 => {
    const out: Vec3 = [Math.sin(outwards), -Math.cos(outwards), 0];
    const ahead = turnAboutX(out, ZERO, -forwards);
    return add(shoulder, scale(turnAboutX(ahead, ZERO, chestRad(stance)), upperMm));
  };
  const kneeOf =
    ({ hip, knee }: (typeof legs)[number]) =>
    (lifted: number, outwards: number): Vec3 =>
      add(hip, turnAboutY(turnAboutX(sub(knee, hip), ZERO, -lifted), ZERO, outwards));
  return sweeps.flatMap((sweep) =>
    (['left', 'right'] as const).map((side): JointEnvelope => {
      const radiusMm = sweep.joint === 'elbow' ? f.radius.elbow : kneeRadius(f);
      const jointAt = sweep.joint === 'elbow' ? elbowAt : kneeOf(legs[side === 'left' ? 0 : 1]!);
      const centresMm = turnsOf(sweep).map(({ forwards, outwards }) => {
        const at = jointAt(forwards, outwards);
        return toRoom(placement, side === 'left' ? at : mirror(at));
      });
      return {
        joint: sweep.joint,
        side,
        sweep,
        centresMm,
        radiusMm,
        shape: hullOfBalls(centresMm, radiusMm),
      };
    }),
  );
}

/**
 * The smallest gap between an envelope and the parts of a set, hollow ones as they are.
 *
 * @param envelope - from `jointEnvelopes`
 * @param parts - parts to keep clear of
 * @param atMostMm - larger distances are of no matter
 * @returns below 0 where the joint cannot move as far; `undefined` where nothing is within the limit
 */
export function envelopeGap(
  envelope: Pick<JointEnvelope, 'shape'>,
  parts: readonly Part[],
  atMostMm: number,
): EnvelopeGap | undefined {
  const swept = solidSurface(envelope.shape);
  let best: EnvelopeGap | undefined;
  for (const part of parts) {
    const gap = surfaceGap(swept, partSurface(part), best ? Math.max(0, best.distanceMm) : atMostMm);
    if (gap && (!best || gap.distanceMm < best.distanceMm)) {
      const { id: partId, pieceId, role } = part;
      best = { ...gap, thing: { kind: 'part', partId, pieceId, role } };
    }
  }
  return best;
}

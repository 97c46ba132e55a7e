import type { Vec3 } from '../parts/part.ts';
import { along, clamp, cross, dot, length, scale, sub, turnAbout, unit } from './vector.ts';

/** A two-link chain that reaches for a target. */
export interface Reach {
  middle: Vec3;
  end: Vec3;
  /** How far short of the target the end stays; 0 when it arrives. */
  shortMm: number;
}

/**
 * Places the middle joint of a two-link limb.
 *
 * @param root - fixed end
 * @param target - where the free end should go
 * @param firstMm - length of the link at the root
 * @param secondMm - length of the link at the free end
 * @param pole - direction the middle joint bends towards
 * @param swivelRad - turns the middle joint about the line from root to target
 */
export function reachFor(
  root: Vec3,
  target: Vec3,
  firstMm: number,
  secondMm: number,
  pole: Vec3,
  swivelRad = 0,
): Reach {
  const line = sub(target, root);
  const wanted = length(line);
  const axis = unit(line, [0, 0, 1]);
  const span = clamp(wanted, Math.abs(firstMm - secondMm) + 1e-6, firstMm + secondMm - 1e-6);
  const foot = (firstMm * firstMm - secondMm * secondMm + span * span) / (2 * span);
  const height = Math.sqrt(Math.max(0, firstMm * firstMm - foot * foot));
  const aside = unit(sub(pole, scale(axis, dot(pole, axis))), unit(cross(axis, [1, 0, 0])));
  const bend = swivelRad === 0 ? aside : turnAbout(aside, axis, swivelRad);
  return {
    middle: along(along(root, axis, foot), bend, height),
    end: along(root, axis, span),
    shortMm: Math.max(0, wanted - span),
  };
}

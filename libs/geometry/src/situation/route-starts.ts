import type { Piece } from '../room/document.ts';
import { footprint } from '../room/footprint.ts';
import type { Spot } from './clear-floor.ts';

/** A rectangle along the room's axes. */
interface Extent {
  x: readonly [number, number];
  z: readonly [number, number];
}

function extentOf(pieces: readonly Piece[]): Extent {
  const corners = pieces.flatMap((piece) => footprint(piece).corners);
  const xs = corners.map(([x]) => x);
  const zs = corners.map(([, z]) => z);
  return { x: [Math.min(...xs), Math.max(...xs)], z: [Math.min(...zs), Math.max(...zs)] };
}

const middle = ([from, to]: readonly [number, number]): number => (from + to) / 2;
const lengthOf = ([from, to]: readonly [number, number]): number => to - from;

/** A straight line along one axis of the room, over an extent, at a place on the other axis. */
const along = (axis: 'x' | 'z', [from, to]: readonly [number, number], at: number): Spot[] =>
  [from, to].map((mm) => (axis === 'x' ? { xMm: mm, zMm: at } : { xMm: at, zMm: mm }));

/**
 * A route to begin with: straight through the middle of the plan, from end to end the long way.
 *
 * @param pieces - pieces of the set, at least one
 * @returns two corners, millimetres; `undefined` where there is no piece
 */
export function routeThrough(pieces: readonly Piece[]): Spot[] | undefined {
  if (pieces.length === 0) return undefined;
  const { x, z } = extentOf(pieces);
  return lengthOf(x) >= lengthOf(z) ? along('x', x, middle(z)) : along('z', z, middle(x));
}

/**
 * A route to begin with: midway between two pieces, along the whole of both.
 *
 * The gap is taken along whichever axis of the room the two stand further apart on.
 *
 * @param one - a piece
 * @param other - another piece
 * @returns two corners, millimetres
 */
export function routeBetween(one: Piece, other: Piece): Spot[] {
  const [a, b] = [extentOf([one]), extentOf([other])];
  const both = extentOf([one, other]);
  const gap = (axis: 'x' | 'z'): readonly [number, number] =>
    a[axis][0] + a[axis][1] <= b[axis][0] + b[axis][1] ? [a[axis][1], b[axis][0]] : [b[axis][1], a[axis][0]];
  return lengthOf(gap('z')) >= lengthOf(gap('x'))
    ? along('x', both.x, middle(gap('z')))
    : along('z', both.z, middle(gap('x')));
}

const apart = (a: Spot, b: Spot): number => Math.hypot(a.xMm - b.xMm, a.zMm - b.zMm);

/**
 * Where a new corner goes into a route so that the route becomes as little longer as can be.
 *
 * @param route - corners from start to end, at least two
 * @param spot - the new corner
 * @returns index of the new corner; 0 before the start, the number of corners after the end
 */
export function cornerIndex(route: readonly Spot[], spot: Spot): number {
  const longer = [...route, undefined].map((next, i) => {
    const last = route[i - 1];
    if (last && next) return apart(last, spot) + apart(spot, next) - apart(last, next);
    const end = last ?? next;
    return end ? apart(end, spot) : 0;
  });
  return longer.indexOf(Math.min(...longer));
}

import type { PagePoint } from '../drawing/drawing.ts';
import type { PageArc } from '../drawing/line-tracks.ts';

const WHOLE = 2 * Math.PI;

/** Whether an arc goes all round. */
export const isCircle = ({ fromRad, toRad }: PageArc): boolean => toRad - fromRad > WHOLE - 1e-6;

/**
 * An arc as the data of an SVG path.
 *
 * @param arc - of a page
 * @param point - writes a point
 * @returns one arc, or two halves for a circle
 */
export function arcOutline(arc: PageArc, point: (at: PagePoint) => string): string {
  const { centre, radiusMm, fromRad, toRad } = arc;
  const at = (angle: number) =>
    point([centre[0] + radiusMm * Math.cos(angle), centre[1] + radiusMm * Math.sin(angle)]);
  const to = (angle: number, large: boolean) => `A${radiusMm} ${radiusMm} 0 ${large ? 1 : 0} 1 ${at(angle)}`;
  if (isCircle(arc)) return `M${at(fromRad)}${to(fromRad + Math.PI, false)}${to(fromRad, false)}Z`;
  return `M${at(fromRad)}${to(toRad, toRad - fromRad > Math.PI)}`;
}

import type { SetDocument } from '../room/document.ts';
import type { DrawShape } from './drawing.ts';

/**
 * What a set asks of its floor, on the plan: the route that is kept clear as a dashed line, the space for turning
 * round as a circle.
 *
 * @param asked - what the set says about itself
 * @param turningCircleMm - diameter of the turning circle that is asked, millimetres
 * @returns shapes to paint over a plan, in its page frame; none where nothing of the kind is asked
 * @source diameter: rule ACC-08
 */
export function askedShapes(
  { route, turningAt }: Pick<SetDocument['asked'], 'route' | 'turningAt'>,
  turningCircleMm: number,
): DrawShape[] {
  const shapes: DrawShape[] = [];
  if (turningAt) {
    shapes.push({
      kind: 'circle',
      centre: [turningAt.xMm, turningAt.zMm],
      radiusMm: turningCircleMm / 2,
      pen: 'edge',
      fill: 'none',
    });
  }
  if (route) {
    shapes.push({
      kind: 'polyline',
      points: route.map(({ xMm, zMm }) => [xMm, zMm]),
      pen: 'outline',
      dashed: true,
    });
  }
  return shapes;
}

import type { Part, Vec3 } from '../parts/part.ts';
import { cutFaces } from './cut-faces.ts';
import type { PagePoint } from './drawing.ts';
import { onPage, type PageFrame } from './set-view.ts';
import { convexOutline, partEdges } from './solid-outline.ts';
import { ringOf } from './view-solid.ts';

/** A vertical cutting plane: a point on it and the level direction the page's x axis runs along. */
export interface CutPlane {
  originMm: Vec3;
  /** Unit vector in the plane, level. */
  alongX: number;
  alongZ: number;
}

/** The outlines a part shows where a vertical plane cuts it, x along the plane and y down; none when it is missed. */
export function cutOutlines(part: Part, plane: CutPlane): PagePoint[][] {
  if (part.solid.shape === 'prism') return facesOfPrism(part, plane);
  const { corners, edges } = partEdges(part);
  const [ox, , oz] = plane.originMm;
  const side = corners.map(([x, , z]) => (x - ox) * plane.alongZ - (z - oz) * plane.alongX);
  const page = ([x, y, z]: Vec3): PagePoint => [(x - ox) * plane.alongX + (z - oz) * plane.alongZ, -y];
  const points: PagePoint[] = [];
  for (const [a, b] of edges) {
    const [sa, sb] = [side[a]!, side[b]!];
    if (sa > 0 === sb > 0) continue;
    const t = sa / (sa - sb);
    const [p, q] = [corners[a]!, corners[b]!];
    points.push(page([p[0] + (q[0] - p[0]) * t, p[1] + (q[1] - p[1]) * t, p[2] + (q[2] - p[2]) * t]));
  }
  const outline = convexOutline(points);
  return outline.length >= 3 ? [outline] : [];
}

/** A prism may be hollow, so that a plane cuts it in several places. */
function facesOfPrism(part: Part, { originMm, alongX, alongZ }: CutPlane): PagePoint[][] {
  const frame: PageFrame = { right: [alongX, 0, alongZ], down: [0, -1, 0], toward: [-alongZ, 0, alongX] };
  const [right, , toward] = onPage(frame, originMm);
  const { base, axis } = ringOf(part);
  const drawn = { base: base.map((corner) => onPage(frame, corner)), axis: onPage(frame, axis) };
  return cutFaces(drawn, toward).map((face) => face.map(([x, y]): PagePoint => [x - right, y]));
}

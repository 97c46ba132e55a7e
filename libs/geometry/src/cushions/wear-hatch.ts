import {
  outlineBox,
  outlinePoints,
  type OutlineBox,
  type OutlineCorner,
  type Point2,
} from '../outlines/outline.ts';
import type { WearArea } from './wear.ts';

/** How much of the cushion a named place takes on the drawing: a sign of where, not a size to hold to. */
const SHARE = { edge: 1 / 5, end: 1 / 6, middle: 1 / 2 } as const;

interface Marked {
  outline: readonly OutlineCorner[];
}

/**
 * Where an area lies on the plan of a cushion.
 *
 * @param spec - its outline, back edge up, so the sitter's left is at the right
 * @param area - what was marked
 * @returns millimetres on the page; may reach beyond the outline
 */
export function wearRectangle({ outline }: Marked, { place, areaMm }: WearArea): OutlineBox {
  const all = outlineBox(outline);
  const [w, d] = [all.x1 - all.x0, all.y1 - all.y0];
  switch (place) {
    case 'front-edge':
      return { ...all, y1: all.y0 + SHARE.edge * d };
    case 'back-edge':
      return { ...all, y0: all.y1 - SHARE.edge * d };
    case 'left-end':
      return { ...all, x0: all.x1 - SHARE.end * w };
    case 'right-end':
      return { ...all, x1: all.x0 + SHARE.end * w };
    case 'middle': {
      const [dx, dy] = [((1 - SHARE.middle) / 2) * w, ((1 - SHARE.middle) / 2) * d];
      return { x0: all.x0 + dx, x1: all.x1 - dx, y0: all.y0 + dy, y1: all.y1 - dy };
    }
    case 'whole':
      return all;
    case 'area': {
      if (!areaMm) return all;
      const { fromEnd, fromSideMm, fromFrontMm, widthMm, depthMm } = areaMm;
      const x0 = fromEnd === 'left' ? all.x1 - fromSideMm - widthMm : all.x0 + fromSideMm;
      const y0 = all.y0 + fromFrontMm;
      return { x0, x1: x0 + widthMm, y0, y1: y0 + depthMm };
    }
  }
}

/**
 * Slanting lines over the part of an area that lies on the cushion.
 *
 * @param spec - its outline
 * @param area - what was marked
 * @param stepMm - between two lines, > 0
 * @returns stretches on the page; none where the area lies beside the cushion
 */
export function wearHatch(spec: Marked, area: WearArea, stepMm: number): [Point2, Point2][] {
  const box = wearRectangle(spec, area);
  const points = outlinePoints(spec.outline, 0.5);
  const lines: [Point2, Point2][] = [];
  // Lines y = x + c, each cut by the outline, then by the rectangle.
  const first = Math.ceil((box.y0 - box.x1) / stepMm) * stepMm;
  for (let c = first; c <= box.y1 - box.x0; c += stepMm) {
    const met = points
      .flatMap((a, i): number[] => {
        const b = points[(i + 1) % points.length]!;
        const [sa, sb] = [a[1] - a[0] - c, b[1] - b[0] - c];
        return sa > 0 === sb > 0 ? [] : [a[0] + ((b[0] - a[0]) * sa) / (sa - sb)];
      })
      .sort((a, b) => a - b);
    for (let i = 0; i + 1 < met.length; i += 2) {
      const from = Math.max(met[i]!, box.x0, box.y0 - c);
      const to = Math.min(met[i + 1]!, box.x1, box.y1 - c);
      if (to - from > 1e-6) {
        lines.push([
          [from, from + c],
          [to, to + c],
        ]);
      }
    }
  }
  return lines;
}

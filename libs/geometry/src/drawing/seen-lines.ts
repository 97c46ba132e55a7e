import type { Part, PartRole, Vec3 } from '../parts/part.ts';
import { cutFaces } from './cut-faces.ts';
import type { PagePoint } from './drawing.ts';
import { boxAround } from './page-box.ts';
import { hiddenStretches, SHORTEST_MM } from './hidden-stretches.ts';
import { hidersOf, type Hiders } from './hiders.ts';
import { without } from './intervals.ts';
import { lineTracks, type PageArc, type PageLine } from './line-tracks.ts';
import { pageFrame, pagePoint, sectionDepth, type PageFrame, type SetView } from './set-view.ts';
import { convexOutline, partEdges } from './solid-outline.ts';
import { behindSection, viewEdges } from './view-edges.ts';
import { viewSolid, type ConvexSolid, type PageCircle, type ViewSolid } from './view-solid.ts';

/** How a line of a view came about, strongest first. */
export const LINE_KINDS = ['cut', 'edge', 'seam', 'above', 'hidden'] as const;
export type LineKind = (typeof LINE_KINDS)[number];

/** What a line stands for. */
export interface LineOf {
  kind: LineKind;
  pieceId: string;
}

/** A face that a section cuts. */
export interface CutFace {
  points: PagePoint[];
  part: Part;
}

/** What a view shows, without words; millimetres of the real thing, right and down. */
export interface SeenLines {
  lines: (PageLine & { what: LineOf })[];
  arcs: (PageArc & { what: LineOf })[];
  faces: CutFace[];
  /** Parts of which at least something stands behind the section. */
  parts: Part[];
}

const SEAMS: ReadonlySet<PartRole> = new Set(['wall-board', 'wall-panel', 'back-board', 'glass']);
const ARC_STEPS = 64;

const ON_BORDER_MM = 0.5;

/** Tells the seams of a piece, between its boards, from the lines along its border, which are inked as edges. */
function bordersOf(
  solids: readonly ViewSolid[],
): (pieceId: string, from: PagePoint, to: PagePoint) => boolean {
  const corners = new Map<string, PagePoint[]>();
  for (const { part, convex } of solids) {
    const known = corners.get(part.pieceId) ?? [];
    for (const { min, max } of convex) known.push([min[0], min[1]], [max[0], max[1]]);
    corners.set(part.pieceId, known);
  }
  const boxes = new Map([...corners].map(([id, points]) => [id, boxAround(points)]));
  return (pieceId, from, to) => {
    const box = boxes.get(pieceId);
    if (!box) return false;
    const both = (n: 0 | 1, at: number) =>
      Math.abs(from[n] - at) < ON_BORDER_MM && Math.abs(to[n] - at) < ON_BORDER_MM;
    return both(0, box.x) || both(0, box.x + box.width) || both(1, box.y) || both(1, box.y + box.height);
  };
}

/** The stretches of a circle that are hidden, found on a figure of 64 sides. */
function hiddenArc({ centre, radiusMm }: PageCircle, hiders: Hiders) {
  const at = (n: number): Vec3 => {
    const angle = (2 * Math.PI * n) / ARC_STEPS;
    return [centre[0] + radiusMm * Math.cos(angle), centre[1] + radiusMm * Math.sin(angle), centre[2]];
  };
  const step = (2 * Math.PI * radiusMm) / ARC_STEPS;
  return Array.from({ length: ARC_STEPS }, (_, n) => {
    const [from, to] = [at(n), at(n + 1)];
    const chord = Math.hypot(to[0] - from[0], to[1] - from[1]);
    return hiddenStretches(from, to, hiders(from, to)).map(([a, b]): [number, number] => [
      step * (n + a / chord),
      step * (n + b / chord),
    ]);
  }).flat();
}

/** From where parts are seen, in numbers. */
export interface SeenFrom {
  frame: PageFrame;
  /** Toward the eye: what stands before this is taken away; infinite where nothing is cut. */
  depth: number;
  hidden: SetView['hidden'];
  /** Whether overhead pieces before the section are shown dashed. */
  showsAbove: boolean;
}

/**
 * Draws parts square from one side: what is seen, what is hidden, what a section cuts.
 *
 * @param parts - of the whole set, placed
 * @param view - from where, cut where
 * @param isOverhead - pieces that a plan shows dashed where they stand above its section
 * @returns as `seenLinesFrom`
 */
export function seenLines(
  parts: readonly Part[],
  view: SetView,
  isOverhead: (pieceId: string) => boolean = () => false,
): SeenLines {
  const from = {
    frame: pageFrame(view.direction),
    depth: sectionDepth(view),
    hidden: view.hidden,
    showsAbove: view.direction === 'above',
  };
  return seenLinesFrom(parts, from, isOverhead);
}

/**
 * Draws parts as seen from anywhere far off: what is seen, what is hidden, what a section cuts.
 *
 * Hidden lines are exact for boxes and prisms; a round part hides as a figure of 64 sides would.
 *
 * @param parts - of the whole set, placed
 * @param from - frame of the page and section
 * @param isOverhead - pieces that a plan shows dashed where they stand above its section
 * @returns lines without doubles: of two that lie on each other the stronger is kept
 */
export function seenLinesFrom(
  parts: readonly Part[],
  { frame, depth, hidden: hiddenEdges, showsAbove }: SeenFrom,
  isOverhead: (pieceId: string) => boolean = () => false,
): SeenLines {
  const solids = parts.map((part) => viewSolid(part, frame));
  const nearest = (convex: readonly ConvexSolid[], n: 'min' | 'max') =>
    n === 'min' ? Math.min(...convex.map(({ min }) => min[2])) : Math.max(...convex.map(({ max }) => max[2]));
  const kept = solids.filter(({ convex }) => nearest(convex, 'min') < depth);
  const behind = (one: ConvexSolid): ConvexSolid =>
    one.max[2] <= depth
      ? one
      : {
          sides: [...one.sides, { normal: [0, 0, 1], limit: depth }],
          min: one.min,
          max: [one.max[0], one.max[1], depth],
        };
  const hiders = hidersOf(
    kept.flatMap(({ part, convex }) =>
      convex.filter(({ min }) => min[2] < depth).map((one) => [part.pieceId, behind(one)] as const),
    ),
  );
  const tracks = lineTracks<LineOf>();
  const known = new Map<string, LineOf>();
  const inkOf = (kind: LineKind, pieceId: string) => {
    const key = `${kind} ${pieceId}`;
    const what = known.get(key) ?? { kind, pieceId };
    known.set(key, what);
    return { rank: LINE_KINDS.indexOf(kind), what };
  };
  const faces: CutFace[] = [];
  const onBorder = bordersOf(kept);

  for (const solid of kept) {
    const { part, circles } = solid;
    const isCut = nearest(solid.convex, 'max') > depth;
    const seam = SEAMS.has(part.role);
    const [edgeInk, seamInk] = [inkOf('edge', part.pieceId), inkOf('seam', part.pieceId)];
    const seen = seam ? seamInk : edgeInk;
    const hidden = hiddenEdges === 'dashed' && !seam ? inkOf('hidden', part.pieceId) : undefined;
    for (const edge of viewEdges(solid)) {
      const rest = behindSection(edge, depth);
      if (!rest) continue;
      const [a, b] = rest;
      const length = Math.hypot(b[0] - a[0], b[1] - a[1], b[2] - a[2]);
      const at = (mm: number): PagePoint => [
        a[0] + ((b[0] - a[0]) * mm) / length,
        a[1] + ((b[1] - a[1]) * mm) / length,
      ];
      const away = hiddenStretches(a, b, hiders(a, b));
      const ink = onBorder(part.pieceId, at(0), at(length)) ? edgeInk : seen;
      for (const [from, to] of without([[0, length]], away, SHORTEST_MM)) {
        tracks.addLine(at(from), at(to), ink);
      }
      if (hidden) for (const [from, to] of away) tracks.addLine(at(from), at(to), hidden);
    }
    for (const circle of circles.filter(({ centre }) => centre[2] <= depth)) {
      const whole = 2 * Math.PI * circle.radiusMm;
      const away = hiddenArc(circle, hiders);
      const arc = (from: number, to: number): PageArc => ({
        centre: [circle.centre[0], circle.centre[1]],
        radiusMm: circle.radiusMm,
        fromRad: from / circle.radiusMm,
        toRad: to / circle.radiusMm,
      });
      for (const [from, to] of without([[0, whole]], away, SHORTEST_MM)) tracks.addArc(arc(from, to), seen);
      if (hidden) for (const [from, to] of away) tracks.addArc(arc(from, to), hidden);
    }
    if (!isCut) continue;
    const ink = inkOf('cut', part.pieceId);
    for (const points of cutFaces(solid, depth)) {
      faces.push({ points, part });
      const [circle] = circles;
      if (circle) {
        const centre: PagePoint = [circle.centre[0], circle.centre[1]];
        tracks.addArc({ centre, radiusMm: circle.radiusMm, fromRad: 0, toRad: 2 * Math.PI }, ink);
      } else points.forEach((from, i) => tracks.addLine(from, points[(i + 1) % points.length]!, ink));
    }
  }
  if (showsAbove) {
    const away = solids.filter(
      ({ convex, part }) => nearest(convex, 'min') >= depth && isOverhead(part.pieceId),
    );
    for (const { part } of away) {
      const outline = convexOutline(partEdges(part).corners.map((corner) => pagePoint(frame, corner)));
      const ink = inkOf('above', part.pieceId);
      outline.forEach((from, i) => tracks.addLine(from, outline[(i + 1) % outline.length]!, ink));
    }
  }
  return { lines: tracks.lines(), arcs: tracks.arcs(), faces, parts: kept.map(({ part }) => part) };
}

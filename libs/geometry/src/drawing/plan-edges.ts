import type { CushionEdge } from '../cushions/cushion-choice.ts';
import type { CushionSpec, EdgeMeets } from '../cushions/cushion-spec.ts';
import { outlinePoints, outlineStretches } from '../outlines/outline.ts';
import { WELT_MM } from './cushion-views.ts';
import type { DrawShape } from './drawing.ts';

/** What an edge meets, as the plan says it. */
export const EDGE_WORDS: Record<EdgeMeets, string> = {
  wall: 'wall',
  'end-wall': 'end wall',
  arm: 'arm',
  neighbour: 'next cushion',
  'corner-cushion': 'cushion of the other leg',
  free: 'free end',
  'back-pad': 'back edge, meets the back pad',
  front: 'front edge',
  'seat-cushion': 'lower edge, meets the seat cushion',
  top: 'top edge',
};

/** How far within its edge the middle of a line of words stands. */
export const insetMm = (labelMm: number): number => WELT_MM + labelMm / 3;

/** Each edge with its name, what it meets, and whether it closes or is seen by the camera. */
export function edgeWords(spec: CushionSpec, labelMm: number): DrawShape[] {
  const { depthMm: d } = spec.finishedMm;
  const inset = insetMm(labelMm);
  const closed = spec.make.closure === 'zip' ? 'zip' : 'closure';
  const isClosed = (edge: CushionEdge) =>
    spec.make.closureEdge === edge && (spec.making?.closure.edgeMm ?? 0) > 0;
  const named = (edge: CushionEdge, text: string): string =>
    [text, isClosed(edge) ? closed : [], spec.cameraSides.includes(edge) ? 'camera side' : []]
      .flat()
      .join(', ');
  const level = (edge: 'back' | 'front', y: number): DrawShape => {
    const { middleMm, lengthMm } = longestOf(spec, edge);
    const text = named(edge, EDGE_WORDS[spec.edges[edge]]);
    const short = { text: named(edge, PLAIN_WORDS[spec.kind][edge]), alongMm: lengthMm - 4 * inset };
    return { kind: 'text', at: [middleMm, y], text, anchor: 'middle', short };
  };
  const upright = (edge: 'left' | 'right', x: number): DrawShape => ({
    kind: 'text',
    at: [x, d / 2],
    text: named(edge, `${EDGE_WORDS[spec.edges[edge]]}, sitter’s ${edge}`),
    anchor: 'middle',
    upright: true,
    short: { text: `sitter’s ${edge}`, alongMm: d },
  });
  const [low, high] = endsOf(spec);
  return [
    level('back', inset),
    level('front', d - inset),
    upright('right', low + inset),
    upright('left', high - inset),
  ];
}

const PLAIN_WORDS = {
  seat: { back: 'back edge', front: 'front edge' },
  back: { back: 'top edge', front: 'lower edge' },
} as const;

/** The longest stretch of an edge: no words stand across a notch. */
function longestOf(
  { outline, finishedMm }: CushionSpec,
  name: CushionEdge,
): { middleMm: number; lengthMm: number } {
  const spans = outlineStretches(outline).flatMap((one) =>
    one.kind === 'line' && one.edge === name ? [[one.from[0], one.to[0]] as const] : [],
  );
  const [longest] = spans.sort((a, b) => Math.abs(b[1] - b[0]) - Math.abs(a[1] - a[0]));
  const [from, to] = longest ?? [0, finishedMm.widthMm];
  return { middleMm: (from + to) / 2, lengthMm: Math.abs(to - from) };
}

/** Part of the depth, about its middle, that words along an end take. */
const END_WORDS = [0.35, 0.5, 0.65] as const;

/** Where the ends of a cushion stand along the words that name them: further in where they slant. */
function endsOf({ outline, finishedMm: { widthMm, depthMm } }: CushionSpec): [number, number] {
  const points = outlinePoints(outline, 0.5);
  const across = END_WORDS.map((share) => {
    const y = share * depthMm;
    return points.flatMap(([x1, y1], i) => {
      const [x2, y2] = points[(i + 1) % points.length]!;
      return y1 > y === y2 > y ? [] : [x1 + ((y - y1) / (y2 - y1)) * (x2 - x1)];
    });
  }).filter((met) => met.length > 1);
  if (across.length === 0) return [0, widthMm];
  return [
    Math.max(...across.map((met) => Math.min(...met))),
    Math.min(...across.map((met) => Math.max(...met))),
  ];
}

import { partEdges } from '../drawing/solid-outline.ts';
import type { Part } from '../parts/part.ts';
import { BODY_POINT_KEYS, type MeasureEnd } from './dimension.ts';
import { endWords } from './end-words.ts';
import type { MeasuringScene } from './measuring-scene.ts';

/** One end that can be chosen from a list. */
export interface NamedPoint {
  /** Stable while the part or the place is there. */
  id: string;
  words: string;
  end: MeasureEnd;
}

/** Seams between boards are no places anybody measures from: the wall or back behind them has the corners. */
const LEFT_OUT = new Set<Part['role']>(['wall-board', 'back-board', 'glass']);

/**
 * The name of an end for lists and tests.
 *
 * @param end - of a line
 */
export function endId(end: MeasureEnd): string {
  switch (end.on) {
    case 'body':
      return `body ${end.pieceId}:${end.place} ${end.point}`;
    case 'corner':
      return `corner ${end.partId} ${end.corner}`;
    case 'edge':
      return `edge ${end.partId} ${end.edge} ${end.along}`;
    case 'part':
      return `part ${end.partId}`;
    case 'spot':
      return `spot ${end.partId} ${end.atMm.join(' ')}`;
  }
}

/**
 * Every point of a piece that has a name: corners, middles of edges, whole parts, and points of those who sit there.
 *
 * @param pieceId - an unknown id has none
 * @param scene - the set and who sits in it
 * @returns bodies first, then parts in their order; no two of them under the same words
 */
export function namedPoints(pieceId: string, scene: MeasuringScene): NamedPoint[] {
  const own = [...scene.parts.values()].filter((part) => part.pieceId === pieceId);
  const main = own.filter(({ role }) => !LEFT_OUT.has(role));
  const ends = [
    ...scene.bodies
      .filter((body) => body.pieceId === pieceId)
      .flatMap(({ place }) =>
        [...BODY_POINT_KEYS, 'whole' as const].map((point): MeasureEnd => ({
          on: 'body',
          pieceId,
          place,
          point,
        })),
      ),
    ...(main.length > 0 ? main : own).flatMap(endsOfPart),
  ];
  const times = new Map<string, number>();
  return ends.map((end) => {
    const words = endWords(end, scene);
    const n = (times.get(words) ?? 0) + 1;
    times.set(words, n);
    return { id: endId(end), end, words: n === 1 ? words : `${words}, ${n}` };
  });
}

function endsOfPart({ id: partId, pieceId, solid, ...part }: Part): MeasureEnd[] {
  const whole: MeasureEnd = { on: 'part', pieceId, partId };
  if (solid.shape === 'cylinder') return [whole];
  const { corners, edges } = partEdges({ id: partId, pieceId, solid, ...part });
  return [
    ...corners.map((_, corner): MeasureEnd => ({ on: 'corner', pieceId, partId, corner })),
    ...edges.map((_, edge): MeasureEnd => ({ on: 'edge', pieceId, partId, edge, along: 0.5 })),
    whole,
  ];
}

/**
 * A dimension line in words, for lists and for what changed.
 *
 * @param ends - what it runs between
 * @param scene - the set and who sits in it
 * @returns such as "front left upper corner of T1 top to the whole of B1 seat"
 */
export const endsWords = ([from, to]: readonly [MeasureEnd, MeasureEnd], scene: MeasuringScene): string =>
  `${endWords(from, scene)} to ${endWords(to, scene)}`;

import { expect, it } from 'vitest';
import { deriveParts } from '../pieces/kinds.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { hiddenStretches } from './hidden-stretches.ts';
import { hidersOf } from './hiders.ts';
import { pageFrame, VIEW_DIRECTIONS } from './set-view.ts';
import { viewEdges } from './view-edges.ts';
import { viewSolid } from './view-solid.ts';

it.each(ARRANGEMENTS.filter(({ id }) => id !== 'empty').map(({ id, build }) => [id, build()] as const))(
  'of %s hide from every side what all solids of the set hide, held against each edge one by one',
  (_, document) => {
    let hidden = 0;
    for (const direction of VIEW_DIRECTIONS) {
      const frame = pageFrame(direction);
      const solids = deriveParts(document).map((part) => viewSolid(part, frame));
      const all = solids.flatMap(({ convex }) => convex);
      const hiders = hidersOf(
        solids.flatMap(({ part, convex }) => convex.map((one) => [part.pieceId, one] as const)),
      );
      for (const [from, to] of solids.flatMap(viewEdges)) {
        const length = Math.hypot(to[0] - from[0], to[1] - from[1], to[2] - from[2]);
        const [found, expected] = [hiders(from, to), all].map((some) =>
          hiddenStretches(from, to, some).map(([a, b]) => [Math.max(0, a), Math.min(length, b)]),
        );
        expect(found).toHaveLength(expected!.length);
        expected!.forEach(([a, b], n) => {
          expect(found![n]![0]).toBeCloseTo(a!, 6);
          expect(found![n]![1]).toBeCloseTo(b!, 6);
        });
        hidden += expected!.length;
      }
    }
    expect(hidden).toBeGreaterThan(0);
  },
);

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyPiece } from '../../test/arbitrary-pieces.ts';
import type { Part, Solid, Vec3 } from '../parts/part.ts';
import { deriveParts } from '../pieces/kinds.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { hiddenStretches } from './hidden-stretches.ts';
import { seenLines, type LineKind, type SeenLines } from './seen-lines.ts';
import { pageFrame, type SetView } from './set-view.ts';
import { viewSolid } from './view-solid.ts';

const front: SetView = { direction: 'front', hidden: 'dashed', scale: 20 };
const part = (id: string, solid: Solid, positionMm: Vec3): Part => ({
  id,
  pieceId: id,
  role: 'top',
  material: 'oak',
  solid,
  positionMm,
  rotationRad: [0, 0, 0],
});
const box = (id: string, sizeMm: Vec3, at: Vec3): Part => part(id, { shape: 'box', sizeMm }, at);

function lengths({ lines }: SeenLines, pieceId: string, kind: LineKind): number[] {
  return lines
    .filter(({ what }) => what.pieceId === pieceId && what.kind === kind)
    .map(({ from, to }) => Number(Math.hypot(to[0] - from[0], to[1] - from[1]).toFixed(1)))
    .sort((a, b) => a - b);
}

describe('hidden lines', () => {
  it('leave nothing of a small box that stands behind a larger one, and dash its four edges', () => {
    const seen = seenLines(
      [box('near', [400, 400, 10], [0, 0, 100]), box('far', [200, 100, 10], [0, 0, 0])],
      front,
    );
    expect(lengths(seen, 'near', 'edge')).toEqual([400, 400, 400, 400]);
    expect(lengths(seen, 'far', 'edge')).toEqual([]);
    expect(lengths(seen, 'far', 'hidden')).toEqual([100, 100, 200, 200]);
    const plain = seenLines(
      [box('near', [400, 400, 10], [0, 0, 100]), box('far', [200, 100, 10], [0, 0, 0])],
      { ...front, hidden: 'left-out' },
    );
    expect(lengths(plain, 'far', 'hidden')).toEqual([]);
  });

  it('show through a gap of 30 exactly the 30 of what stands behind', () => {
    const seen = seenLines(
      [
        box('left', [200, 400, 10], [-115, 0, 100]),
        box('right', [200, 400, 10], [115, 0, 100]),
        box('far', [300, 100, 10], [0, 0, 0]),
      ],
      front,
    );
    expect(lengths(seen, 'far', 'edge')).toEqual([30, 30]);
    expect(lengths(seen, 'far', 'hidden')).toEqual([100, 100, 135, 135, 135, 135]);
  });

  it('of boxes that touch: the shared edge is seen once, the covered ones are not', () => {
    // A box on the floor and one that stands on it, flush in front and behind.
    const stacked = seenLines(
      [box('low', [100, 50, 80], [0, 25, 0]), box('high', [100, 70, 80], [0, 85, 0])],
      front,
    );
    const all = [...lengths(stacked, 'low', 'edge'), ...lengths(stacked, 'high', 'edge')];
    expect(all.sort((a, b) => a - b)).toEqual([50, 50, 70, 70, 100, 100, 100]);
    expect(stacked.lines.filter(({ what }) => what.kind === 'hidden')).toEqual([]);
    // One glued to the rear of the other.
    const glued = seenLines(
      [box('near', [100, 100, 20], [0, 0, 10]), box('far', [60, 60, 20], [0, 0, -10])],
      front,
    );
    expect(lengths(glued, 'far', 'edge')).toEqual([]);
    // One glued to its face.
    const before = seenLines(
      [box('far', [100, 100, 20], [0, 0, -10]), box('near', [60, 60, 20], [0, 0, 10])],
      front,
    );
    expect(lengths(before, 'near', 'edge')).toEqual([60, 60, 60, 60]);
  });

  it('part an edge that passes behind a slanted side where the sides cross', () => {
    const triangle: Solid = {
      shape: 'prism',
      outlineMm: [
        [0, 0],
        [100, 0],
        [0, 100],
      ],
      depthMm: 10,
    };
    const far: Part = { ...box('far', [400, 0.2, 10], [0, 30.1, -50]) };
    const seen = seenLines([part('near', triangle, [0, 0, 100]), far], front);
    // At the height of 30 the triangle reaches from 0 to 70.
    const at30 = seen.lines.filter(
      ({ what, from, to }) =>
        what.pieceId === 'far' && Math.abs(from[1] + 30) < 1e-6 && Math.abs(to[1] + 30) < 1e-6,
    );
    const dashed = at30.filter(({ what }) => what.kind === 'hidden').map(({ from, to }) => [from[0], to[0]]);
    expect(dashed).toHaveLength(1);
    expect(dashed[0]![0]).toBeCloseTo(0, 1);
    expect(dashed[0]![1]).toBeCloseTo(70, 1);
  });

  it('do not fill the hollow of a curved outline', () => {
    const hollow: Solid = {
      shape: 'prism',
      outlineMm: [
        [0, 0],
        [100, 0],
        [100, 100],
        [80, 100],
        [80, 20],
        [0, 20],
      ],
      depthMm: 10,
    };
    const seen = seenLines([part('near', hollow, [0, 0, 100]), box('far', [30, 30, 10], [40, 60, 0])], front);
    expect(lengths(seen, 'far', 'edge')).toEqual([30, 30, 30, 30]);
  });

  it('draw an upright round part as a circle from above and as four lines from the front', () => {
    const column = part('c', { shape: 'cylinder', radiusMm: 50, heightMm: 700 }, [10, 350, 20]);
    const above = seenLines([column], { ...front, direction: 'above' });
    expect(above.lines).toEqual([]);
    expect(above.arcs).toHaveLength(1);
    expect(above.arcs[0]).toMatchObject({ centre: [10, 20], radiusMm: 50 });
    expect(above.arcs[0]!.toRad - above.arcs[0]!.fromRad).toBeCloseTo(2 * Math.PI, 9);
    const [w1, w2, h1, h2] = lengths(seenLines([column], front), 'c', 'edge');
    expect([h1, h2]).toEqual([700, 700]);
    for (const width of [w1!, w2!]) expect(Math.abs(width - 100)).toBeLessThan(0.15);
  });

  it('hide the part of a circle that a board covers', () => {
    const column = part('c', { shape: 'cylinder', radiusMm: 50, heightMm: 700 }, [0, 350, 0]);
    const seen = seenLines([column, box('top', [200, 20, 200], [100, 720, 0])], {
      ...front,
      direction: 'above',
    });
    const visible = seen.arcs.filter(({ what }) => what.kind === 'edge');
    const angle = visible.reduce((sum, { fromRad, toRad }) => sum + toRad - fromRad, 0);
    expect(angle).toBeCloseTo(Math.PI, 2);
  });

  // Independent of the method: a point halfway along a seen stretch has no solid on the line to the eye, tried in
  // many places with the solids' own faces.
  it('agree with rays toward the eye on any two pieces', () => {
    fc.assert(
      fc.property(anyPiece, anyPiece, fc.constantFrom('above', 'front', 'left'), (one, other, direction) => {
        const near = {
          ...other,
          id: 'other',
          at: { ...other.at, xMm: one.at.xMm + 300, zMm: one.at.zMm + 200 },
        };
        const parts = deriveParts({ ...emptySetDocument(), pieces: [one, near] });
        const frame = pageFrame(direction);
        const convex = parts.flatMap((p) => viewSolid(p, frame).convex);
        for (const solid of parts.slice(0, 12).map((p) => viewSolid(p, frame))) {
          const [a, b] = [solid.base[0]!, solid.base[1]!];
          const length = Math.hypot(b[0] - a[0], b[1] - a[1], b[2] - a[2]);
          const hidden = hiddenStretches(a, b, convex);
          for (const share of [0.13, 0.37, 0.61, 0.89]) {
            const at = share * length;
            if (hidden.some(([from, to]) => Math.abs(at - from) < 0.5 || Math.abs(at - to) < 0.5)) continue;
            const p = ([0, 1, 2] as const).map((n) => a[n] + (b[n] - a[n]) * share);
            const covered = (slack: number) =>
              convex.some(({ sides }) => {
                let [low, high] = [0, 1e6];
                for (const { normal, limit } of sides) {
                  const start = normal[0] * p[0]! + normal[1] * p[1]! + normal[2] * p[2]! - limit + slack;
                  if (Math.abs(normal[2]) < 1e-12) {
                    if (start > 0) return false;
                  } else if (normal[2] > 0) high = Math.min(high, -start / normal[2]);
                  else low = Math.max(low, -start / normal[2]);
                }
                return low < high;
              });
            const isHidden = hidden.some(([from, to]) => at > from && at < to);
            if (covered(0.02)) expect(isHidden).toBe(true);
            if (!covered(0.005)) expect(isHidden).toBe(false);
          }
        }
      }),
      { numRuns: 60 },
    );
  });
});

describe('sections', () => {
  it('cut a box at its place and show what stands behind the plane only', () => {
    const parts = [
      box('cut', [100, 60, 40], [0, 30, 0]),
      box('far', [30, 200, 10], [0, 100, -100]),
      box('near', [500, 500, 10], [0, 0, 300]),
    ];
    const seen = seenLines(parts, { ...front, sectionMm: 5 });
    expect(lengths(seen, 'cut', 'cut')).toEqual([60, 60, 100, 100]);
    expect(seen.faces).toHaveLength(1);
    expect(lengths(seen, 'near', 'edge')).toEqual([]);
    expect(lengths(seen, 'far', 'edge')).toEqual([30, 140, 140]);
  });

  it('seen from the rear or the left they lie at the same place of the room', () => {
    const parts = [box('a', [10, 10, 10], [0, 0, 0]), box('b', [20, 20, 20], [0, 0, 100])];
    const rear = seenLines(parts, { ...front, direction: 'rear', sectionMm: 100 });
    expect(lengths(rear, 'b', 'cut')).toEqual([20, 20, 20, 20]);
    expect(lengths(rear, 'a', 'edge')).toEqual([]);
  });

  const hollow: Solid = {
    shape: 'prism',
    outlineMm: [
      [0, 0],
      [100, 0],
      [100, 100],
      [80, 100],
      [80, 20],
      [20, 20],
      [20, 100],
      [0, 100],
    ],
    depthMm: 10,
  };

  it.each([0, 30, 90, 180])('cut a hollow outline lengthwise in two, turned by %s degrees', (turnDeg) => {
    const turned: Part = { ...part('u', hollow, [0, 0, 0]), rotationRad: [0, (turnDeg * Math.PI) / 180, 0] };
    const seen = seenLines([turned], { ...front, direction: 'above', sectionMm: 60 });
    expect(seen.faces).toHaveLength(2);
    expect(lengths(seen, 'u', 'cut')).toEqual([10, 10, 10, 10, 20, 20, 20, 20]);
  });

  it('cut a hollow outline in two where rounding parts what lies on one upright of the page', () => {
    const places = Array.from({ length: 60 }, (_, k) => 3.3 * k);
    const leaning: Solid = {
      shape: 'prism',
      outlineMm: [
        [0, 0],
        [100, 0],
        [113.7, 100],
        [93.1, 100],
        [80, 20],
        [20, 20],
        [33.3, 100],
        [11.1, 100],
      ],
      depthMm: 10,
    };
    for (const x of places) {
      const placed: Part = {
        ...part('u', leaning, [x, 0, -457.7 - 1.7 * x]),
        rotationRad: [0, 1.5 * Math.PI, 0],
      };
      const { faces } = seenLines([placed], { ...front, direction: 'above', sectionMm: 61.3 });
      const wide = faces.map(({ points: [a, b] }) => Math.round(Math.abs(a![1] - b![1])));
      expect(wide.sort((a, b) => a - b)).toEqual([20, 22]);
    }
  });
});

describe('views of whole sets', () => {
  it.each(ARRANGEMENTS.map(({ id }) => id))('of %s draw no line twice', (id) => {
    const document = ARRANGEMENTS.find((one) => one.id === id)!.build();
    const parts = deriveParts(document);
    for (const direction of ['above', 'front', 'left'] as const) {
      const { lines } = seenLines(parts, { ...front, direction });
      const keys = lines.map(({ from, to }) => [...from, ...to].map((mm) => mm.toFixed(2)).join(' '));
      expect(new Set(keys).size).toBe(keys.length);
    }
  });
});

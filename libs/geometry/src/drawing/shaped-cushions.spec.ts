import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { benchAlone, cushionsOf, LEFT_REAR_NOTCH, shaped } from '../../test/shaped.ts';
import type { Part } from '../parts/part.ts';
import { convexPieces } from './convex-pieces.ts';
import { cutFaces } from './cut-faces.ts';
import type { PagePoint } from './drawing.ts';
import { frontOf } from './front.ts';
import { planOf } from './plan.ts';
import { sectionOf } from './section.ts';
import { seenLines, type LineKind } from './seen-lines.ts';
import { setDrawing } from './set-drawing.ts';
import { pageFrame, type SetView } from './set-view.ts';
import { viewSolid } from './view-solid.ts';

const above: SetView = { direction: 'above', hidden: 'dashed', scale: 20 };
const front: SetView = { ...above, direction: 'front' };

function lengths(parts: readonly Part[], view: SetView, kinds: readonly LineKind[]): number[] {
  return seenLines(parts, view)
    .lines.filter(({ what }) => kinds.includes(what.kind))
    .map(({ from, to }) => Number(Math.hypot(to[0] - from[0], to[1] - from[1]).toFixed(3)))
    .sort((a, b) => a - b);
}

const areaOf = (points: readonly PagePoint[]): number =>
  Math.abs(
    points.reduce((sum, [x, y], i) => {
      const [bx, by] = points[(i + 1) % points.length]!;
      return sum + (x * by - bx * y) / 2;
    }, 0),
  );

const spansOf = (faces: readonly (readonly PagePoint[])[]): number[] =>
  faces
    .map((points) => {
      const xs = points.map(([x]) => x);
      return Math.round((Math.max(...xs) - Math.min(...xs)) * 1e3) / 1e3;
    })
    .sort((a, b) => a - b);

const notchedSeat = shaped(benchAlone(), 'seat', LEFT_REAR_NOTCH);
/** Three legs: 400, 300 and 200 wide, gaps of 150 between them, open to the front. */
const comb = {
  notches: [
    { edge: 'front' as const, fromMm: 400, fromEnd: 'right' as const, widthMm: 150, depthMm: 300 },
    { edge: 'front' as const, fromMm: 200, widthMm: 150, depthMm: 300 },
  ],
};

describe('drawings of a shaped cushion', () => {
  it('show its outline from above, side by side as long as they were chosen', () => {
    expect(lengths(cushionsOf(notchedSeat, 'seat'), above, ['edge', 'seam'])).toEqual([
      200, 250, 300, 450, 900, 1200,
    ]);
  });

  it('dash what stands behind it and leave what the notch lets be seen', () => {
    const [seat] = cushionsOf(notchedSeat, 'seat');
    const [x, y, z] = seat!.positionMm;
    const below: Part = {
      ...seat!,
      id: 'below',
      pieceId: 'below',
      solid: { shape: 'box', sizeMm: [100, 10, 100] },
      rotationRad: [0, 0, 0],
      positionMm: [x + 300, y - 200, z - 100],
    };
    // It stands half under the seat and half in the notch.
    const seen = seenLines([seat!, below], above).lines.filter(({ what }) => what.pieceId === 'below');
    const of = (kind: LineKind) =>
      seen
        .filter(({ what }) => what.kind === kind)
        .reduce((sum, { from, to }) => sum + Math.hypot(to[0] - from[0], to[1] - from[1]), 0);
    expect(of('edge')).toBeCloseTo(200, 1);
    expect(of('hidden')).toBeCloseTo(200, 1);
  });

  it('ink no line down a rounded corner, and one where it turns from the eye', () => {
    const round = { backLeft: 0, backRight: 0, frontLeft: 100, frontRight: 0 };
    const parts = cushionsOf(shaped(benchAlone(), 'seat', { cornerRadiusMm: round }), 'seat');
    const uprights = seenLines(parts, { ...front, hidden: 'left-out' }).lines.filter(
      ({ from, to }) => Math.abs(from[0] - to[0]) < 1e-6,
    );
    // At the plain corner, and where the rounded end stands out furthest.
    expect(uprights.map(({ from }) => Math.round(from[0])).sort((a, b) => a - b)).toEqual([-600, 600]);
  });

  it.each([0, 2, 7])('cut every leg of a seat tilted by %s degrees by itself', (seatTiltDeg) => {
    const document = shaped(benchAlone({ seatTiltDeg }), 'seat', comb);
    const [seat] = cushionsOf(document, 'seat');
    const level = seenLines([seat!], { ...front, sectionMm: seat!.positionMm[2] + 100 });
    expect(spansOf(level.faces.map(({ points }) => points))).toEqual([200, 300, 400]);
    const behind = seenLines([seat!], { ...front, sectionMm: seat!.positionMm[2] - 180 });
    expect(spansOf(behind.faces.map(({ points }) => points))).toEqual([1200]);
    const flat = seenLines([seat!], { ...above, sectionMm: seat!.positionMm[1] });
    if (seatTiltDeg === 0) expect(areaOf(flat.faces[0]!.points)).toBeCloseTo(1200 * 450 - 2 * 150 * 300, 6);
  });

  it('cut as much as lies in the plane, whatever the way it is turned', () => {
    const outlineArea = 1200 * 450 - 2 * 150 * 300;
    fc.assert(
      fc.property(
        fc.double({ min: -180, max: 180, noNaN: true }),
        fc.double({ min: -8, max: 8, noNaN: true }),
        (turnDeg, seatTiltDeg) => {
          const document = shaped(benchAlone({ seatTiltDeg }, turnDeg), 'seat', comb);
          const [seat] = cushionsOf(document, 'seat');
          const [, , z] = seat!.positionMm;
          const [step, reach] = [5, 700];
          const solid = viewSolid(seat!, pageFrame('front'));
          let volume = 0;
          for (let at = z - reach + step / 2; at < z + reach; at += step) {
            volume += cutFaces(solid, at).reduce((sum, points) => sum + areaOf(points) * step, 0);
          }
          const thickness = seat!.solid.shape === 'prism' ? seat!.solid.depthMm : 0;
          const deep = 450 / Math.cos((seatTiltDeg * Math.PI) / 180) / 450;
          const whole = (outlineArea + 1200 * 450 * (deep - 1)) * thickness;
          expect(Math.abs(volume - whole) / whole).toBeLessThan(0.02);
        },
      ),
      { numRuns: 12 },
    );
  });

  it('cut a seat with a notch in the middle of its front where the section runs through it', () => {
    const deep = 260;
    const document = shaped(benchAlone({ places: { by: 'count', count: 1 } }), 'seat', {
      notches: [{ edge: 'front', fromMm: 500, widthMm: 200, depthMm: deep }],
    });
    const cut = sectionOf(document, document.pieces[0]!.id).shapes.flatMap((shape) =>
      shape.kind === 'polygon' && shape.fill === 'cloth' && shape.pen === 'cut' ? [shape.points] : [],
    );
    expect(Math.max(...spansOf(cut))).toBeCloseTo(450 - deep, 3);
  });

  it('leave the notch of a back open in the picture from the front', () => {
    const plain = benchAlone();
    const notched = shaped(plain, 'back', {
      notches: [{ edge: 'back', fromMm: 500, widthMm: 200, depthMm: 150 }],
    });
    const cloth = (document: typeof plain) =>
      frontOf(document).shapes.flatMap((shape) =>
        shape.kind === 'polygon' && shape.fill === 'cloth' ? [areaOf(shape.points)] : [],
      );
    const cos = Math.cos((8 * Math.PI) / 180);
    const [whole, left] = [cloth(plain), cloth(notched)].map((areas) => Math.max(...areas));
    // From the front a leaning panel is as high as its thickness makes it more; its face alone is drawn when shaped.
    expect(whole! - left!).toBeGreaterThan(200 * 150 * cos - 1);
    expect(left).toBeGreaterThan(whole! * 0.8);
  });

  it('have it in the plan, and its mark on it', () => {
    const plan = planOf(notchedSeat, { marks: 'cushions' });
    const areas = plan.shapes.flatMap((shape) =>
      shape.kind === 'polygon' && shape.cushionMark === 'C1' ? [areaOf(shape.points)] : [],
    );
    expect(areas[0]).toBeCloseTo(1200 * 450 - 300 * 200, 3);
  });

  it('in a set: every side of the outline is a line of the view', () => {
    const { lines } = setDrawing(notchedSeat, above, { system: 'millimetres', roundTo: 16 });
    const found = lines.map(({ from, to }) => Math.hypot(to[0] - from[0], to[1] - from[1]));
    for (const side of [200, 300]) expect(found.some((length) => Math.abs(length - side) < 1e-6)).toBe(true);
  });
});

describe('convex pieces of an outline', () => {
  it('fill it, are few, and each turns one way', () => {
    const [seat] = cushionsOf(shaped(benchAlone(), 'seat', comb), 'seat');
    const outline = seat!.solid.shape === 'prism' ? seat!.solid.outlineMm : [];
    const pieces = convexPieces(outline);
    expect(pieces.length).toBeLessThanOrEqual(5);
    const points = pieces.map((piece) => piece.map((i): PagePoint => outline[i]!));
    expect(points.reduce((sum, piece) => sum + areaOf(piece), 0)).toBeCloseTo(areaOf(outline), 6);
    for (const piece of points) {
      piece.forEach(([bx, by], i) => {
        const [ax, ay] = piece[(i + piece.length - 1) % piece.length]!;
        const [cx, cy] = piece[(i + 1) % piece.length]!;
        expect((bx - ax) * (cy - by) - (by - ay) * (cx - bx)).toBeGreaterThanOrEqual(-1e-6);
      });
    }
  });
});

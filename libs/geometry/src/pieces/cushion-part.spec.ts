import { describe, expect, it } from 'vitest';
import { benchAlone, cushionsOf, LEFT_REAR_NOTCH, shaped } from '../../test/shaped.ts';
import { partEdges } from '../drawing/solid-outline.ts';
import { outlineArea } from '../outlines/outline.ts';
import { shapedOutline } from '../cushions/cushion-shape.ts';
import { partFrame } from '../measuring/part-frame.ts';
import type { Part } from '../parts/part.ts';
import { chooseCushion } from '../room/cushion-choices.ts';
import { addPiece, movePiece } from '../room/edit-pieces.ts';
import { mirrorPieces } from '../room/mirror-pieces.ts';
import { derivePieceParts } from './kinds.ts';

/** Corners of a part in the room, the numbers rounded. */
const corners = (part: Part) =>
  partEdges(part).corners.map((corner) => corner.map((value) => Math.round(value * 1e6) / 1e6 + 0));

const area = (part: Part): number => {
  if (part.solid.shape !== 'prism') throw new Error('not shaped');
  const at = part.solid.outlineMm;
  return at.reduce((sum, [x, y], i) => {
    const [bx, by] = at[(i + 1) % at.length]!;
    return sum + (x * by - bx * y) / 2;
  }, 0);
};

describe('the part of a shaped cushion', () => {
  const plain = benchAlone();
  const [box] = cushionsOf(plain, 'seat');
  const notched = shaped(plain, 'seat', LEFT_REAR_NOTCH);
  const [seat] = cushionsOf(notched, 'seat');

  it('has the name, the place, the height and the front of the plain one', () => {
    expect({ ...seat, solid: 0, rotationRad: 0 }).toEqual({ ...box, solid: 0, rotationRad: 0 });
    for (const axis of [0, 1, 2] as const) {
      const span = (part: Part) => {
        const all = partEdges(part).corners.map((corner) => corner[axis]);
        return [Math.min(...all), Math.max(...all)];
      };
      const [[low, high], [plainLow, plainHigh]] = [span(seat!), span(box!)];
      expect(low).toBeCloseTo(plainLow!, 9);
      expect(high).toBeCloseTo(plainHigh!, 9);
    }
  });

  it('is notched at the left end as the sitter sees it: the high end of the bench', () => {
    const rear = box!.positionMm[2] - 225;
    const points = corners(seat!);
    expect(points).toHaveLength(12);
    for (const [x, z] of [
      [300, rear],
      [300, rear + 200],
      [600, rear + 200],
    ] as const) {
      const found = points.filter(([px, , pz]) => Math.abs(px! - x) < 1e-6 && Math.abs(pz! - z) < 1e-6);
      expect(found).toHaveLength(2);
    }
    expect(points.some(([x, , z]) => x! > 301 && z! < rear + 199)).toBe(false);
  });

  it('turns with its bench', () => {
    const turned = cushionsOf(shaped(benchAlone({}, 90), 'seat', LEFT_REAR_NOTCH), 'seat')[0]!;
    const [still, moved] = [partEdges(seat!).corners, partEdges(turned).corners];
    moved.forEach(([x, y, z], i) => {
      expect([x, y, z].map((value) => Math.round(value * 1e6) / 1e6 + 0)).toEqual(
        [still[i]![2], still[i]![1], -still[i]![0]].map((value) => Math.round(value * 1e6) / 1e6 + 0),
      );
    });
  });

  it('is tilted as the box is: its upper face lies in the same plane', () => {
    const tilted = benchAlone({ seatTiltDeg: 4 });
    const [flat] = cushionsOf(tilted, 'seat');
    const [cut] = cushionsOf(shaped(tilted, 'seat', LEFT_REAR_NOTCH), 'seat');
    const frame = partFrame(flat!);
    const half = flat!.solid.shape === 'box' ? flat!.solid.sizeMm[1] / 2 : 0;
    for (const corner of partEdges(cut!).corners.map(frame.toPart)) {
      expect(Math.abs(corner[1])).toBeCloseTo(half, 6);
    }
  });

  it('of a back has its top edge at the top and leans with it', () => {
    const [pad] = cushionsOf(plain, 'back');
    const cut = shaped(plain, 'back', {
      notches: [{ edge: 'back', fromMm: 500, widthMm: 200, depthMm: 150 }],
    });
    const [back] = cushionsOf(cut, 'back');
    const size = pad!.solid.shape === 'box' ? pad!.solid.sizeMm : [0, 0, 0];
    const own = partEdges(back!).corners.map(partFrame(pad!).toPart);
    for (const corner of own) expect(Math.abs(corner[2])).toBeCloseTo(size[2] / 2, 6);
    const inside = own.filter(([x, y]) => Math.abs(x) < 101 && Math.abs(y) < size[1] / 2 - 1);
    expect(inside.map(([, y]) => Math.round(y * 1e6) / 1e6)).toEqual(
      Array.from({ length: 4 }, () => Math.round((size[1] / 2 - 150) * 1e6) / 1e6),
    );
  });

  it.each([
    ['an L', { notches: [{ edge: 'front', fromMm: 0, widthMm: 500, depthMm: 200 }] }],
    ['a mitre', { frontInMm: { left: 0, right: 450 } }],
    ['a taper', { frontInMm: { left: 40, right: 60 } }],
    ['round corners', { cornerRadiusMm: { backLeft: 0, backRight: 20, frontLeft: 120, frontRight: 60 } }],
    [
      'a drawn plan',
      {
        drawn: [
          { xMm: 0, yMm: 0, radiusMm: 0, edge: 'front' },
          { xMm: 1200, yMm: 0, radiusMm: 50, edge: 'left' },
          { xMm: 700, yMm: 450, radiusMm: 0, edge: 'back' },
        ],
      },
    ],
  ] as const)('of %s fills as much as its outline', (_, shape) => {
    const cut = structuredClone(shape) as Parameters<typeof shaped>[2];
    const [part] = cushionsOf(shaped(plain, 'seat', cut), 'seat');
    const outline = shapedOutline({ widthMm: 1200, depthMm: 450 }, cut);
    const whole = outline.ok ? outlineArea(outline.corners) : 0;
    // Chords leave at most half a millimetre along the arcs.
    expect(area(part!)).toBeGreaterThan(whole - 150);
    expect(area(part!)).toBeLessThan(whole + 1e-6);
  });

  it('is the box where the shape is plain or cannot be cut', () => {
    for (const shape of [
      {},
      { frontInMm: { left: 0, right: 0 } },
      { cornerRadiusMm: { backLeft: 900, backRight: 0, frontLeft: 0, frontRight: 0 } },
    ]) {
      expect(cushionsOf(shaped(plain, 'seat', shape), 'seat')).toEqual([box]);
    }
  });

  it('keeps its shape in a run that is divided, and leaves the others plain', () => {
    const run = benchAlone({
      upholstery: {
        longestCushionMm: 600,
        buttons: { rows: 2, everyBoards: 3, alignTo: 'joints', on: 'back' },
        joints: { seat: { by: 'positions', atMm: [500] } },
      },
    });
    const parts = cushionsOf(shaped(run, 'seat', LEFT_REAR_NOTCH, 2), 'seat');
    expect(parts.map(({ solid }) => solid.shape)).toEqual(['box', 'prism']);
    expect(area(parts[1]!)).toBeCloseTo(700 * 450 - 300 * 200, 6);
  });

  it('is its mirror image on a mirrored bench', () => {
    const mirrored = mirrorPieces(notched, [notched.pieces[0]!.id], { xMm: 0, zMm: 0, alongDeg: 90 });
    const there = corners(cushionsOf(mirrored, 'seat')[0]!);
    for (const [x, y, z] of corners(seat!)) {
      const twin = there.find(
        (corner) =>
          Math.abs(corner[0]! + x!) < 1e-5 &&
          Math.abs(corner[1]! - y!) < 1e-5 &&
          Math.abs(corner[2]! - z!) < 1e-5,
      );
      expect(twin).toBeDefined();
    }
  });

  it('is cut for a loose seat too', () => {
    const { document } = addPiece(plain, 'loose-seat', { xMm: 0, zMm: 900, turnDeg: 0 });
    const round = { backLeft: 0, backRight: 0, frontLeft: 80, frontRight: 80 };
    const key = `${document.pieces[1]!.id}/seat-1`;
    const cut = chooseCushion(document, key, { shape: { cornerRadiusMm: round } });
    expect(cushionsOf(cut, 'seat').map(({ solid }) => solid.shape)).toEqual(['box', 'prism']);
  });

  it('is kept until a shape of its own piece changes', () => {
    const { document, pieceId } = addPiece(notched, 'bench', { xMm: 3000, zMm: 0, turnDeg: 0 });
    const [first] = document.pieces;
    const before = derivePieceParts(first!, document);
    const noted = chooseCushion(document, `${first!.id}/seat-1`, { notes: 'by the column' });
    const elsewhere = chooseCushion(noted, `${pieceId}/seat-1`, { shape: LEFT_REAR_NOTCH });
    const moved = movePiece(elsewhere, pieceId, { xMm: 4000, zMm: 0, turnDeg: 0 });
    expect(derivePieceParts(first!, moved)).toBe(before);
    const reshaped = chooseCushion(moved, `${first!.id}/seat-1`, { shape: structuredClone(LEFT_REAR_NOTCH) });
    expect(derivePieceParts(first!, reshaped)).not.toBe(before);
    expect(derivePieceParts(first!, reshaped)).toEqual(before);
  });
});

import { describe, expect, it } from 'vitest';
import type { Part, Vec3 } from '../parts/part.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { addPiece, movePiece } from '../room/edit-pieces.ts';
import { setParameter } from '../pieces/parameters.ts';
import { deriveParts } from '../pieces/kinds.ts';
import type { SetDocument } from '../room/document.ts';
import { endWords } from './end-words.ts';
import type { MeasureEnd } from './dimension.ts';
import { measureEnds } from './measure-ends.ts';
import { measuringScene } from './measuring-scene.ts';
import { namedPoints } from './named-points.ts';
import { partFrame } from './part-frame.ts';
import { hitPart } from './ray-hits.ts';
import { partEdges } from '../drawing/solid-outline.ts';
import { snapEnd } from './snap-end.ts';

const twoTables = (): SetDocument => {
  const one = addPiece(emptySetDocument(), 'table', { xMm: 0, zMm: 0, turnDeg: 0 }, 't1').document;
  return addPiece(one, 'table', { xMm: 3000, zMm: 400, turnDeg: 90 }, 't2').document;
};
const sceneOf = (document: SetDocument) => measuringScene(document, deriveParts(document));
const topOf = (document: SetDocument, pieceId: string): Part =>
  deriveParts(document).find((part) => part.pieceId === pieceId && part.role === 'top')!;
const table = (document: SetDocument, id: string) => {
  const piece = document.pieces.find((one) => one.id === id);
  if (piece?.kind !== 'table') throw new Error('no table');
  return piece;
};
/** A named point of a piece by its words. */
const named = (document: SetDocument, pieceId: string, words: string): MeasureEnd => {
  const point = namedPoints(pieceId, sceneOf(document)).find((one) => one.words === words);
  if (!point) throw new Error(`no ${words}`);
  return point.end;
};
const down = (x: number, z: number) => ({ origin: [x, 5000, z] as Vec3, direction: [0, -1, 0] as Vec3 });

describe('measureEnds', () => {
  it('measures a table from corner to corner as its sizes say', () => {
    const document = twoTables();
    const { lengthMm, widthMm, topThicknessMm } = table(document, 't1');
    const line = measureEnds(
      [
        named(document, 't1', 'back left lower corner of T1 top'),
        named(document, 't1', 'front right upper corner of T1 top'),
      ],
      sceneOf(document),
    )!;
    expect(line.acrossMm).toBeCloseTo(lengthMm, 6);
    expect(line.upMm).toBeCloseTo(topThicknessMm, 6);
    expect(line.alongMm).toBeCloseTo(widthMm, 6);
    expect(line.distanceMm).toBeCloseTo(Math.hypot(lengthMm, topThicknessMm, widthMm), 6);
  });

  it('finds the shortest way between two whole tops, one of them turned', () => {
    const document = twoTables();
    const [one, other] = [topOf(document, 't1'), topOf(document, 't2')];
    const line = measureEnds(
      [
        { on: 'part', pieceId: 't1', partId: one.id },
        { on: 'part', pieceId: 't2', partId: other.id },
      ],
      sceneOf(document),
    )!;
    const room = 3000 - table(document, 't1').lengthMm / 2 - table(document, 't2').widthMm / 2;
    expect(line.distanceMm).toBeCloseTo(room, 2);
  });

  it('goes along when a piece is moved, and follows a corner when it is made larger', () => {
    const document = twoTables();
    const ends = [
      named(document, 't1', 'front right upper corner of T1 top'),
      named(document, 't2', 'front right upper corner of T2 top'),
    ] as const;
    const before = measureEnds(ends, sceneOf(document))!;
    const moved = movePiece(document, 't2', { xMm: 3250 });
    const after = measureEnds(ends, sceneOf(moved))!;
    expect(after.toMm[0] - before.toMm[0]).toBeCloseTo(250, 6);
    const wider = setParameter(document, 't1', 'lengthMm', table(document, 't1').lengthMm + 100);
    if (!wider.ok) throw new Error(wider.error.message);
    expect(measureEnds(ends, sceneOf(wider.value))!.fromMm[0]).toBeCloseTo(before.fromMm[0] + 50, 6);
  });

  it('says nothing where an end is gone', () => {
    const document = twoTables();
    const end = named(document, 't1', 'front right upper corner of T1 top');
    const nobody: MeasureEnd = { on: 'body', pieceId: 't1', place: 1, point: 'crown' };
    expect(measureEnds([end, nobody], sceneOf(document))).toBeUndefined();
  });
});

describe('namedPoints', () => {
  it('has no two points of a piece under one name', () => {
    const document = addPiece(twoTables(), 'bench', { xMm: 0, zMm: -900, turnDeg: 30 }, 'b1').document;
    for (const { id } of document.pieces) {
      const words = namedPoints(id, sceneOf(document)).map((point) => point.words);
      expect(new Set(words).size).toBe(words.length);
    }
  });

  it('names sides as seen from in front of the piece, however it is turned', () => {
    const document = twoTables();
    const right = named(document, 't2', 'front right upper corner of T2 top');
    const at = measureEnds([right, right], sceneOf(document))!.fromMm;
    const { lengthMm, widthMm } = table(document, 't2');
    // Turned by 90° its front looks along +x, and its right lies along -z.
    expect(at[0]).toBeCloseTo(3000 + widthMm / 2, 6);
    expect(at[2]).toBeCloseTo(400 - lengthMm / 2, 6);
  });
});

describe('snapEnd', () => {
  const document = twoTables();
  const scene = sceneOf(document);
  const parts = [...scene.parts.values()];
  const { lengthMm, widthMm, heightMm } = table(document, 't1');
  const snap = (x: number, z: number, more: { whole?: boolean; fromMm?: number } = {}) =>
    snapEnd(scene, { line: down(x, z), reachMm: () => 15, parts, ...more });

  it('takes a corner before an edge, and an edge before a face', () => {
    const corner = snap(lengthMm / 2 - 5, widthMm / 2 - 6)!;
    expect(endWords(corner.end, scene)).toBe('front right upper corner of T1 top');
    expect(corner.pointMm).toEqual([lengthMm / 2, heightMm, widthMm / 2]);
    const edge = snap(120, widthMm / 2 + 4)!;
    expect(endWords(edge.end, scene)).toBe('front upper edge of T1 top');
    expect(edge.pointMm[0]).toBeCloseTo(120, 6);
    const face = snap(40, 30)!;
    expect(endWords(face.end, scene)).toBe('upper face of T1 top');
    expect(face.pointMm[1]).toBeCloseTo(heightMm, 6);
  });

  it('takes nothing over paper, and no corner that hides behind the top', () => {
    expect(snap(9000, 9000)).toBeUndefined();
    const leg = parts.find(({ role, pieceId }) => role === 'leg' && pieceId === 't1');
    const [x, , z] = leg?.positionMm ?? [100, 0, 100];
    expect(endWords(snap(x, z)!.end, scene)).toBe('upper face of T1 top');
  });

  it('takes the whole part for the shortest way', () => {
    expect(endWords(snap(40, 30, { whole: true })!.end, scene)).toBe('the whole of T1 top');
  });

  it('looks through what a section has taken away', () => {
    const under = snap(40, 30, { fromMm: 5000 - heightMm + 1 });
    expect(under?.end).toMatchObject({ on: 'spot' });
    expect(under!.pointMm[1]).toBeCloseTo(heightMm - 1, 6);
  });
});

describe('hitPart', () => {
  const part = (solid: Part['solid'], rotationRad: Vec3 = [0, 0, 0]): Part => ({
    id: 'p',
    pieceId: 'p',
    role: 'beam',
    material: 'oak',
    solid,
    positionMm: [100, 200, 300],
    rotationRad,
  });

  it('meets a turned box, a bar and a hollow outline where they are', () => {
    const box = part({ shape: 'box', sizeMm: [200, 100, 60] }, [0, Math.PI / 2, 0]);
    expect(hitPart(box, { origin: [1000, 200, 300], direction: [-1, 0, 0] })).toBeCloseTo(900 - 30, 6);
    const bar = part({ shape: 'cylinder', radiusMm: 40, heightMm: 500 });
    expect(hitPart(bar, { origin: [1000, 200, 300], direction: [-1, 0, 0] })).toBeCloseTo(900 - 40, 6);
    expect(hitPart(bar, { origin: [1000, 460, 300], direction: [-1, 0, 0] })).toBeUndefined();
    const angle = part({
      shape: 'prism',
      outlineMm: [
        [0, 0],
        [100, 0],
        [100, 20],
        [20, 20],
        [20, 100],
        [0, 100],
      ],
      depthMm: 50,
    });
    // From above, over the hollow: the foot of the angle is met, not its hull.
    expect(hitPart(angle, { origin: [160, 1000, 300], direction: [0, -1, 0] })).toBeCloseTo(780, 6);
  });

  it('agrees with the corners of a part about how it is turned', () => {
    const turned = part({ shape: 'box', sizeMm: [200, 100, 60] }, [0.3, 0.8, -0.4]);
    const { toPart, toRoom } = partFrame(turned);
    for (const corner of partEdges(turned).corners) {
      expect(toPart(corner).map(Math.abs)).toEqual([100, 50, 30].map((mm) => expect.closeTo(mm, 6)));
      expect(toRoom(toPart(corner))).toEqual(corner.map((mm) => expect.closeTo(mm, 6)));
    }
  });
});

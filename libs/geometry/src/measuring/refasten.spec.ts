import { describe, expect, it } from 'vitest';
import { benchAlone, shaped } from '../../test/shaped.ts';
import type { CushionShape } from '../cushions/cushion-shape.ts';
import { partEdges } from '../drawing/solid-outline.ts';
import { deriveParts } from '../pieces/kinds.ts';
import { withCushionChoices } from '../room/cushion-choices.ts';
import type { SetDocument } from '../room/document.ts';
import type { Vec3 } from '../parts/part.ts';
import type { MeasureEnd } from './dimension.ts';
import { pinDimension } from './edit-dimensions.ts';
import { endPoint } from './measure-ends.ts';
import { measuringScene } from './measuring-scene.ts';
import { refastenDimensions } from './refasten.ts';

const bench = benchAlone();
const seat = deriveParts(bench).find(({ role }) => role === 'seat-cushion')!;
const ties = { pieceId: seat.pieceId, partId: seat.id };
const NOTCHED: CushionShape = { notches: [{ edge: 'back', fromMm: 0, widthMm: 200, depthMm: 150 }] };

const pointsOf = (document: SetDocument) =>
  document.dimensions!.flatMap(({ ends }) =>
    ends.map((end) => endPoint(end, measuringScene(document, deriveParts(document)))!),
  );
const apart = (a: readonly number[], b: readonly number[]) => Math.hypot(...a.map((n, i) => n - b[i]!));

describe('pinned lines on a cushion that takes another shape', () => {
  const { corners } = partEdges(seat);
  const pinned = corners.reduce<SetDocument>((document, _, corner) => {
    const ends: [MeasureEnd, MeasureEnd] = [
      { on: 'corner', ...ties, corner },
      { on: 'edge', ...ties, edge: corner, along: 0.5 },
    ];
    return pinDimension(document, ends).document;
  }, bench);
  const before = pointsOf(pinned);

  it('stay at their corners and edges, but at the notch, where they go to the nearest', () => {
    const cut = shaped(pinned, 'seat', NOTCHED);
    const after = pointsOf(refastenDimensions(pinned, cut));
    const off = after.map((point, n) => apart(point, before[n]!));
    expect(off.filter((mm) => mm < 0.5).length).toBeGreaterThanOrEqual(before.length - 6);
    expect(Math.max(...off)).toBeLessThan(201);
    // By their numbers alone most would have jumped somewhere else.
    expect(pointsOf(cut).filter((point, n) => apart(point, before[n]!) < 0.5).length).toBeLessThan(
      before.length / 2,
    );
  });

  it('are back where they were when the shape is given back', () => {
    const cut = refastenDimensions(pinned, shaped(pinned, 'seat', NOTCHED));
    const back = refastenDimensions(cut, withCushionChoices(cut, {}));
    const kept = pointsOf(back).filter((point, n) => apart(point, before[n]!) < 0.5);
    expect(kept.length).toBeGreaterThanOrEqual(before.length - 6);
  });

  it('stay when as many corners are counted another way', () => {
    const cornered = (edge: 'back' | 'front'): CushionShape => ({
      notches: [{ edge, fromMm: 0, widthMm: 200, depthMm: 150 }],
    });
    const back = refastenDimensions(pinned, shaped(pinned, 'seat', cornered('back')));
    const front = refastenDimensions(back, shaped(back, 'seat', cornered('front')));
    const were = pointsOf(back);
    const off = pointsOf(front).map((point, n) => apart(point, were[n]!));
    expect(off.filter((mm) => mm < 0.5).length).toBeGreaterThanOrEqual(were.length - 6);
  });

  it('go along with a notch that is moved on its edge', () => {
    const notched = (fromMm: number): CushionShape => ({
      notches: [{ edge: 'back', fromMm, widthMm: 200, depthMm: 150 }],
    });
    const set = shaped(bench, 'seat', notched(300));
    const part = deriveParts(set).find(({ id }) => id === seat.id)!;
    const ends = [3, 4].map((corner): MeasureEnd => ({ on: 'corner', ...ties, corner }));
    const across = pinDimension(set, [ends[0]!, ends[1]!]).document;
    expect(apart(...(pointsOf(across) as [Vec3, Vec3]))).toBeCloseTo(150, 6);
    const moved = refastenDimensions(across, shaped(across, 'seat', notched(600)));
    expect(partEdges(part).corners).toHaveLength(16);
    expect(apart(...(pointsOf(moved) as [Vec3, Vec3]))).toBeCloseTo(150, 6);
    expect(apart(pointsOf(moved)[0]!, pointsOf(across)[0]!)).toBeCloseTo(300, 6);
  });

  it('leave the set as it is where no part changed', () => {
    expect(refastenDimensions(pinned, pinned)).toBe(pinned);
    const without = shaped(bench, 'seat', NOTCHED);
    expect(refastenDimensions(bench, without)).toBe(without);
  });
});

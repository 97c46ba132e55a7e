import { describe, expect, it } from 'vitest';
import { benchAlone, shaped } from '../../test/shaped.ts';
import type { CushionShape } from '../cushions/cushion-shape.ts';
import { partEdges } from '../drawing/solid-outline.ts';
import { deriveParts } from '../pieces/kinds.ts';
import { withCushionChoices } from '../room/cushion-choices.ts';
import type { SetDocument } from '../room/document.ts';
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

  it('leave the set as it is where no part changed', () => {
    expect(refastenDimensions(pinned, pinned)).toBe(pinned);
    const without = shaped(bench, 'seat', NOTCHED);
    expect(refastenDimensions(bench, without)).toBe(without);
  });
});

import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { deriveParts } from '../pieces/kinds.ts';
import { diffDocuments } from '../room/diff-documents.ts';
import type { SetDocument } from '../room/document.ts';
import { removePiece } from '../room/edit-pieces.ts';
import { mergeDocuments } from '../room/merge-documents.ts';
import { readSetDocument } from '../room/read-document.ts';
import { setDrawing } from '../drawing/set-drawing.ts';
import { VIEW_DIRECTIONS } from '../drawing/set-view.ts';
import { wordsWidth, type DrawnWords } from '../drawing/drawn.ts';
import type { MeasureEnd } from './dimension.ts';
import { pinDimension, unpinDimension } from './edit-dimensions.ts';
import { measureEnds } from './measure-ends.ts';
import { measuringScene } from './measuring-scene.ts';

const start = (): SetDocument => ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const corner = (document: SetDocument, pieceId: string, role: string, n: number): MeasureEnd => {
  const part = deriveParts(document).find((one) => one.pieceId === pieceId && one.role === role)!;
  return { on: 'corner', pieceId, partId: part.id, corner: n };
};
const along = (document: SetDocument): [MeasureEnd, MeasureEnd] => [
  corner(document, 't1', 'top', 6),
  corner(document, 't1', 'top', 7),
];
const across = (document: SetDocument): [MeasureEnd, MeasureEnd] => [
  corner(document, 't1', 'top', 6),
  corner(document, 's1', 'sill-board', 2),
];
const pinned = (document: SetDocument, ends: [MeasureEnd, MeasureEnd]) =>
  pinDimension(document, ends).document;

describe('pinned dimension lines', () => {
  it('are read back, and refused where their piece is not there', () => {
    const document = pinned(start(), along(start()));
    expect(readSetDocument(JSON.parse(JSON.stringify(document)))).toEqual({ ok: true, value: document });
    const lost = { ...document, pieces: document.pieces.filter(({ id }) => id !== 't1') };
    const read = readSetDocument({ ...lost, seating: [] });
    expect(read.ok).toBe(false);
    if (!read.ok) expect(read.error.message).toContain('hangs on a piece “t1”');
  });

  it('go with the piece they hang on, and leave no empty list behind', () => {
    const document = pinned(start(), across(start()));
    expect(removePiece(document, 's1')).not.toHaveProperty('dimensions');
    expect(unpinDimension(document, 'd1')).toEqual(start());
  });

  it('are told apart in words', () => {
    const document = pinned(start(), across(start()));
    expect(diffDocuments(start(), document, start())).toEqual([
      expect.objectContaining({
        kind: 'dimension',
        label: 'Dimension line from T1 to S1',
        changedBy: 'mine',
        conflict: false,
      }),
    ]);
  });

  it('are both kept where two people pinned one each under one id', () => {
    const merge = mergeDocuments(
      start(),
      pinned(start(), along(start())),
      pinned(start(), across(start())),
      {},
    );
    if (!merge.ok) throw new Error(merge.error.message);
    expect(merge.value.document.dimensions?.map(({ id, ends }) => [id, ends])).toEqual([
      ['d1', across(start())],
      ['d2', along(start())],
    ]);
  });

  it('fall away where the other side took the piece out', () => {
    const mine = pinned(start(), across(start()));
    const merge = mergeDocuments(start(), mine, removePiece(start(), 's1'), {});
    if (!merge.ok) throw new Error(merge.error.message);
    expect(merge.value.document.dimensions).toBeUndefined();
  });
});

const style = { system: 'millimetres', roundTo: 8 } as const;

function meet(a: DrawnWords, b: DrawnWords): boolean {
  const [left, right] = [a, b].map(({ at, text, heightMm, anchor }) => {
    const width = wordsWidth(text, heightMm) * 0.85;
    const x = anchor === 'start' ? at[0] : anchor === 'end' ? at[0] - width : at[0] - width / 2;
    return { x, width, y: at[1] - heightMm * 0.4, height: heightMm * 0.8 };
  });
  return (
    left!.x < right!.x + right!.width &&
    right!.x < left!.x + left!.width &&
    left!.y < right!.y + right!.height &&
    right!.y < left!.y + left!.height
  );
}

describe('pinned lines on a drawing', () => {
  const document = pinned(pinned(start(), along(start())), across(start()));
  const measured = document.dimensions!.map(
    ({ ends }) => measureEnds(ends, measuringScene(document, deriveParts(document)))!.distanceMm,
  );
  const view = { direction: 'above', hidden: 'left-out', scale: 20 } as const;
  const added = (direction: (typeof VIEW_DIRECTIONS)[number], sectionMm?: number) => {
    const plain = new Set(
      setDrawing(start(), { ...view, direction, sectionMm }, style).words.map(
        ({ text, at }) => `${text} ${at.join(' ')}`,
      ),
    );
    return setDrawing(document, { ...view, direction, sectionMm }, style).words.filter(
      ({ text, at, layer }) => layer === 'dimension' && !plain.has(`${text} ${at.join(' ')}`),
    );
  };

  it('carry the true length, and say so where the view shows less', () => {
    const words = added('above');
    expect(words.map(({ valueMm }) => valueMm)).toEqual(measured.map((mm) => expect.closeTo(mm, 6)));
    expect(words[0]!.text).not.toContain('true');
    expect(words[1]!.text).toContain('true');
  });

  it.each(VIEW_DIRECTIONS)('from %s stand on no other words', (direction) => {
    for (const scale of [10, 20, 50]) {
      const { words } = setDrawing(document, { ...view, direction, scale }, style);
      words.forEach((one, i) => {
        for (const other of words.slice(i + 1))
          expect([one.text, other.text, meet(one, other)]).toContain(false);
      });
    }
  });

  it('are left out where they are seen end on, or the section took an end away', () => {
    const [line] = document.dimensions!;
    const { fromMm, toMm } = measureEnds(line!.ends, measuringScene(document, deriveParts(document)))!;
    const alongX = Math.abs(toMm[0] - fromMm[0]) > 1;
    const endOn = added(alongX ? 'right' : 'front');
    expect(endOn.map(({ valueMm }) => valueMm)).not.toContainEqual(expect.closeTo(measured[0]!, 6));
    expect(added('above', 300)).toEqual([]);
  });

  it('never print anything of a body', () => {
    const withBody = pinned(start(), [
      corner(start(), 't1', 'top', 6),
      { on: 'body', pieceId: 'b1', place: 1, point: 'left-knee-top' },
    ]);
    expect(setDrawing(withBody, view, style)).toEqual(setDrawing(start(), view, style));
  });
});

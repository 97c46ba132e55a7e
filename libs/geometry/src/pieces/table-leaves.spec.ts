import { describe, expect, it } from 'vitest';
import { measureSet, piece } from '../../test/measured.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { diffDocuments } from '../room/diff-documents.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { mergeDocuments } from '../room/merge-documents.ts';
import { emptySetDocument, readSetDocument } from '../room/read-document.ts';
import { derivePieceParts, pieceEnvelope, specSentence } from './kinds.ts';
import { parametersOf, setParameter } from './parameters.ts';

const table = (leaves: PieceOf<'table'>['leaves']) =>
  piece('table', 'T1', [0, 0, 0], {
    lengthMm: 1000,
    widthMm: 700,
    heightMm: 736,
    topThicknessMm: 30,
    leaves,
  });
const setOf = (one: PieceOf<'table'>): SetDocument => ({ ...emptySetDocument(), pieces: [one] });
const leafOf = (one: PieceOf<'table'>) =>
  derivePieceParts(one)
    .filter(({ role }) => role === 'leaf')
    .map(({ solid, positionMm }) => ({ size: solid.shape === 'box' ? solid.sizeMm : [], at: positionMm }));

describe('a leaf of a table', () => {
  it('lies level with the top when it is up, and hangs outside its edge when it is down', () => {
    const [up] = leafOf(table({ right: { widthMm: 250, down: false } }));
    expect(up).toEqual({ size: [250, 30, 700], at: [625, 721, 0] });
    const [down] = leafOf(table({ right: { widthMm: 250, down: true } }));
    expect(down).toEqual({ size: [30, 250, 700], at: [515, 611, 0] });
    expect(pieceEnvelope(table({ right: { widthMm: 250, down: false } })).maxMm[0]).toBe(750);
  });

  it('makes room for more overlap when it is lifted, and takes the thighs their room when it hangs', () => {
    const window = ARRANGEMENTS.find(({ id }) => id === 'bench-window')?.build() as SetDocument;
    const with_ = (down: boolean): SetDocument => ({
      ...window,
      pieces: window.pieces.map((one) =>
        // The table stands turned by a quarter, its back edge at the bench.
        one.kind === 'table' ? { ...one, leaves: { back: { widthMm: 100, down } } } : one,
      ),
    });
    const lap = (set: SetDocument) => measureSet(set).places[0]?.table;
    expect(lap(with_(false))?.overlapMm).toBeCloseTo((lap(window)?.overlapMm ?? 0) + 100, 6);
    expect(lap(with_(true))?.undersideMm).toBeCloseTo(736.6 - 100, 6);
  });

  it('is chosen, sized and dropped by the form, and stands in the second sentence', () => {
    const make = (set: SetDocument, key: string, value: number | string) => {
      const next = setParameter(set, 't1', key, value);
      if (!next.ok) throw new Error(next.error.message);
      return next.value;
    };
    const ends = make(setOf(table(undefined)), 'leaves.at', 'ends');
    const wide = make(make(ends, 'leaves.left.widthMm', 300), 'leaves.left.state', 'down');
    const [one] = wide.pieces as PieceOf<'table'>[];
    expect(one?.leaves).toEqual({
      left: { widthMm: 300, down: true },
      right: { widthMm: 254, down: false },
    });
    const words = specSentence(one as PieceOf<'table'>).more.map((token) =>
      token.kind === 'number' ? `<${token.key}>` : token.text,
    );
    expect(words.join('')).toContain(
      ' Left leaf <leaves.left.widthMm> wide, hanging; right leaf <leaves.right.widthMm> wide, up; making long',
    );
    expect(setParameter(wide, 't1', 'heightMm', 320)).toMatchObject({ ok: false });
    const [plain] = make(wide, 'leaves.at', 'none').pieces;
    expect(plain && parametersOf(plain).map(({ key }) => key)).not.toContain('leaves.left.widthMm');
    expect(plain).not.toHaveProperty('leaves');
  });

  it('is refused where it cannot be built', () => {
    const leaf = { widthMm: 200, down: false };
    expect(readSetDocument(setOf(table({ left: leaf, front: leaf })))).toMatchObject({ ok: false });
    expect(readSetDocument(setOf(table({ left: { widthMm: 700, down: true } })))).toMatchObject({
      ok: false,
    });
    expect(readSetDocument(setOf(table({ left: leaf, right: leaf })))).toMatchObject({ ok: true });
  });

  it('is compared and merged as one', () => {
    const base = setOf(table({ left: { widthMm: 200, down: false } }));
    const dropped = setOf(table({ left: { widthMm: 200, down: true } }));
    expect(diffDocuments(base, dropped, base)).toEqual([
      expect.objectContaining({ key: 'leaves', label: 'Leaves', changedBy: 'mine' }),
    ]);
    const { leaves: _, ...plain } = table(undefined);
    const merged = mergeDocuments(base, setOf(plain), base, {});
    expect(merged.ok && merged.value.document.pieces[0]).not.toHaveProperty('leaves');
  });
});

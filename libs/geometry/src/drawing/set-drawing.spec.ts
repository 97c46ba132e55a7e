import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { PieceOf } from '../room/document.ts';
import { wordsWidth, type DrawnWords } from './drawn.ts';
import { hiddenWords } from './hidden-words.ts';
import { setDrawing } from './set-drawing.ts';
import { VIEW_DIRECTIONS, type SetView } from './set-view.ts';

const style = { system: 'feet-inches', roundTo: 16 } as const;
const view: SetView = { direction: 'above', hidden: 'left-out', scale: 24 };
const built = (id: string) => ARRANGEMENTS.find((one) => one.id === id)!.build();
const ofLayer = (words: readonly DrawnWords[], layer: DrawnWords['layer']) =>
  words.filter((one) => one.layer === layer);

function meet(a: DrawnWords, b: DrawnWords): boolean {
  const [left, right] = [a, b].map(({ at, text, heightMm, anchor }) => {
    // Drawn figures are narrower than the guess the layout works with.
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

describe('drawing of a set', () => {
  const cases = ARRANGEMENTS.flatMap(({ id }) =>
    VIEW_DIRECTIONS.map((direction) => [id, direction] as const),
  );

  it.each(cases)('of %s from %s has no words on other words and holds all of them', (id, direction) => {
    for (const scale of [12, 24, 48]) {
      const { words, boundsMm } = setDrawing(built(id), { ...view, direction, scale }, style);
      words.forEach((one, i) => {
        for (const other of words.slice(i + 1))
          expect([one.text, other.text, meet(one, other)]).toContain(false);
        expect(one.at[0]).toBeGreaterThanOrEqual(boundsMm.x - 1e-6);
        expect(one.at[1]).toBeLessThanOrEqual(boundsMm.y + boundsMm.height + 1e-6);
      });
    }
  });

  it('leaves out what is hidden, and says so on the sheet', () => {
    const document = built('facing-benches');
    const hide = (marks: readonly string[]) => ({
      ...document,
      pieces: document.pieces.map((piece) => ({ ...piece, hidden: marks.includes(piece.mark) })),
    });
    const drawn = setDrawing(hide(['T1']), view, style);
    const table = document.pieces.find(({ mark }) => mark === 'T1')!.id;
    expect(setDrawing(document, view, style).lines.some(({ pieceId }) => pieceId === table)).toBe(true);
    expect(drawn.lines.some(({ pieceId }) => pieceId === table)).toBe(false);
    expect(drawn.words.some(({ text, layer }) => layer === 'mark' && text === 'T1')).toBe(false);
    expect(drawn.words.map(({ text }) => text)).toContainEqual(
      expect.stringMatching(/Sizes govern\. 1 piece hidden: T1\.$/),
    );
    expect(hiddenWords(hide(['B1', 'B2', 'T1']))).toBe('3 pieces hidden: B1, B2 and T1');
    const many = { ...document, pieces: [...document.pieces, ...document.pieces, ...document.pieces] };
    const all = { ...many, pieces: many.pieces.map((piece) => ({ ...piece, hidden: true })) };
    expect(hiddenWords(all)).toMatch(
      new RegExp(`^${many.pieces.length} pieces hidden: .* and ${many.pieces.length - 6} more$`),
    );
    expect(hiddenWords(document)).toBeUndefined();
  });

  it('writes dimensions that add up to what they span, at the table its own', () => {
    const document = built('facing-benches');
    const table = document.pieces.find((piece): piece is PieceOf<'table'> => piece.kind === 'table')!;
    const alone = setDrawing({ ...document, pieces: [table] }, view, style);
    const values = ofLayer(alone.words, 'dimension').map(({ valueMm }) => valueMm);
    expect(values).toHaveLength(2);
    expect(values[0]).toBeCloseTo(table.widthMm, 6);
    expect(values[1]).toBeCloseTo(table.lengthMm, 6);
    const whole = setDrawing(document, view, style);
    const level = ofLayer(whole.words, 'dimension').filter(({ anchor }) => anchor === 'middle');
    const overall = level.at(-1)!.valueMm!;
    expect(overall).toBeCloseTo(whole.setBoundsMm.width, 6);
    const benches = level.slice(0, -1).reduce((sum, { valueMm }) => sum + valueMm!, 0);
    expect(benches).toBeLessThanOrEqual(overall);
  });

  it('writes the heights of table and sill beside an elevation', () => {
    const document = built('facing-benches');
    const { words } = setDrawing(document, { ...view, direction: 'front' }, style);
    const heights = ofLayer(words, 'dimension').map(({ valueMm }) => valueMm);
    for (const piece of document.pieces) {
      if (piece.kind !== 'table' && piece.kind !== 'sill' && piece.kind !== 'bulkhead') continue;
      expect(heights.some((mm) => Math.abs((mm ?? 0) - piece.heightMm) < 0.5)).toBe(true);
    }
  });

  it('marks every piece it shows and none that the section took away', () => {
    const document = built('banquette');
    const marks = (sectionMm?: number) =>
      ofLayer(setDrawing(document, { ...view, direction: 'front', sectionMm }, style).words, 'mark')
        .map(({ text }) => text)
        .sort();
    expect(marks()).toEqual(['B1', 'L1', 'L2', 'L3', 'L4', 'T1', 'T2']);
    expect(marks(300)).toEqual(['B1']);
  });

  it('shows a beam dashed over a plan that is cut under it', () => {
    const document = built('bench-window');
    const wall = document.pieces.find(({ kind }) => kind === 'bulkhead')!;
    const beam = {
      ...structuredClone(wall),
      id: 'o1',
      mark: 'O1',
      kind: 'overhead' as const,
      lengthMm: 1000,
      depthMm: 100,
      undersideMm: 2000,
      thicknessMm: 120,
    };
    const withBeam = { ...document, pieces: [...document.pieces, beam] };
    const above = (sectionMm?: number) =>
      setDrawing(withBeam, { ...view, sectionMm }, style).lines.filter(({ layer }) => layer === 'above');
    expect(above(1500)).toHaveLength(4);
    expect(above()).toHaveLength(0);
  });

  it('of an empty set holds its title and the bar alone', () => {
    const { words, lines } = setDrawing(built('empty'), view, style);
    expect(new Set(words.map(({ layer }) => layer))).toEqual(new Set(['title']));
    expect(new Set(lines.map(({ layer }) => layer))).toEqual(new Set(['title']));
  });
});

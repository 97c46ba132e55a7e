import { describe, expect, it } from '@jest/globals';
import {
  ARRANGEMENTS,
  type CushionSpec,
  deriveCushions,
  orderModel,
  plainCover,
  type SetDocument,
} from '@settlewright/geometry';
import { markedSections } from './marked-sections';
import { bagLabels, specCushions } from './spec-cushions';

function arrangement(id: string): SetDocument {
  const found = ARRANGEMENTS.find((one) => one.id === id);
  if (!found) throw new Error(`no arrangement ${id}`);
  const document = found.build();
  for (const piece of document.pieces) {
    if (piece.kind === 'bench') {
      piece.upholstery.buttons = { rows: 2, everyBoards: 3, alignTo: 'joints', on: 'both' };
    }
  }
  return document;
}

const sheetsOf = (cushions: readonly CushionSpec[]) => specCushions(orderModel({ cushions, covers: [] }));

const seatOf = (specs: readonly CushionSpec[], hand: 'left' | 'right') => {
  const found = specs.find((spec) => spec.kind === 'seat' && spec.hand === hand);
  if (!found) throw new Error(`no ${hand}-hand seat`);
  return found;
};

describe('cushions on the sheets', () => {
  const document = arrangement('facing-benches');
  const specs = deriveCushions(document);

  it("have the sitter's left at the right of the page", () => {
    for (const [hand, side] of [
      ['left', 'right'],
      ['right', 'left'],
    ] as const) {
      const spec = seatOf(specs, hand);
      expect(spec.edges[hand]).toBe('wall');
      const shown = sheetsOf([spec])[0]!;
      expect(shown.hand).toBe(hand);
      expect(shown.buttons.datum).toMatchObject({ side, drawn: true, name: 'wall W1' });
      expect(shown.edges[side]).toBe(`wall, sitter’s ${hand}`);
    }
  });

  it('measure buttons from their own seam and from the wall, apart by the gap', () => {
    const shown = sheetsOf([seatOf(specs, 'left')])[0]!;
    const { columnsMm, datum } = shown.buttons;
    expect(columnsMm.length).toBeGreaterThan(1);
    columnsMm.forEach((column, i) => expect(datum.columnsMm[i]! - column).toBeCloseTo(datum.toSeamMm, 6));
  });

  it('stand together only when one drawing serves both, and name their mirror image', () => {
    const left = seatOf(specs, 'left');
    const twin: CushionSpec = { ...left, mark: 'C91', key: 'twin', benchId: 'b91', benchMark: 'B91' };
    const other: CushionSpec = { ...twin, mark: 'C92', edges: { ...twin.edges, right: 'neighbour' } };
    const shown = sheetsOf([left, twin, other, seatOf(specs, 'right')]);
    expect(shown.map(({ marks }) => marks)).toEqual([
      [left.mark, 'C91'],
      ['C92'],
      [seatOf(specs, 'right').mark],
    ]);
    expect(shown[0]!.benches).toEqual([left.benchMark, 'B91']);
    expect(shown[0]!.mirrorMarks).toEqual([seatOf(specs, 'right').mark]);
  });

  it('tell a label when only one way round is right', () => {
    const free = seatOf(specs, 'left');
    const loose: CushionSpec = {
      ...free,
      hand: 'either',
      buttons: { ...free.buttons, columns: [], count: 0 },
    };
    const cut: CushionSpec = { ...loose, outline: [...loose.outline] };
    cut.outline[0] = { ...cut.outline[0]!, at: [80, 0] };
    expect(bagLabels([free, loose, cut]).map(({ hand }) => hand)).toEqual([
      'LH, left hand as sat in',
      'fits either hand',
      'one way round, as drawn',
    ]);
    expect(sheetsOf([cut])[0]!.hand).toBe('one-way');
  });

  it('run their pile to the bottom edge of a back and the front edge of a seat', () => {
    const cover = { ...plainCover('plum'), direction: 'up-roll' as const, nap: 'to-the-front' as const };
    const shown = specCushions(orderModel({ cushions: specs, covers: [cover] }));
    const words = (kind: 'seat' | 'back') => shown.find((one) => one.kind === kind)!.cloth!.words;
    expect(words('seat')).toBe('cloth up the roll, nap runs to the front edge');
    expect(words('back')).toBe('cloth up the roll, nap runs to the bottom edge');
  });

  it('are marked in the section, the seat below the back, without sizes', () => {
    const [section] = markedSections(document, specs);
    const words = section!.drawing.shapes.flatMap((shape) => (shape.kind === 'text' ? [shape] : []));
    const seat = words.find(({ text }) => text === specs[0]!.mark)!;
    const back = words.find(({ text }) => text === specs.find(({ kind }) => kind === 'back')!.mark)!;
    expect(seat.at[1]).toBeGreaterThan(back.at[1]);
    expect(section!.drawing.shapes.some(({ kind }) => kind === 'dimension')).toBe(false);
    expect(markedSections(document, [])).toEqual([]);
  });
});

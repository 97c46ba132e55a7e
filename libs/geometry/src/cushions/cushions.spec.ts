import { describe, expect, it } from 'vitest';
import { outlineExtent } from '../outlines/outline.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { boardLines } from './board-lines.ts';
import { buttonColumns, buttonRows, diamondField } from './button-grid.ts';
import { biasStripLength, weltStrips, zipPanel } from './cushion-sizes.ts';
import { deriveCushions } from './derive-cushions.ts';
import { foamOfCushion } from './foam-of-cushion.ts';
import { groupCushions } from './group-cushions.ts';
import { makeCushion } from './making/make-cushion.ts';
import { PLAIN_MAKE } from './making/cushion-make.ts';
import { divideRun } from './run-joints.ts';

const inch = (value: number): number => value * 25.4;
const LB_FT3 = 16.018463;

const built = (id: string): SetDocument => ARRANGEMENTS.find((a) => a.id === id)!.build();

/** The arrangement with its benches changed. */
function withBenches(id: string, change: (bench: PieceOf<'bench'>) => void): SetDocument {
  const document = structuredClone(built(id));
  for (const piece of document.pieces) if (piece.kind === 'bench') change(piece);
  return document;
}

describe('a boxed cushion 72 x 20 x 4 in', () => {
  const cushion = makeCushion({
    finishedMm: { widthMm: inch(72), depthMm: inch(20), thicknessMm: inch(4) },
    make: PLAIN_MAKE,
  });
  const making = cushion.ok ? cushion.made : undefined;

  // Worked by hand from the trade's rules: 72 1/2 x 20 1/2 x 4 in of foam at 2.8 lb/ft3.
  it('takes so much foam', () => {
    const foam = foamOfCushion({
      ...(making && { making }),
      foam: { grade: 'seat', densityKgM3: 2.8 * LB_FT3, ifd25N: 180, supportFactor: 2 },
    });
    expect(foam!.volumeM3 / 0.0283168466).toBeCloseTo(3.44, 2);
    expect(foam!.massKg / 0.45359237).toBeCloseTo(9.6, 1);
  });

  it('takes eight straight welt strips, 12 in of cloth, with join loss and seven without', () => {
    const strip = { clothWidthMm: inch(54), stripWidthMm: inch(1.5) };
    expect(making!.welt.lengthMm).toBeCloseTo(inch(374), 6);
    const withLoss = weltStrips(making!.welt.lengthMm, { ...strip, joinLoss: 'strip-width' });
    expect(withLoss.strips).toBe(8);
    expect(withLoss.clothMm).toBeCloseTo(inch(12), 6);
    expect(weltStrips(making!.welt.lengthMm, { ...strip, joinLoss: 'none' }).strips).toBe(7);
  });
});

describe('published sums of the trade', () => {
  // upholsteryresource.com node 56: 20 in back, boxing 4 1/4, two halves 2 7/8 by back + 12.
  it('cuts the halves of a zip panel 2 7/8 x 32 in', () => {
    const wrapWithoutSeams = inch(12 - 1);
    const panel = zipPanel(inch(20) + wrapWithoutSeams, inch(4.25));
    expect(panel.halfWidthMm).toBeCloseTo(inch(2.875), 6);
    expect(panel.lengthMm).toBeCloseTo(inch(32), 6);
    expect(panel.count).toBe(2);
  });

  // forum.upholster.com topic 10184: 950 in of 1 1/2 strip from 54 in cloth is 18 strips, 27 in.
  it('takes 27 in of cloth for 950 in of welt', () => {
    const strip = { clothWidthMm: inch(54), stripWidthMm: inch(1.5) };
    expect(weltStrips(inch(950), { ...strip, joinLoss: 'none' })).toEqual({ strips: 18, clothMm: inch(27) });
    expect(weltStrips(inch(950), { ...strip, joinLoss: 'strip-width' }).strips).toBe(19);
  });

  // M. Lewis: a 36 in square gives 648 in of 2 in bias; sewaquilt: 12 in square, 2 in: 72 in.
  it('measures bias strip by area', () => {
    expect(biasStripLength(inch(36), inch(2))).toBeCloseTo(inch(648), 6);
    expect(biasStripLength(inch(12), inch(2))).toBeCloseTo(inch(72), 6);
    expect(biasStripLength(Math.sqrt(350) * 25.4, inch(3.5))).toBeCloseTo(inch(100), 6);
  });

  // upholsterystudio tufting page: 30 x 16 with 3 x 5 diamonds.
  it('lays 8 x 2 diamonds into 30 x 16 with 3 in all round', () => {
    const field = diamondField(
      { widthMm: inch(30), heightMm: inch(16) },
      { widthMm: inch(3), heightMm: inch(5) },
      inch(2),
    );
    expect([field.across, field.high]).toEqual([8, 2]);
    expect(field.gridXMm).toBeCloseTo(inch(1.5), 6);
    expect(field.gridYMm).toBeCloseTo(inch(2.5), 6);
    expect(field.marginXMm).toBeCloseTo(inch(3), 6);
    expect(field.marginYMm).toBeCloseTo(inch(3), 6);
  });
});

describe('buttons on board lines', () => {
  // 42 3/4 in cushion, seam 5/8 from the wall, boards on 3 1/4 from the wall: 5 7/8, 15 5/8, 25 3/8, 35 1/8.
  it('stand on every third joint with the most even margins', () => {
    const lines = Array.from({ length: 13 }, (_, k) => inch(3.25) * (k + 1));
    const left = inch(0.625);
    const columns = buttonColumns(left, left + inch(42.75), { linesMm: lines, every: 3, edgeMm: inch(4) });
    expect(columns.map((x) => (x - left) / 25.4)).toEqual(
      [5.875, 15.625, 25.375, 35.125].map((v) => expect.closeTo(v, 6)),
    );
    expect(columns.map((x) => x / 25.4)).toEqual([6.5, 16.25, 26, 35.75].map((v) => expect.closeTo(v, 6)));
  });

  it('share the depth evenly and keep 4 in from the edge', () => {
    expect(buttonRows(inch(17.25), 2, inch(4))).toEqual(
      [inch(5.75), inch(11.5)].map((v) => expect.closeTo(v, 6)),
    );
    const tight = buttonRows(inch(12), 3, inch(4));
    expect(tight[0]).toBeCloseTo(inch(4), 6);
    expect(tight[2]).toBeCloseTo(inch(8), 6);
    expect(buttonRows(inch(7), 1, inch(4))).toEqual([]);
  });

  it('lie on joints of the bench, measured from the wall over the whole run', () => {
    const document = withBenches('facing-benches', (bench) => (bench.upholstery.buttons.on = 'both'));
    for (const spec of deriveCushions(document)) {
      const bench = document.pieces.find((p) => p.id === spec.benchId) as PieceOf<'bench'>;
      expect(spec.buttons.columns.length).toBeGreaterThan(1);
      for (const column of spec.buttons.columns) {
        expect(column.offJointMm).toBeCloseTo(0, 6);
        expect(column.fromDatumMm - column.fromSeamMm).toBeCloseTo(spec.datum.toSeamMm, 6);
        expect(column.fromSeamMm).toBeGreaterThanOrEqual(inch(4));
        expect(spec.finishedMm.widthMm - column.fromSeamMm).toBeGreaterThanOrEqual(inch(4));
      }
      const pitch = spec.buttons.columns[1]!.fromSeamMm - spec.buttons.columns[0]!.fromSeamMm;
      expect(pitch).toBeCloseTo(bench.upholstery.buttons.everyBoards * boardLines(bench).moduleMm, 6);
    }
  });

  it('on board centres are half a module off the joints', () => {
    const document = withBenches('bench-window', (bench) => {
      bench.upholstery.buttons = { rows: 1, everyBoards: 2, alignTo: 'board-centres', on: 'back' };
    });
    const back = deriveCushions(document).find(({ kind }) => kind === 'back')!;
    for (const { offJointMm } of back.buttons.columns) {
      expect(Math.abs(offJointMm)).toBeCloseTo((79.375 + 3.175) / 2, 6);
    }
  });
});

describe('dividing a run', () => {
  it('keeps every stretch within the limit and covers the run', () => {
    for (const length of [900, 1219.2, 1300, 2500, 4100]) {
      const ends = divideRun(
        0,
        length,
        1219.2,
        Array.from({ length: 60 }, (_, k) => 37 + 82.55 * k),
      );
      expect(ends[0]).toBe(0);
      expect(ends.at(-1)).toBe(length);
      expect(ends.length - 1).toBe(Math.ceil(length / 1219.2 - 1e-9));
      ends.slice(1).forEach((end, i) => expect(end - ends[i]!).toBeLessThanOrEqual(1219.2 + 1e-6));
    }
  });

  it('divides on a board joint when one is near', () => {
    const joints = [400, 800, 1180, 1600];
    expect(divideRun(0, 2400, 1250, joints)).toEqual([0, 1180, 2400]);
    expect(divideRun(0, 2400, 1200, joints)).toEqual([0, 1200, 2400]);
  });
});

describe('the cushions of a set', () => {
  it('are marked seats first, in the order of the pieces', () => {
    const specs = deriveCushions(built('facing-benches'));
    expect(specs.map(({ mark, kind, benchMark }) => `${mark} ${kind} ${benchMark}`)).toEqual([
      'C1 seat B1',
      'C2 seat B2',
      'C3 back B1',
      'C4 back B2',
    ]);
  });

  it('lose an eighth at each end and a quarter at the back of the seat', () => {
    const [seat] = deriveCushions(built('bench-window'));
    expect(seat!.placeMm.widthMm - seat!.finishedMm.widthMm).toBeCloseTo(inch(0.25), 6);
    expect(seat!.placeMm.depthMm - seat!.finishedMm.depthMm).toBeCloseTo(inch(0.25), 6);
    expect(seat!.finishedMm.thicknessMm).toBeCloseTo(inch(3.75), 6);
    expect(seat!.edges.back).toBe('back-pad');
  });

  it('know their hand: benches that face each other along one wall mirror each other', () => {
    const specs = deriveCushions(built('facing-benches'));
    expect(specs.map(({ hand }) => hand)).toEqual(['left', 'right', 'left', 'right']);
    const groups = groupCushions(specs);
    expect(groups.map(({ marks, mirroredMarks }) => [marks, mirroredMarks])).toEqual([
      [['C1'], ['C2']],
      [['C2'], ['C1']],
      [['C3'], ['C4']],
      [['C4'], ['C3']],
    ]);
    expect(specs[0]!.edges.left).toBe('wall');
    expect(specs[0]!.datum).toMatchObject({ side: 'left', meets: 'wall' });
    expect(specs[0]!.datum.toSeamMm).toBeGreaterThan(0);
  });

  it('are alike when they differ in the last digit only, at whatever fraction of an inch', () => {
    const [first, second] = deriveCushions(built('facing-benches'));
    for (const sixteenths of [1, 2, 3, 52, 53]) {
      const line = inch(sixteenths / 16);
      const a = { ...first!, mark: 'C1', boardLinesMm: [line - 1e-9] };
      const b = { ...first!, mark: 'C3', boardLinesMm: [line + 1e-9] };
      expect(groupCushions([a, b]).map(({ marks }) => marks)).toEqual([['C1', 'C3']]);
    }
    const nearer = {
      ...first!,
      mark: 'C3',
      datum: { ...first!.datum, toSeamMm: first!.datum.toSeamMm + inch(1 / 8) },
    };
    expect(groupCushions([first!, nearer, second!])).toHaveLength(3);
  });

  it('of like benches are made alike', () => {
    const groups = groupCushions(deriveCushions(built('banquette')));
    expect(groups.find(({ spec }) => spec.benchMark.startsWith('L'))?.marks).toHaveLength(4);
  });

  it('keep the invariant of boxing, zip and perimeter everywhere', () => {
    for (const { id } of ARRANGEMENTS) {
      for (const spec of deriveCushions(built(id))) {
        const { panels, closure, perimeterMm } = spec.making!;
        const boxing = panels.find(({ name }) => name === 'boxing')!;
        expect(outlineExtent(boxing.finished).widthMm + closure.lengthMm).toBeCloseTo(perimeterMm, 6);
        expect(spec.finishedMm.widthMm).toBeLessThanOrEqual(spec.placeMm.widthMm);
      }
    }
  });

  it('leave out a cushion without thickness', () => {
    const document = withBenches('bench-window', (bench) => (bench.backCushion.thicknessMm = 0));
    expect(deriveCushions(document).map(({ kind }) => kind)).toEqual(['seat']);
  });
});

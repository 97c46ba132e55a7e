import { seatSinkMm } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import { foamSituation } from '../pieces/foam-situation.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { setDocumentSchema } from '../room/document.ts';
import { CUSHION_SETTINGS } from './cushion-settings.ts';
import { foamGradeSchema, foamOfGrade, type FoamGrade } from './foam-grades.ts';

const LBF_N = 4.4482216152605;
const POUND_KG = 0.45359237;
const grade = (change: Partial<FoamGrade>): FoamGrade => ({
  ...{ name: 'two firm', use: 'seat', densityKgM3: 40, ifd25N: 36 * LBF_N, supportFactor: 2 },
  ...{ thicknessMm: 101.6, layers: [], wrapMm: 0 },
  ...change,
});
const layer = (thicknessMm: number, pounds: number) => ({
  ...{ name: 'layer', densityKgM3: 40, thicknessMm, ifd25N: pounds * LBF_N },
});
const dropIn = (one: FoamGrade, pounds: number, thicknessMm = one.thicknessMm) => {
  const foam = foamOfGrade(one, CUSHION_SETTINGS.wrapLost.valueMm);
  return seatSinkMm(foamSituation({ thicknessMm, foam })!, pounds * POUND_KG).sinkMm / 25.4;
};

// Drops in inches by the trade's vectors, section 2.3: 200 lb on 4 in of IFD 36 go down 1.61, of IFD 30 go down 2.05.
describe('a foam as a piece has it', () => {
  it('is as plain as its grade', () => {
    expect(foamOfGrade(grade({}), 12.7)).not.toHaveProperty('layers');
    expect(foamOfGrade(grade({ layers: [layer(100, 36)] }), 12.7)).not.toHaveProperty('layers');
    expect(dropIn(grade({}), 200)).toBeCloseTo(1.61, 2);
  });

  it('adds up its layers, in proportion where the cushion is thicker than the grade', () => {
    const laminated = grade({ layers: [layer(25.4, 30), layer(76.2, 36)] });
    const four = 0.25 * 2.05 + 0.75 * 1.61;
    expect(dropIn(laminated, 200)).toBeCloseTo(four, 2);
    expect(dropIn(laminated, 200, 127)).toBeCloseTo(1.25 * four, 2);
  });

  it('is taken by a set document, the thinnest layer among the thickest as well', () => {
    const thin = grade({ layers: [layer(3, 20), layer(250, 36), layer(250, 36), layer(250, 36)] });
    expect(foamGradeSchema.safeParse(thin).success).toBe(true);
    const document = ARRANGEMENTS[0]!.build();
    const pieces = document.pieces.map((piece) =>
      piece.kind === 'bench'
        ? { ...piece, seatCushion: { ...piece.seatCushion, foam: foamOfGrade(thin, 12.7) } }
        : piece,
    );
    expect(setDocumentSchema.safeParse({ ...document, pieces }).error).toBeUndefined();
  });

  it('is firmer in every layer where the whole is made firmer', () => {
    const foam = foamOfGrade(grade({ layers: [layer(50.8, 30), layer(50.8, 36)] }), 12.7);
    const at = (times: number) =>
      foamSituation({ thicknessMm: 101.6, foam: { ...foam, ifd25N: times * foam.ifd25N } })!.layers!;
    expect(at(1).map(({ ifd25N }) => ifd25N / LBF_N)).toEqual([expect.closeTo(30, 9), expect.closeTo(36, 9)]);
    expect(at(1.5).map(({ ifd25N }) => ifd25N / LBF_N)).toEqual([
      expect.closeTo(45, 9),
      expect.closeTo(54, 9),
    ]);
  });

  it('loses half of its wrap, and what the foam in its full thickness does', () => {
    expect(dropIn(grade({ wrapMm: 25.4 }), 200)).toBeCloseTo(1.61 + 0.5, 2);
    expect(foamOfGrade(grade({ wrapMm: 20 }), 6.35).wrap).toEqual({ thicknessMm: 20, lostMm: 5 });
  });
});

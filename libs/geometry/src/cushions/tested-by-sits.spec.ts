import { seatSinkMm, SINK_ERROR } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import { foamSituation } from '../pieces/foam-situation.ts';
import { referenceSinkMm } from '../pieces/seat-sink.ts';
import { setParameter } from '../pieces/parameters.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { Foam, SetDocument } from '../room/document.ts';
import { measureSet } from '../situation/measure-set.ts';
import { readSetDocument } from '../room/read-document.ts';
import { sitsOn, testedBySits, withTested, type KeptSit } from './tested-by-sits.ts';

const POUND_KG = 0.45359237;
const LBF_N = 4.4482216152605;
/** Vectors of the trade's estimator, section 2.3: 4 in of IFD 36, support factor 2; pounds and inches. */
const VECTORS = [
  [170, 1.28],
  [140, 0.97],
  [110, 0.76],
  [200, 1.61],
] as const;
const FOAM: Foam = { grade: 'seat', densityKgM3: 40, ifd25N: 36 * LBF_N, supportFactor: 2 };
const CUSHION = { thicknessMm: 101.6, foam: FOAM };
/** As the vectors say, times a factor. */
const sits = (times: number): KeptSit[] =>
  VECTORS.map(([pounds, inches], n) => ({
    ...{
      satOn: `2026-11-0${n + 1}`,
      grade: 'seat',
      thicknessMm: 101.6,
      ifd25N: 36 * LBF_N,
      supportFactor: 2,
    },
    ...{ weightKg: pounds * POUND_KG, measuredMm: inches * 25.4 * times },
  }));

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const withCushion = (foam: Foam, thicknessMm = 101.6): SetDocument => ({
  ...bay,
  pieces: bay.pieces.map((piece) =>
    piece.kind === 'bench' ? { ...piece, seatCushion: { foam, thicknessMm } } : piece,
  ),
});
const benchOf = (document: SetDocument) => {
  const bench = document.pieces.find((piece) => piece.kind === 'bench');
  if (bench?.kind !== 'bench') throw new Error('no bench');
  return bench;
};

describe('what test sits say of a cushion', () => {
  it('is a factor near 1 where the estimate was right, and more sure than the estimate', () => {
    const tested = testedBySits(CUSHION, sits(1))!;
    expect(tested.factor).toBeCloseTo(1, 2);
    expect(tested.error).toBeLessThan(SINK_ERROR.share / 2);
    expect(tested).toMatchObject({ sits: 4, on: '2026-11-04', of: { thicknessMm: 101.6, supportFactor: 2 } });
  });

  it('leans towards what was measured, the more the more often it was', () => {
    const once = testedBySits(CUSHION, sits(1.3).slice(0, 1))!;
    const often = testedBySits(CUSHION, sits(1.3))!;
    expect(once.factor).toBeGreaterThan(1.2);
    expect(often.factor).toBeGreaterThan(once.factor);
    expect(often.factor).toBeLessThan(1.3);
  });

  it('counts no sit on another grade, firmness or thickness, and tells no weight', () => {
    const [first] = sits(1.3) as [KeptSit];
    const others = [
      { ...first, grade: 'another' },
      { ...first, thicknessMm: 127 },
      { ...first, ifd25N: 200 },
    ];
    expect(sitsOn(CUSHION, [...others, first])).toEqual([first]);
    expect(testedBySits(CUSHION, others)).toBeUndefined();
    expect(JSON.stringify(testedBySits(CUSHION, sits(1.3)))).not.toMatch(/weight|measured/i);
  });

  describe('in layers or with a wrap', () => {
    const layers = [
      { share: 0.25, times: 0.7 },
      { share: 0.75, times: 1.4 },
    ];
    const wrap = { thicknessMm: 12.7, lostMm: 6.35 };
    const laminated = { ...CUSHION, foam: { ...FOAM, layers, wrap } };
    const plain = foamSituation(laminated)!;
    /** Everybody went down 1.2 times as far as the layers and the wrap together say. */
    const own = sits(1).map((sit) => {
      const { sinkMm } = seatSinkMm(plain, sit.weightKg);
      return { ...sit, layers, wrap, measuredMm: 1.2 * sinkMm };
    });
    const tested = testedBySits(laminated, own)!;

    it('scales the drop of the whole', () => {
      expect(tested).toMatchObject({ sits: 4, of: { thicknessMm: 101.6, layers, wrap } });
      expect(tested.factor).toBeGreaterThan(1.15);
      expect(tested.factor).toBeLessThan(1.2);
      const situation = foamSituation({ ...laminated, foam: withTested(laminated.foam, tested) })!;
      expect(situation.tested).toMatchObject({ sits: 4 });
      expect(seatSinkMm(situation, 60).sinkMm).toBeCloseTo(tested.factor * seatSinkMm(plain, 60).sinkMm, 9);
      const document = withCushion(withTested(laminated.foam, tested));
      const read = readSetDocument(JSON.parse(JSON.stringify(document)));
      expect(read.ok && read.value).toEqual(document);
    });

    it.each<[string, Foam]>([
      ['without the wrap', { ...FOAM, layers }],
      ['in a thicker wrap', { ...FOAM, layers, wrap: { thicknessMm: 25.4, lostMm: 12.7 } }],
      ['in one piece', { ...FOAM, wrap }],
      ['with the layers the other way up', { ...FOAM, wrap, layers: layers.toReversed() }],
      [
        'with a thicker top',
        {
          ...FOAM,
          wrap,
          layers: [
            { share: 0.5, times: 0.7 },
            { share: 0.5, times: 1.4 },
          ],
        },
      ],
    ])('says nothing of another build-up: %s', (_, foam) => {
      expect(testedBySits({ ...CUSHION, foam }, own)).toBeUndefined();
      expect(foamSituation({ ...CUSHION, foam: withTested(foam, tested) })).not.toHaveProperty('tested');
    });

    it('is of no use to a plain foam, nor a plain foam’s sit to it', () => {
      expect(testedBySits(CUSHION, own)).toBeUndefined();
      expect(testedBySits(laminated, sits(1.3))).toBeUndefined();
    });

    it('is found anew where the wrap is held to lose another part', () => {
      const other = { ...FOAM, layers, wrap: { ...wrap, lostMm: 3 } };
      expect(foamSituation({ ...CUSHION, foam: withTested(other, tested) })).not.toHaveProperty('tested');
      expect(testedBySits({ ...CUSHION, foam: other }, own)!.factor).toBeGreaterThan(tested.factor);
    });
  });

  it('moves the seat, and is read back with the set', () => {
    const tested = testedBySits(CUSHION, sits(1.3));
    const document = withCushion(withTested(FOAM, tested));
    const read = readSetDocument(JSON.parse(JSON.stringify(document)));
    expect(read.ok && read.value).toEqual(document);
    expect(referenceSinkMm(benchOf(document))).toBeCloseTo(
      tested!.factor * referenceSinkMm(benchOf(withCushion(FOAM))),
      6,
    );
    expect(measureSet(document).places[0]?.foam?.tested).toMatchObject({ sits: 4 });
  });

  it('does not count once firmness or thickness are others', () => {
    const tested = testedBySits(CUSHION, sits(1.3));
    const document = withCushion(withTested(FOAM, tested));
    const thicker = setParameter(document, benchOf(document).id, 'seatCushion.thicknessMm', 120);
    expect(thicker.ok && measureSet(thicker.value).places[0]?.foam).not.toHaveProperty('tested');
    const firmer = withCushion(withTested({ ...FOAM, ifd25N: 250 }, tested));
    expect(measureSet(firmer).places[0]?.foam).not.toHaveProperty('tested');
    expect(withTested(withTested(FOAM, tested), undefined)).toEqual(FOAM);
  });
});

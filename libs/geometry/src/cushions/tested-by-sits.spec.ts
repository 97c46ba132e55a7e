import { SINK_ERROR } from '@settlewright/anthropometry';
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

  it('says nothing of a foam in layers or with a wrap', () => {
    const wrapped = { ...CUSHION, foam: { ...FOAM, wrap: { thicknessMm: 25, lostMm: 12.5 } } };
    expect(testedBySits(wrapped, sits(1.3))).toBeUndefined();
    const tested = testedBySits(CUSHION, sits(1.3));
    expect(foamSituation({ ...wrapped, foam: withTested(wrapped.foam, tested) })).not.toHaveProperty(
      'tested',
    );
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

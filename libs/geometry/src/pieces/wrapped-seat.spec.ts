import { describe, expect, it } from 'vitest';
import { deriveCushions } from '../cushions/derive-cushions.ts';
import { orderModel } from '../orders/order-model.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { Foam, PieceOf, SetDocument } from '../room/document.ts';
import { measureSet } from '../situation/measure-set.ts';
import { cushionHeightMm } from './foam-situation.ts';
import { setParameter } from './parameters.ts';
import { pressedSeatHeightMm, referenceSinkMm, unpressedSeatTopMm } from './seat-sink.ts';

const T = 101.6;
const WRAP = { thicknessMm: 25.4, lostMm: 12.7 };
const PLAIN: Foam = { grade: 'seat', densityKgM3: 42, ifd25N: 160, supportFactor: 2 };
const WRAPPED: Foam = { ...PLAIN, wrap: WRAP };

function onFoam(foam: Foam): { document: SetDocument; bench: PieceOf<'bench'> } {
  const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
  const benches = document.pieces.filter((piece) => piece.kind === 'bench');
  for (const bench of benches) bench.seatCushion = { foam, thicknessMm: T };
  return { document, bench: benches[0]! };
}

describe('a seat whose foam is wrapped', () => {
  const [plain, wrapped] = [onFoam(PLAIN), onFoam(WRAPPED)];

  it('stands higher by the wrap, and by what it does not lose under a sitter', () => {
    expect(cushionHeightMm(wrapped.bench.seatCushion)).toBeCloseTo(T + WRAP.thicknessMm, 9);
    expect(unpressedSeatTopMm(wrapped.bench) - unpressedSeatTopMm(plain.bench)).toBeCloseTo(25.4, 9);
    expect(referenceSinkMm(wrapped.bench) - referenceSinkMm(plain.bench)).toBeCloseTo(12.7, 9);
    expect(pressedSeatHeightMm(wrapped.bench) - pressedSeatHeightMm(plain.bench)).toBeCloseTo(12.7, 9);
    const [seat] = measureSet(wrapped.document).places;
    const [was] = measureSet(plain.document).places;
    expect(seat!.seatTopFrontMm - was!.seatTopFrontMm).toBeCloseTo(25.4, 9);
    expect(seat!.foam!.thicknessMm).toBeCloseTo(T + 25.4, 9);
  });

  it('has the foam of its order, cut as thick as the boxing is high', () => {
    const { schedule } = orderModel({ cushions: deriveCushions(wrapped.document), covers: [] });
    const seat = schedule.find(({ spec }) => spec.kind === 'seat')!;
    const situation = measureSet(wrapped.document).places.find(
      ({ pieceId }) => pieceId === seat.spec.benchId,
    )!.foam!;
    expect(seat.spec.finishedMm.thicknessMm).toBe(T);
    expect(seat.sawnMm!.thicknessMm).toBe(T);
    expect(situation.thicknessMm * (1 - situation.wrap!.share)).toBeCloseTo(seat.sawnMm!.thicknessMm, 9);
  });

  it('keeps its pressed height when its thickness or its height is set', () => {
    const { document, bench } = wrapped;
    const thicker = setParameter(document, bench.id, 'seatCushion.thicknessMm', 127);
    const higher = setParameter(document, bench.id, 'pressedSeatHeight', 480);
    const pressed = ({ pieces }: SetDocument) =>
      pressedSeatHeightMm(pieces.find(({ id }) => id === bench.id) as PieceOf<'bench'>);
    expect(thicker.ok && pressed(thicker.value)).toBeCloseTo(pressedSeatHeightMm(bench), 9);
    expect(higher.ok && pressed(higher.value)).toBeCloseTo(480, 9);
  });
});

describe('a hard seat', () => {
  it('has no height of a cushion, whatever its foam is wrapped in', () => {
    expect(cushionHeightMm({ thicknessMm: 0, foam: WRAPPED })).toBe(0);
  });
});

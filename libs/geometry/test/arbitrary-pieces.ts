import fc from 'fast-check';
import type { Piece, PieceOf } from '../src/room/document.ts';
import { newPiece } from '../src/room/edit-pieces.ts';

const mm = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

const at = fc.record({ xMm: mm(-8000, 8000), zMm: mm(-8000, 8000), turnDeg: mm(-180, 180) });

type SeatCushion = PieceOf<'bench'>['seatCushion'];

const end = fc.record({
  kind: fc.constantFrom('open', 'arm', 'wall'),
  thicknessMm: mm(0, 80),
  heightMm: mm(0, 900),
});

/** Of a cushion of no thickness it changes nothing. */
const anyWrap = fc.option(
  mm(2, 60).map((thicknessMm) => ({ thicknessMm, lostMm: thicknessMm / 2 })),
  { nil: undefined },
);

const wrapped = (
  cushion: SeatCushion,
  thicknessMm: number,
  wrap: SeatCushion['foam']['wrap'],
): SeatCushion => ({
  thicknessMm,
  foam: { ...cushion.foam, ...(wrap && { wrap }) },
});

/** Benches over nearly the whole range of every parameter. */
export const anyBench: fc.Arbitrary<PieceOf<'bench'>> = fc
  .record({
    at,
    lengthMm: mm(600, 6000),
    deckHeightMm: mm(250, 700),
    seatDepthMm: mm(250, 800),
    seatTiltDeg: mm(-5, 12),
    backHeightMm: fc.oneof(fc.constant(0), mm(150, 1500)),
    backLeanDeg: mm(0, 30),
    backThicknessMm: mm(10, 200),
    seatPad: fc.oneof(fc.constant(0), mm(10, 200)),
    backPad: fc.oneof(fc.constant(0), mm(10, 150)),
    base: fc.constantFrom('box', 'open'),
    kick: fc.record({ depthMm: mm(0, 300), heightMm: mm(0, 300) }),
    lipMm: mm(0, 150),
    ends: fc.record({ left: end, right: end }),
    boards: fc.record({ faceMm: mm(60, 300), revealMm: mm(0, 12) }),
    seatWrap: anyWrap,
    backWrap: anyWrap,
    longestCushionMm: mm(400, 3000),
    lumbar: fc.option(fc.record({ apexMm: mm(0, 400), recessMm: mm(0, 150) }), { nil: undefined }),
  })
  .map(({ seatPad, backPad, seatWrap, backWrap, longestCushionMm, at: where, ...sizes }) => {
    const start = newPiece('bench', 'b1', 'B1', where);
    return {
      ...start,
      ...sizes,
      ends: sizes.ends,
      base: sizes.base,
      seatCushion: wrapped(start.seatCushion, seatPad, seatWrap),
      backCushion: wrapped(start.backCushion, backPad, backWrap),
      upholstery: { ...start.upholstery, longestCushionMm },
    };
  });

const tableBase: fc.Arbitrary<PieceOf<'table'>['base']> = fc.oneof(
  fc.record({ kind: fc.constant('legs' as const), sizeMm: mm(20, 150), insetMm: mm(0, 150) }),
  fc.record({ kind: fc.constant('trestles' as const), insetMm: mm(0, 200), thicknessMm: mm(20, 120) }),
  fc.record({
    kind: fc.constant('columns' as const),
    count: fc.constantFrom(1 as const, 2 as const),
    diameterMm: mm(40, 200),
    footLengthMm: mm(100, 1500),
    footHeightMm: mm(10, 200),
  }),
);

/** None, or leaves at ends or sides, up or hanging clear of the floor. */
function leavesUnder(heightMm: number): fc.Arbitrary<Pick<PieceOf<'table'>, 'leaves'>> {
  const leaf = fc.record({ widthMm: mm(50, Math.min(900, heightMm - 50)), down: fc.boolean() });
  const pair = <K extends string>(one: K, other: K) =>
    fc
      .tuple(fc.option(leaf), fc.option(leaf))
      .map(([a, b]) => ({ leaves: { ...(a && { [one]: a }), ...(b && { [other]: b }) } }));
  return fc.oneof(fc.constant({}), pair('left', 'right'), pair('front', 'back'));
}

/** Tables of every base. */
const anyTable: fc.Arbitrary<PieceOf<'table'>> = fc
  .record({
    at,
    lengthMm: mm(650, 4000),
    widthMm: mm(650, 2000),
    heightMm: mm(400, 1200),
    topThicknessMm: mm(6, 100),
    edgeLipMm: fc.oneof(fc.constant(0), mm(1, 100)),
    apron: fc.record({ heightMm: fc.oneof(fc.constant(0), mm(1, 200)), insetMm: mm(0, 150) }),
    base: tableBase,
  })
  .chain((sizes) => leavesUnder(sizes.heightMm).map((leaves) => ({ ...sizes, ...leaves })))
  .map(({ at: where, ...sizes }) => ({ ...newPiece('table', 't1', 'T1', where), ...sizes }));

const anySill: fc.Arbitrary<PieceOf<'sill'>> = fc
  .record({
    at,
    lengthMm: mm(100, 5000),
    heightMm: mm(200, 1500),
    depthMm: mm(10, 600),
    thicknessMm: mm(6, 150),
    opening: fc.record({ widthMm: mm(0, 3000), heightMm: mm(0, 2000), frameMm: mm(0, 200) }),
  })
  .map(({ at: where, ...sizes }) => ({ ...newPiece('sill', 's1', 'S1', where), ...sizes }));

const anyWall: fc.Arbitrary<PieceOf<'bulkhead'>> = fc
  .record({
    at,
    lengthMm: mm(300, 4000),
    heightMm: mm(300, 3000),
    thicknessMm: mm(6, 300),
    boards: fc.record({ faceMm: mm(60, 500), revealMm: mm(0, 30) }),
    boardDirection: fc.constantFrom('vertical' as const, 'horizontal' as const),
  })
  .map(({ at: where, ...sizes }) => ({ ...newPiece('bulkhead', 'w1', 'W1', where), ...sizes }));

const anySeat: fc.Arbitrary<PieceOf<'loose-seat'>> = fc
  .record({
    at,
    widthMm: mm(250, 900),
    seatDepthMm: mm(200, 800),
    deckHeightMm: mm(200, 900),
    pad: fc.oneof(fc.constant(0), mm(5, 150)),
    wrap: anyWrap,
    backHeightMm: fc.oneof(fc.constant(0), mm(100, 1000)),
    backLeanDeg: mm(0, 30),
    armHeightMm: fc.oneof(fc.constant(0), mm(50, 400)),
  })
  .map(({ at: where, pad, wrap, ...sizes }) => {
    const start = newPiece('loose-seat', 'l1', 'L1', where);
    return { ...start, ...sizes, seatCushion: wrapped(start.seatCushion, pad, wrap) };
  });

/** Any piece that is made of more than one part. */
export const anyPiece: fc.Arbitrary<Piece> = fc.oneof(anyBench, anyTable, anySill, anyWall, anySeat);

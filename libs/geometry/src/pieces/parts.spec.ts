import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyBench, anyPiece } from '../../test/arbitrary-pieces.ts';
import { cornersOf, overlapDepth } from '../../test/convex-overlap.ts';
import type { Part } from '../parts/part.ts';
import { toPiece } from '../parts/placement.ts';
import type { PieceOf } from '../room/document.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { newPiece } from '../room/edit-pieces.ts';
import { benchLayout } from './bench-layout.ts';
import { derivePieceParts, pieceEnvelope } from './kinds.ts';
import { pressedSeatHeightMm } from './seat-sink.ts';

/** Parts that touch may share this much by rounding. */
const TOLERANCE_MM = 0.01;
const HERE = { xMm: 0, zMm: 0, turnDeg: 0 };

function volumeMm3({ solid }: Part): number {
  if (solid.shape === 'box') return solid.sizeMm[0] * solid.sizeMm[1] * solid.sizeMm[2];
  if (solid.shape === 'cylinder') return Math.PI * solid.radiusMm ** 2 * solid.heightMm;
  const twice = solid.outlineMm.reduce((sum, [x, y], i) => {
    const [nx, ny] = solid.outlineMm[(i + 1) % solid.outlineMm.length] ?? [x, y];
    return sum + x * ny - nx * y;
  }, 0);
  return (twice / 2) * solid.depthMm;
}

describe('parts of a piece', () => {
  it('do not reach into each other', () => {
    fc.assert(
      fc.property(anyPiece, (piece) => {
        const parts = derivePieceParts(piece);
        parts.forEach((one, i) => {
          for (const other of parts.slice(i + 1)) {
            const depth = overlapDepth(one, other);
            if (depth > TOLERANCE_MM) throw new Error(`${one.id} and ${other.id} share ${depth} mm`);
          }
        });
      }),
      { numRuns: 100 },
    );
  }, 30_000);

  it('stay inside the envelope of the piece and above the floor', () => {
    fc.assert(
      fc.property(anyPiece, (piece) => {
        const { minMm, maxMm } = pieceEnvelope(piece);
        for (const part of derivePieceParts(piece)) {
          for (const corner of cornersOf(part)) {
            toPiece(piece.at, corner).forEach((value, axis) => {
              const [low, high] = [minMm[axis] ?? 0, maxMm[axis] ?? 0];
              if (value < low - TOLERANCE_MM || value > high + TOLERANCE_MM) {
                throw new Error(`${part.id} axis ${axis}: ${value} outside ${low}..${high}`);
              }
            });
          }
        }
      }),
      { numRuns: 200 },
    );
  }, 30_000);

  it('have a positive volume and ids that do not repeat', () => {
    fc.assert(
      fc.property(anyPiece, (piece) => {
        const parts = derivePieceParts(piece);
        expect(new Set(parts.map(({ id }) => id)).size).toBe(parts.length);
        for (const part of parts) expect(volumeMm3(part)).toBeGreaterThan(0);
      }),
    );
  });
});

describe('a bench', () => {
  it('keeps seat depth, pressed height and heel room where they are stated', () => {
    fc.assert(
      fc.property(anyBench, (bench) => {
        const layout = benchLayout(bench);
        expect(layout.frontZMm - layout.faceZMm).toBeCloseTo(bench.seatDepthMm, 6);
        const seats = derivePieceParts(bench).filter(({ role }) => role === 'seat-cushion');
        const tops = seats.flatMap(cornersOf).map((corner) => toPiece(bench.at, corner));
        if (tops.length === 0) return;
        // The upper front edge of the cushion is the front edge of the seat.
        const onTop = tops.filter(
          ([, y, z]) => Math.hypot(y - layout.seatTopFrontMm, z - layout.frontZMm) < 1e-6,
        );
        expect(onTop.length).toBe(2 * seats.length);
      }),
    );
  });

  it('ends a deep kick under a tilted deck where the deck is there, not at the riser', () => {
    const start = newPiece('bench', 'b1', 'B1', HERE);
    const bench: PieceOf<'bench'> = {
      ...start,
      seatTiltDeg: 5,
      kick: { depthMm: 200, heightMm: start.deckHeightMm },
    };
    const parts = derivePieceParts(bench);
    const [deck, kick] = (['deck', 'kick'] as const).map((role) => parts.find((part) => part.role === role));
    if (deck === undefined || kick === undefined) throw new Error('the bench has no box base');
    expect(Math.abs(overlapDepth(deck, kick))).toBeLessThanOrEqual(TOLERANCE_MM);
  });

  it('splits a long run near equal parts, on board joints, and fills it', () => {
    const bench: PieceOf<'bench'> = { ...newPiece('bench', 'b1', 'B1', HERE), lengthMm: 3000 };
    const cushions = derivePieceParts(bench).filter(({ role }) => role === 'seat-cushion');
    // 3000 − 2 × 12.7 = 2974.6 takes three below 1219.2. 37 boards stand centred, so the joint next to a
    // third of the run lies 6.5 modules of 82.55 from the middle: 1073.15 between, 950.725 at each end.
    expect(cushions.map(({ solid }) => (solid.shape === 'box' ? solid.sizeMm[0] : 0))).toEqual([
      expect.closeTo(950.725, 2),
      expect.closeTo(1073.15, 2),
      expect.closeTo(950.725, 2),
    ]);
  });

  it('sits where the demonstration bench sits: deck 15 in, cushion 3 3/4 in, pressed 18 in', () => {
    const start = newPiece('bench', 'b1', 'B1', HERE);
    const bench = { ...start, deckHeightMm: 15 * 25.4 };
    // By hand: 0.7 × 0.78 × 169.76 lb over 110 in² is 0.8426 psi; 50 lbf over 50 in² is 1 psi; 0.25 × 0.8426 × 3.75 in.
    expect(pressedSeatHeightMm(bench) / 25.4).toBeCloseTo(15 + 3.75 - 0.79, 2);
  });
});

describe('a curved back', () => {
  const flat = newPiece('bench', 'b1', 'B1', HERE);
  const padOf = (bench: PieceOf<'bench'>) =>
    derivePieceParts(bench).filter(({ role }) => role === 'back-cushion');
  /** How far the face of the pad stands behind the face of a flat back, at a height over the pressed seat. */
  const behindFace = (bench: PieceOf<'bench'>, overMm: number): number => {
    const [pad] = padOf(bench);
    if (pad?.solid.shape !== 'prism') throw new Error('the pad is flat');
    const height = benchLayout(bench).pressedTopMm + overMm;
    const outline = pad.solid.outlineMm;
    const crossings = outline.flatMap(([z, y], n) => {
      const [z2, y2] = outline[(n + 1) % outline.length] ?? [z, y];
      return y > height === y2 > height ? [] : [z + ((z2 - z) * (height - y)) / (y2 - y)];
    });
    const layout = benchLayout(bench);
    const face = layout.faceZMm - (height - layout.seatTopRearMm) * Math.tan(layout.leanRad);
    return face - Math.max(...crossings);
  };

  it('gives way for the pelvis and comes forward to the flat face at its apex', () => {
    const curved = { ...flat, lumbar: { apexMm: 220, recessMm: 25 } };
    expect(padOf(flat)[0]?.solid.shape).toBe('box');
    expect(behindFace(curved, 60)).toBeCloseTo(25, 3);
    expect(behindFace(curved, 100)).toBeCloseTo(25, 1);
    // Half way between where it gives way fully, 110 mm, and its apex; the curve is drawn in short straight lines.
    expect(behindFace(curved, 165)).toBeCloseTo(12.5, 0);
    expect(behindFace(curved, 220)).toBeCloseTo(0, 3);
    expect(behindFace(curved, 400)).toBeCloseTo(0, 3);
  });

  it('is never cut through, and stays flat with an apex alone or without a pad', () => {
    const thin = { ...flat, backCushion: { ...flat.backCushion, thicknessMm: 50 } };
    const deep = { ...thin, lumbar: { apexMm: 300, recessMm: 150 } };
    // 6 mm of the pad remain, square to the face.
    expect(behindFace(deep, 60)).toBeCloseTo(44 / Math.cos(benchLayout(deep).leanRad), 3);
    expect(padOf({ ...flat, lumbar: { apexMm: 220, recessMm: 0 } })[0]?.solid.shape).toBe('box');
    const bare = { ...deep, backCushion: { ...flat.backCushion, thicknessMm: 0 } };
    expect(padOf(bare)).toEqual([]);
  });
});

describe('a bulkhead behind a sill', () => {
  const wall = { ...newPiece('bulkhead', 'w1', 'W1', { xMm: 300, zMm: -50, turnDeg: 90 }), lengthMm: 3000 };
  const sill = newPiece('sill', 's1', 'S1', { xMm: 300, zMm: 200, turnDeg: 90 });
  const document = { ...emptySetDocument(), pieces: [wall, sill] };

  it.each(['vertical', 'horizontal'] as const)('leaves the window free with %s boards', (boardDirection) => {
    const boards = derivePieceParts({ ...wall, boardDirection }, document);
    const window = derivePieceParts(sill).filter(({ role }) => role === 'glass' || role === 'frame');
    expect(window).toHaveLength(5);
    for (const part of window) {
      for (const board of boards) expect(overlapDepth(part, board)).toBeLessThanOrEqual(TOLERANCE_MM);
    }
  });

  it('loses exactly the hole', () => {
    const volume = (parts: readonly Part[]) => parts.reduce((sum, part) => sum + volumeMm3(part), 0);
    const solid: PieceOf<'bulkhead'> = { ...wall, boards: { faceMm: 100, revealMm: 0 } };
    const lost = volume(derivePieceParts(solid)) - volume(derivePieceParts(solid, document));
    const { widthMm, heightMm, frameMm } = sill.opening;
    expect(lost).toBeCloseTo((widthMm + 2 * frameMm) * (heightMm + 2 * frameMm) * wall.thicknessMm, -3);
  });
});

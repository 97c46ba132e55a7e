import { seatSinkMm } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import type { CushionSpec } from '../cushions/cushion-spec.ts';
import { deriveCushions } from '../cushions/derive-cushions.ts';
import { measureSet } from '../situation/measure-set.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { Foam, SetDocument } from '../room/document.ts';
import { orderModel } from './order-model.ts';
import { ORDER_SITTERS, orderDrop, orderDropWords, shownDropMm } from './order-drop.ts';

const INCHES = { system: 'feet-inches', roundTo: 16 } as const;
const MILLIMETRES = { system: 'millimetres', roundTo: 16 } as const;
const soft: Foam = { grade: 'soft', densityKgM3: 42, ifd25N: 36 * 4.4482216, supportFactor: 2 };
const cushion = (foam: Foam) => ({
  kind: 'seat' as const,
  finishedMm: { widthMm: 1000, depthMm: 450, thicknessMm: 101.6 },
  foam,
});

/** Every bench with this foam under its sitters. */
function benchesOn(foam: Foam): SetDocument {
  const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
  for (const piece of document.pieces)
    if (piece.kind === 'bench') piece.seatCushion = { foam, thicknessMm: 101.6 };
  return document;
}

describe('how far a cushion on an order goes down', () => {
  const of = { thicknessMm: 101.6, ifd25N: soft.ifd25N, supportFactor: soft.supportFactor };
  it.each<[string, Foam]>([
    ['a plain foam', soft],
    [
      'a foam that was tried',
      { ...soft, tested: { factor: 1.3, error: 0.13, sits: 2, on: '2026-11-03', of } },
    ],
    [
      'layers in a wrap',
      {
        ...soft,
        layers: [
          { share: 0.25, times: 0.7 },
          { share: 0.75, times: 1.5 },
        ],
        wrap: { thicknessMm: 12.7, lostMm: 6.35 },
      },
    ],
  ])('is what the room counts with: %s', (_, foam) => {
    const document = benchesOn(foam);
    const { places } = measureSet(document);
    const seats = deriveCushions(document).filter(({ kind }) => kind === 'seat');
    expect(seats.length).toBeGreaterThan(0);
    for (const spec of seats) {
      const place = places.find(({ pieceId }) => pieceId === spec.benchId)!;
      const drop = orderDrop(spec)!;
      for (const sitter of ['light', 'heavy'] as const) {
        const { sinkMm } = seatSinkMm(place.foam!, ORDER_SITTERS[sitter].weightKg);
        expect(drop[sitter].bestMm).toBeCloseTo(sinkMm, 9);
      }
    }
  });

  it('is said with its range and its source, no finer than a quarter of an inch', () => {
    // 4 in of 36 lb foam, support factor 2: 110 lb 0.76 in, 220 lb (0.78 × 220 × 0.7 ÷ 110 = 1.092 psi) 1.83 in; ± 30 %.
    expect(orderDropWords(orderDrop(cushion(soft))!, INCHES)).toBe(
      'Sinks ¾″ (½″ to 1″) under 110\u00a0lb, 1¾″ (1¼″ to 2¼″) under 220\u00a0lb, in 90 of 100 cases ' +
        '(estimate, give or take 30\u00a0%, from memory).',
    );
  });

  it('says that somebody sat, and nobody’s name or weight', () => {
    const tested = { factor: 1.2, error: 0.18, sits: 1, on: '2026-11-03', of };
    expect(orderDropWords(orderDrop(cushion({ ...soft, tested }))!, MILLIMETRES)).toBe(
      'Sinks 25\u202fmm (20\u202fmm to 25\u202fmm) under 50\u00a0kg, 55\u202fmm (45\u202fmm to 65\u202fmm) under 100\u00a0kg, ' +
        'in 90 of 100 cases (by a test sit, give or take 18\u00a0%).',
    );
  });

  it('warns where the heavier sitter may press it through, or would', () => {
    const verySoft = { ...soft, ifd25N: 22 * 4.4482216 };
    expect(orderDropWords(orderDrop(cushion(verySoft))!, INCHES)).toMatch(/The heavier may bottom out\.$/);
    const tested = {
      factor: 1.6,
      error: 0.13,
      sits: 2,
      on: '2026-11-03',
      of: { ...of, ifd25N: verySoft.ifd25N },
    };
    const tried = orderDrop(cushion({ ...verySoft, tested }))!;
    expect(orderDropWords(tried, INCHES)).toMatch(/The heavier would bottom out\.$/);
  });

  it('keeps cushions on sheets of their own where it differs, and buys their foam as one', () => {
    const onFoams = (foams: readonly Foam[]) => {
      const document = benchesOn(soft);
      const benches = document.pieces.filter((piece) => piece.kind === 'bench');
      benches.forEach((bench, n) => (bench.seatCushion = { foam: foams[n % 2]!, thicknessMm: 101.6 }));
      const cushions = deriveCushions(document).filter(({ kind }) => kind === 'seat');
      // Made alike but for the foam.
      return orderModel({
        cushions: cushions.map((spec) => ({ ...cushions[0]!, ...pick(spec) })),
        covers: [],
      });
    };
    const pick = ({ mark, key, foam }: CushionSpec) => ({ mark, key, foam });
    const tested = (factor: number): Foam => ({
      ...soft,
      tested: { factor, error: 0.13, sits: 2, on: '2026-11-03', of },
    });
    expect(onFoams([tested(1.2), tested(1.2)]).schedule).toHaveLength(1);
    const apart = onFoams([tested(1.15), tested(1.2)]);
    expect(apart.schedule).toHaveLength(2);
    expect(apart.totals.foam.map(({ marks }) => marks)).toEqual([['C1', 'C2']]);
  });

  it('is nothing for a back cushion', () => {
    expect(orderDrop({ ...cushion(soft), kind: 'back' })).toBeUndefined();
  });

  it('is never shown as nothing', () => {
    expect(shownDropMm(1, INCHES)).toBe(6.35);
    expect(shownDropMm(12, MILLIMETRES)).toBe(10);
  });
});

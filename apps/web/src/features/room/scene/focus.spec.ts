import { ARRANGEMENTS, type MannequinPose } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { boundsToShow } from './focus.ts';

const document = ARRANGEMENTS.find(({ id }) => id === 'banquette')!.build();
const bench = document.pieces.find(({ kind }) => kind === 'bench')!;

/** A leg that reaches from the floor before the bench to a knee above it. */
const pose = {
  segments: [
    { kind: 'ellipsoid', centreMm: [0, 60, 3000], radiiMm: [50, 60, 140] },
    { kind: 'cone', fromMm: [0, 100, 2900], fromRadiusMm: 60, toMm: [0, 2000, 0], toRadiusMm: 90 },
  ],
} as unknown as MannequinPose;

describe('what a view has to show', () => {
  it('are feet and heads of those who sit as well as the pieces', () => {
    const empty = boundsToShow({ document, parts: [], bodies: [] }, undefined, false);
    const seated = boundsToShow(
      { document, parts: [], bodies: [{ pieceId: bench.id, pose }] },
      undefined,
      false,
    );
    expect(empty.max[2]).toBeLessThan(3000);
    expect(seated.max).toEqual([expect.any(Number), 2090, 3140]);
  });
});

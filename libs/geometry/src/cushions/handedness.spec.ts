import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { chooseCushion, type CushionChange } from '../room/cushion-choices.ts';
import type { SetDocument } from '../room/document.ts';
import { deriveCushions } from './derive-cushions.ts';
import { handednessOf } from './handedness.ts';
import { PLAIN_MAKE } from './making/cushion-make.ts';

const KEY = 'b1/seat-1';
const facing = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const specOf = (document: SetDocument) => deriveCushions(document).find(({ key }) => key === KEY)!;
/** Away from every wall, so that only the cushion itself has a hand. */
const free: SetDocument = {
  ...facing,
  pieces: facing.pieces.filter(({ kind }) => kind !== 'bulkhead'),
};
const handOf = (change: CushionChange) =>
  handednessOf(specOf(chooseCushion(free, KEY, { tufting: { kind: 'none' }, ...change })));

describe('the hand of a cushion', () => {
  it('is that of the wall it meets', () => {
    const { hand } = specOf(facing);
    expect(hand).not.toBe('either');
    expect(handednessOf(specOf(facing))).toBe(hand);
  });

  it('is either where the mirror image is the same cushion', () => {
    expect(handOf({})).toBe('either');
    expect(handOf({ shape: { frontInMm: { left: 60, right: 60 } } })).toBe('either');
    expect(handOf({ wear: [{ place: 'front-edge', look: 'fade' }] })).toBe('either');
  });

  it.each<[string, CushionChange]>([
    ['a notch at one end', { shape: { notches: [{ edge: 'back', fromMm: 0, widthMm: 90, depthMm: 60 }] } }],
    ['a mitre', { shape: { frontInMm: { left: 0, right: 200 } } }],
    ['a closure at one end', { make: { ...PLAIN_MAKE, closureEdge: 'left' } }],
    ['wear at one end', { wear: [{ place: 'left-end', look: 'stain' }] }],
  ])('is one way round by %s', (_what, change) => {
    expect(handOf(change)).toBe('one-way');
  });

  it('is one way round by buttons that stand nearer to one end', () => {
    const spec = specOf(chooseCushion(free, KEY, { tufting: { kind: 'none' } }));
    const column = { fromSeamMm: 120, fromDatumMm: 120, offJointMm: 0 };
    const buttons = { ...spec.buttons, columns: [column], rowsMm: [200], count: 1 };
    expect(handednessOf({ ...spec, buttons })).toBe('one-way');
  });
});

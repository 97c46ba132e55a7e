import {
  addPiece,
  emptySetDocument,
  setParameter,
  type PieceKind,
  type SetDocument,
} from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { numbersOf } from './components/piece-numbers.ts';
import { setShared, sharedNumbers } from './shared-numbers.ts';

function setOf(...kinds: PieceKind[]): SetDocument {
  return kinds.reduce((set, kind) => addPiece(set, kind).document, emptySetDocument());
}
function changed(document: SetDocument, id: string, key: string, value: number): SetDocument {
  const set = setParameter(document, id, key, value);
  if (!set.ok) throw new Error(set.error.message);
  return set.value;
}

describe('numbers of several pieces', () => {
  const document = changed(setOf('bench', 'bench'), 'b2', 'backHeightMm', 0);
  const shared = sharedNumbers(document.pieces);
  const keyed = (key: string) => shared.find(({ parameter }) => parameter.key === key);

  it('are those that all of them have, with where they differ', () => {
    expect(keyed('lengthMm')?.values).toEqual({ least: 1219.2, most: 1219.2 });
    expect(keyed('backHeightMm')?.values).toEqual({ least: 0, most: 609.6 });
    // A bench without a back has no lean.
    expect(keyed('backLeanDeg')).toBeUndefined();
    expect(keyed('at.xMm')).toBeUndefined();
  });

  it('go as far as all of them can', () => {
    const three = changed(document, 'b2', 'places.count', 3);
    const length = sharedNumbers(three.pieces).find(({ parameter }) => parameter.key === 'lengthMm');
    const own = three.pieces.map((piece) => numbersOf(piece).get('lengthMm')!.min);
    expect(own[0]).toBeLessThan(own[1]!);
    expect(length?.parameter.min).toBe(own[1]);
  });

  it('are set for all, or for none with the reason', () => {
    const set = setShared(document, document.pieces, 'lengthMm', 1500);
    expect(
      'document' in set && set.document.pieces.map((piece) => numbersOf(piece).get('lengthMm')?.value),
    ).toEqual([1500, 1500]);
    expect(setShared(document, document.pieces, 'lengthMm', 10)).toEqual({
      refusal: expect.stringContaining('Length is at least'),
    });
  });
});

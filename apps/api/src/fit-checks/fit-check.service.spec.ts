import { describe, expect, it } from '@jest/globals';
import { ARRANGEMENTS, measureSet, type SetDocument, type SitterRef } from '@settlewright/geometry';
import type { CastPerson } from '../cast/known-person';
import { FitCheckService } from './fit-check.service';

const fit = new FitCheckService();
const HETTY: CastPerson = {
  id: '00000000-0000-4000-8000-000000000001',
  name: 'Hetty Vance',
  person: {
    bodyData: 'women',
    stature: { mm: 1511, source: 'measured' },
    measured: { popliteal_height: 371.5 },
    shoeMm: 33,
    clothing: 'light',
  },
};

function withSitters(...sitters: SitterRef[]): SetDocument {
  const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
  const { places } = measureSet(document);
  const seating = sitters.map((sitter, index) => {
    const { pieceId, place } = places[index]!;
    return { pieceId, place, sitter };
  });
  return { ...document, seating };
}
const mannequin = (percentile: number): SitterRef => ({
  kind: 'mannequin',
  bodyData: 'women',
  measure: 'stature',
  percentile,
});

describe('fit sheets made on the server', () => {
  it('name cast members and mannequins', () => {
    const sitters = [{ kind: 'cast' as const, castId: HETTY.id }, ...[1, 2, 95].map(mannequin)];
    const { rows } = fit.sheetFor(withSitters(...sitters), [HETTY]);
    expect(rows.map(({ name }) => name)).toEqual([
      'Hetty Vance',
      'Woman, 1st in stature',
      'Woman, 2nd in stature',
      'Woman, 95th in stature',
    ]);
  });

  it('leave out a person who is not known', () => {
    const sheet = fit.sheetFor(withSitters({ kind: 'cast', castId: HETTY.id }), []);
    expect(sheet.rows).toEqual([]);
    expect(Object.values(sheet.counts)).toEqual([0, 0, 0, 0]);
  });

  it('come with bodies too coarse to be measures', () => {
    const [body] = fit.bodiesFor(withSitters({ kind: 'cast', castId: HETTY.id }), [HETTY]);
    expect(body!.means.popliteal_height).toBe(380);
    expect(body!.means.stature).toBe(1520);
    expect(body!.shoeMm).toBe(40);
    expect(body!.means).not.toHaveProperty('weight_kg');
  });
});

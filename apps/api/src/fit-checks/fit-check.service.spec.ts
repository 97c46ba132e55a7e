import { describe, expect, it } from '@jest/globals';
import {
  ARRANGEMENTS,
  type FigureMeans,
  mannequinMesh,
  measureSet,
  placeFrames,
  poseMannequin,
  type SetDocument,
  type SitterRef,
} from '@settlewright/geometry';
import type { CastPerson } from '../cast/known-person';
import { FitCheckService, type Turns } from './fit-check.service';

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
    const { rows } = fit.sheetFor(withSitters(...sitters), [HETTY], null);
    expect(rows.map(({ name }) => name)).toEqual([
      'Hetty Vance',
      'Woman, 1st in stature',
      'Woman, 2nd in stature',
      'Woman, 95th in stature',
    ]);
  });

  it('know of a child what a size mark says, and nothing of it is a pass', async () => {
    const document = withSitters({ kind: 'child', sizeMark: 3 });
    const { rows } = fit.sheetFor(document, [], null);
    expect(rows[0]).toMatchObject({ name: 'Child, size mark 3', kind: 'mannequin' });
    expect(['notKnown', 'wontFit']).toContain(rows[0]!.worst);
    const unknown = rows[0]!.cells.filter(
      ({ outcome }) => 'reason' in outcome && outcome.reason === 'not known of a child',
    );
    expect(unknown.length).toBeGreaterThan(5);
    expect(fit.bodiesFor(document, [])).toHaveLength(1);
    for await (const next of fit.measureNext(document, [], null, { left: 9, leftOut: [] })) {
      throw new Error(`asked for a measure of ${next.castId}`);
    }
  });

  it('know no check of a place whose person was erased, draw no body there and ask for no measure', async () => {
    const erased: CastPerson = { ...HETTY, name: 'removed sitter 1', noBody: true };
    const document = withSitters({ kind: 'cast', castId: HETTY.id }, mannequin(50));
    const { rows } = fit.sheetFor(document, [erased], null);
    const verdicts = rows[0]!.cells.flatMap(({ outcome }) =>
      outcome.kind === 'verdict' ? [outcome.verdict] : [],
    );
    expect(rows[0]!.name).toBe('removed sitter 1');
    expect(verdicts.length).toBeGreaterThan(3);
    expect(new Set(verdicts)).toEqual(new Set(['notKnown']));
    expect(fit.bodiesFor(document, [erased]).map(({ placeId }) => placeId)).toEqual([rows[1]!.placeId]);
    for await (const next of fit.measureNext(document, [erased], null, { left: 9, leftOut: [] })) {
      throw new Error(`asked for a measure of ${next.castId}`);
    }
  });

  it('leave out a person who is not known', () => {
    const sheet = fit.sheetFor(withSitters({ kind: 'cast', castId: HETTY.id }), [], null);
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

  it('tell of a body what its drawing reads, and nothing else', () => {
    const document = withSitters({ kind: 'cast', castId: HETTY.id });
    const [body] = fit.bodiesFor(document, [HETTY]);
    const situation = measureSet(document).places.find(({ placeId }) => placeId === body!.placeId)!;
    const frame = document.pieces
      .flatMap((piece) => placeFrames(piece, document))
      .find(({ placeId }) => placeId === body!.placeId)!;
    const read = new Set<PropertyKey>();
    const means = new Proxy<FigureMeans>(body!.means, {
      get: (target, key) => {
        read.add(key);
        return target[key as keyof FigureMeans];
      },
    });
    mannequinMesh(poseMannequin({ means, shoeMm: body!.shoeMm, frame, situation, sinkMm: 0 }));
    read.delete('weight_kg');
    expect(Object.keys(body!.means).sort()).toEqual([...read].map(String).sort());
  });
});

describe('what to measure next', () => {
  it('is worked out anew for so many at once; of the others it is said how many, and they follow', async () => {
    const other = { ...HETTY, id: '00000000-0000-4000-8000-000000000002' };
    const seated = [HETTY, other].map(({ id }) => ({ kind: 'cast' as const, castId: id }));
    const ask = async (document: SetDocument) => {
      const turns: Turns = { left: 1, leftOut: [] };
      const found: string[] = [];
      for await (const { castId } of fit.measureNext(document, [HETTY, other], null, turns))
        found.push(castId);
      return { found, ...turns };
    };
    const document = withSitters(...seated);
    expect(await ask(document)).toEqual({ found: [HETTY.id], left: 0, leftOut: [other.id] });
    expect(await ask(document)).toEqual({ found: [HETTY.id, other.id], left: 0, leftOut: [] });
    expect(await ask(document)).toEqual({ found: [HETTY.id, other.id], left: 1, leftOut: [] });
    // Another set is another question.
    const changed = { ...document, asked: { ...document.asked, lensHeightMm: 1200 } };
    expect(await ask(changed)).toEqual({ found: [HETTY.id], left: 0, leftOut: [other.id] });
  });

  it('is worked out once when it is asked twice at once', async () => {
    const document = withSitters(mannequin(10), { kind: 'cast', castId: HETTY.id });
    const ask = async () => {
      const turns: Turns = { left: 1, leftOut: [] };
      const found = [];
      for await (const one of fit.measureNext(document, [HETTY], null, turns)) found.push(one);
      return { found, left: turns.left };
    };
    const [one, other] = await Promise.all([ask(), ask()]);
    expect(other.found).toEqual(one.found);
    expect(one.found).toHaveLength(1);
    expect([one.left, other.left].sort()).toEqual([0, 1]);
  });
});

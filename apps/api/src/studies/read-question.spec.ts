import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import { describe, expect, it } from '@jest/globals';
import { readQuestion } from './read-question';

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const bench = bay.pieces.find(({ kind }) => kind === 'bench');
const asked = { populationId: 'us-civilians-2015', people: 1000, draftNumber: 1 };
const counting = { blockPeople: 1000, workVersion: '1-1' };

/** So many benches, far apart; each with a deck of its own where they are to be unlike. */
function row(benches: number, stepMm: number): SetDocument {
  if (bench?.kind !== 'bench') throw new Error('no bench');
  const pieces = Array.from({ length: benches }, (_, n) => ({
    ...structuredClone(bench),
    id: `row${n}`,
    at: { ...bench.at, xMm: 4000 * n },
    deckHeightMm: 300 + n * stepMm,
  }));
  return { ...bay, pieces };
}

const read = (document: SetDocument) =>
  readQuestion(asked, document, { kind: 'built-in', id: asked.populationId }, counting);

describe('places of a study', () => {
  it('may be many where they are alike, and are refused in words where too many are not', () => {
    expect(read(row(101, 0)).places.length).toBeGreaterThan(200);
    expect(() => read(row(201, 1))).toThrow(
      expect.objectContaining({
        fields: [
          expect.objectContaining({
            code: 'too-many-places',
            message: expect.stringMatching(/201 kinds of places; accepted: up to 200/),
          }),
        ],
      }),
    );
  });
});

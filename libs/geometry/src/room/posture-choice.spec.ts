import { describe, expect, it } from 'vitest';
import { setOf } from '../../test/seated-room.ts';
import { diffDocuments } from './diff-documents.ts';
import { mergeDocuments } from './merge-documents.ts';
import { readSetDocument } from './read-document.ts';
import { choosePosture, seatSitter } from './seating.ts';

const { document, ids } = setOf([
  ['bench', { xMm: 0, zMm: 0, turnDeg: 0 }, { lengthMm: 1800, 'places.count': 2 }],
]);
const bench = ids[0]!;
const somebody = { kind: 'mannequin', bodyData: 'women', measure: 'stature', percentile: 50 } as const;
const other = { ...somebody, percentile: 95 };
const base = seatSitter(document, bench, 1, somebody);

describe('a chosen posture in the document', () => {
  it('is optional, checked, and gone with whoever sat so', () => {
    expect(readSetDocument(base).ok).toBe(true);
    const chosen = choosePosture(base, bench, 1, { arms: 'cup', nudge: { leftMm: 12, aheadMm: 0 } });
    const read = readSetDocument(chosen);
    expect(read.ok && read.value.seating[0]!.posture).toEqual({
      arms: 'cup',
      nudge: { leftMm: 12, aheadMm: 0 },
    });
    const wrong = { ...chosen, seating: [{ ...chosen.seating[0]!, posture: { arms: 'folded' } }] };
    expect(readSetDocument(wrong).ok).toBe(false);
    expect(choosePosture(chosen, bench, 1, null)).toEqual(base);
    expect(seatSitter(chosen, bench, 1, other).seating[0]).not.toHaveProperty('posture');
  });

  it('merges with a change of the other side, and is a conflict when both chose', () => {
    const mine = choosePosture(base, bench, 1, { arms: 'lap' });
    const theirs = seatSitter(base, bench, 2, other);
    const merged = mergeDocuments(base, mine, theirs, {});
    expect(merged.ok && merged.value.document.seating).toEqual(
      expect.arrayContaining([mine.seating[0], theirs.seating[1]]),
    );
    const against = choosePosture(base, bench, 1, { arms: 'cup' });
    const [difference, ...rest] = diffDocuments(base, mine, against);
    expect(rest).toEqual([]);
    expect(difference).toMatchObject({ kind: 'seating', key: 'posture', conflict: true });
    expect(mergeDocuments(base, mine, against, {}).ok).toBe(false);
    const decided = mergeDocuments(base, mine, against, { [difference!.id]: 'mine' });
    expect(decided.ok && decided.value.document).toEqual(mine);
  });

  it('keeps their posture when only the sitter is mine, and drops it with the place', () => {
    const theirs = choosePosture(base, bench, 1, { trunk: 'upright' });
    const mine = { ...base, seating: [{ ...base.seating[0]!, sitter: other }] };
    const merged = mergeDocuments(base, mine, theirs, {});
    expect(merged.ok && merged.value.document.seating).toEqual([
      { pieceId: bench, place: 1, sitter: other, posture: { trunk: 'upright' } },
    ]);
    const gone = mergeDocuments(base, seatSitter(base, bench, 1, null), theirs, {});
    expect(gone.ok && gone.value.document.seating).toEqual([]);
  });
});

import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { diffDocuments } from '../room/diff-documents.ts';
import type { SetDocument } from '../room/document.ts';
import { mergeDocuments } from '../room/merge-documents.ts';
import { readSetDocument } from '../room/read-document.ts';
import { addView, changeView, freeViewName, removeView } from './edit-views.ts';
import { MAX_VIEWS, type NamedView } from './named-view.ts';

const start = (): SetDocument => ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const corner: NamedView = {
  id: 'v1',
  name: 'From the corner',
  camera: { kind: 'letter', letter: 'E', zoom: 1.5, panMm: [120, -40], azimuthDeg: 35, elevationDeg: 20 },
  shown: { bodies: true, tapes: false, clientView: false },
  section: { pointMm: [0, 0, 400], toward: [0, 0, 1] },
};
const close: NamedView = {
  id: 'v2',
  name: 'Close on the window',
  camera: {
    kind: 'lens',
    focalLengthMm: 50,
    backMm: { width: 24.89, height: 18.67 },
    aspect: 1.85,
    at: { xMm: 300, zMm: 4000 },
    heightMm: 1270,
    turnDeg: -12,
    tiltDeg: 3,
  },
  shown: { bodies: true, tapes: true, clientView: true },
};

describe('named views', () => {
  it('are kept, changed and taken away, and read as they were written', () => {
    const both = addView(addView(start(), corner), close);
    const read = readSetDocument(JSON.parse(JSON.stringify(both)));
    expect(read).toEqual({ ok: true, value: both });
    const renamed = changeView(both, 'v2', { name: 'Two-shot' });
    expect(renamed.views?.map(({ name }) => name)).toEqual(['From the corner', 'Two-shot']);
    expect(changeView(both, 'v9', { name: 'Nobody' })).toBe(both);
    expect(removeView(removeView(both, 'v1'), 'v2')).toEqual(start());
  });

  it('are at most forty, each with its own id', () => {
    let document = start();
    for (let n = 0; n <= MAX_VIEWS; n += 1) document = addView(document, { ...corner, id: `v${n}` });
    expect(document.views).toHaveLength(MAX_VIEWS);
    expect(addView(addView(start(), corner), { ...close, id: 'v1' }).views).toEqual([corner]);
    const twice = readSetDocument({ ...start(), views: [corner, { ...close, id: 'v1' }] });
    expect(twice.ok ? '' : twice.error.message).toMatch('Two views have the id “v1”');
  });

  it('get names that no other has', () => {
    const document = addView(start(), { ...close, name: 'Lens' });
    expect(freeViewName(document, 'Lens')).toBe('Lens 2');
    expect(freeViewName(document, 'Wide')).toBe('Wide');
  });

  it('refuse what no camera can do', () => {
    const views = [{ ...close, camera: { ...close.camera, focalLengthMm: 0 } }];
    expect(readSetDocument({ ...start(), views }).ok).toBe(false);
    expect(readSetDocument({ ...start(), views: [{ ...corner, name: '  ' }] }).ok).toBe(false);
  });

  it('of two versions are brought together, and what both changed is chosen', () => {
    const base = addView(start(), corner);
    const mine = changeView(addView(base, close), 'v1', { name: 'Corner' });
    const theirs = addView(base, { ...close, id: 'v3', name: 'Wide' });
    expect(diffDocuments(base, mine, theirs).map(({ label, changedBy }) => `${label}: ${changedBy}`)).toEqual(
      ['View “Corner”: mine', 'View “Wide”: theirs', 'View “Close on the window”: mine'],
    );
    const merge = mergeDocuments(base, mine, theirs, {});
    expect(merge.ok && merge.value.document.views?.map(({ name }) => name)).toEqual([
      'Corner',
      'Wide',
      'Close on the window',
    ]);
    const other = changeView(base, 'v1', { name: 'Nook' });
    expect(mergeDocuments(base, mine, other, {}).ok).toBe(false);
    const chosen = mergeDocuments(base, mine, other, { 'view:v1': 'mine' });
    expect(chosen.ok && chosen.value.document.views?.[0]?.name).toBe('Corner');
    const gone = mergeDocuments(base, removeView(base, 'v1'), base, {});
    expect(gone.ok && gone.value.document).toEqual(start());
  });
});

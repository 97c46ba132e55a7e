import { describe, expect, it } from '@jest/globals';
import { changesOnPaper } from './changes-on-paper';
import type { OrderChange } from './life/order-changes';

const INCHES = { system: 'feet-inches', roundTo: 16 } as const;
const change = (more: Partial<OrderChange>): OrderChange => ({
  ...{ mark: 'C1', field: 'width', before: [{ mm: 1016 }], after: [{ mm: 1066.8 }] },
  ...more,
});

describe('what changed, on the first sheet', () => {
  it('is said with what it was, in the units of the paper', () => {
    const changes = [
      change({ mark: null, field: 'revision', before: [{ text: 'B' }], after: [{ text: 'C' }] }),
      change({ mark: null, field: 'needed-by', before: [{ text: '2027-02-26' }], after: [] }),
      change({}),
      change({ mark: 'C2', field: 'cushion-notes', before: [], after: [{ text: 'pile down' }] }),
      change({ mark: 'C3', field: 'outline' }),
      change({ mark: 'C4', after: [{ mm: 1016.3 }] }),
    ];
    expect(changesOnPaper(changes, INCHES)).toBe(
      'needed by: nothing, was Friday 26 February 2027; C1 width: 42″, was 40″; ' +
        'C2 notes: pile down, was nothing; C3 outline: see its sheet; C4 width: by less than is shown',
    );
  });

  it('is left to the page where there is much of it, and nothing where there is none', () => {
    const many = Array.from({ length: 15 }, (_, i) => change({ mark: `C${i + 1}` }));
    expect(changesOnPaper(many, INCHES)).toMatch(/C12 width: .*; 3 more on the order’s page$/);
    expect(changesOnPaper([], INCHES)).toBe('');
  });
});

import { describe, expect, it } from 'vitest';
import { sayDraft } from './use-room-cells.ts';

describe('the draft in the title block', () => {
  it('is what was issued until it changes', () => {
    expect(sayDraft(3, undefined)).toBe('3, nothing issued');
    expect(sayDraft(16, { letter: 'A', number: 16 })).toBe('16, as issued in A');
    expect(sayDraft(17, { letter: 'A', number: 16 })).toBe('17, after revision A');
  });
});

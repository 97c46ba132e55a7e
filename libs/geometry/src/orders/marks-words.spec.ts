import { describe, expect, it } from 'vitest';
import { marksWords } from './marks-words.ts';

const marks = (...numbers: number[]) => numbers.map((n) => `C${n}`);

describe('marks in words', () => {
  it.each([
    [marks(), ''],
    [marks(4), 'C4'],
    [marks(1, 2), 'C1, C2'],
    [marks(1, 2, 3, 4), 'C1 to C4'],
    [marks(1, 2, 3, 5, 6, 9, 10, 11), 'C1 to C3, C5, C6, C9 to C11'],
    [marks(1, 3, 5, 7, 9, 11, 13), 'C1 to C13, 7 in all'],
    [['B1', 'B2', 'L3', 'L4'], 'B1, B2, L3, L4'],
  ])('%j', (list, words) => {
    expect(marksWords(list)).toBe(words);
  });
});

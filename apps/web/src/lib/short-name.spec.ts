import { expect, it } from 'vitest';
import { initials, shortName } from './short-name.ts';

it('shortens people to a first name, and figures to what tells them apart', () => {
  expect(shortName('Hetty Vance')).toBe('Hetty');
  expect(shortName('Woman, 5th in stature')).toBe('Woman, 5th');
  expect(shortName('Child, size mark 4')).toBe('Child, size 4');
  expect(shortName('removed sitter 2')).toBe('removed sitter 2');
  expect(['Hetty Vance', 'Woman, 5th in stature', 'Child, size mark 4'].map(initials)).toEqual([
    'HV',
    'W5',
    'C4',
  ]);
});
